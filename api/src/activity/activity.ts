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
  | "revision.frozen"
  | "revision.replayed"
  | "revision.accepted"
  | "revision.returned"
  | "revision.self-checked"
  | "revision.withdrawn"
  | "review.asked"
  | "comment.added"
  | "comment.answered"
  | "comment.settled"
  | "comment.reopened"
  | "checklist.set"
  | "exploration.created"
  | "exploration.deleted";

export interface Activity {
  /** Null for what concerns no project. */
  readonly projectId: string | null;
  /** Who did it. */
  readonly accountId: string;
  readonly act: Act;
  /** The member or scenario it was done to; of a revision, its scenario: `detail` has its own id and number. */
  readonly subjectId?: string;
  /** What is worth telling of it; never a secret. */
  readonly detail?: Readonly<Record<string, string | number>>;
}
