export type Act =
  | "account.signed-up"
  | "account.claimed"
  | "project.created"
  | "project.changed"
  | "project.archived"
  | "project.restored"
  | "member.added"
  | "member.changed"
  | "member.removed"
  | "scenario.created"
  | "scenario.saved"
  | "scenario.duplicated"
  | "scenario.moved-out"
  | "scenario.moved-in"
  | "scenario.archived"
  | "scenario.restored"
  | "cases.created"
  | "exploration.created"
  | "exploration.deleted";

export interface Activity {
  /** Null for what concerns no project. */
  readonly projectId: string | null;
  /** Who did it. */
  readonly accountId: string;
  readonly act: Act;
  /** The member or scenario it was done to. */
  readonly subjectId?: string;
  /** What is worth telling of it; never a secret. */
  readonly detail?: Readonly<Record<string, string | number>>;
}
