import { notAllowed, Refusal } from "../errors.ts";
import type { Member, Role } from "../members/members-schema.ts";
import type { Revision, RevisionState } from "../revisions/revisions-schema.ts";
import type { Decision, Review } from "./reviews-schema.ts";

/** Roles that decide on what others made. */
const deciders: readonly Role[] = ["owner", "reviewer"];
/** Roles that make what others decide on. */
const makers: readonly Role[] = ["owner", "editor"];

const undecided = new Set<RevisionState>(["open", "in-review"]);

/** Where a person stands towards a revision. */
export interface Standpoint {
  readonly accountId: string;
  readonly role: Role;
  readonly revision: Revision;
  readonly members: readonly Member[];
  readonly decisions: readonly Decision[];
}

/** One's own: frozen by them, or holding a change of theirs since the last accepted revision. */
export const isOwn = ({ authors }: Revision, accountId: string): boolean =>
  authors.some((author) => author.accountId === accountId);

/** Members who may decide on a revision: by their role, and not on their own. */
export function decidersOf(revision: Revision, members: readonly Member[]): Member[] {
  return members.filter(({ role, accountId }) => deciders.includes(role) && !isOwn(revision, accountId));
}

/** What somebody may do with a revision as it stands. */
export function mayOf(standpoint: Standpoint, candidates: number): Review["may"] {
  const { role, revision } = standpoint;
  const isOpen = undecided.has(revision.state);
  return {
    ask: makers.includes(role) && isOpen && candidates > 0,
    decide: hindranceOf(standpoint) === null,
    selfCheck: isOpen && makers.includes(role) && selfCheckHindrance(standpoint) === null,
    withdraw: role === "owner" && revision.state !== "returned" && revision.state !== "withdrawn",
  };
}

/** Why somebody may not decide, as a sentence; null where they may. */
export function hindranceOf({ accountId, role, revision, decisions }: Standpoint): string | null {
  if (!undecided.has(revision.state)) return decidedSentence(decisions);
  if (!deciders.includes(role)) return roleSentence(role);
  return isOwn(revision, accountId) ? ownSentence : null;
}

const roleSentence = (role: Role) => `Your role in this project is ${role}; owners and reviewers decide.`;

const ownSentence =
  "This is your own work: you froze it, or saved a change in it since the last accepted revision. Somebody else decides.";

/** Why somebody may not mark a revision self-checked, as a sentence; null where they may. */
function selfCheckHindrance({ accountId, revision, members }: Standpoint): string | null {
  if (!isOwn(revision, accountId)) return "This is not your own work: it is accepted or returned, not self-checked.";
  const others = decidersOf(revision, members).map(({ name }) => name);
  if (others.length === 0) return null;
  return `${others.join(", ")} can decide on it. Self-checked is for work that nobody else in the project can look at.`;
}

/** @throws Refusal 403 for a role that does not decide, and for one's own work */
export function demandDecider({ role, revision, accountId }: Standpoint): void {
  if (!deciders.includes(role)) throw notAllowed(roleSentence(role));
  if (isOwn(revision, accountId)) throw notAllowed(ownSentence);
}

/** @throws Refusal 403 for a role that makes nothing that others decide on */
export function demandMaker({ role }: Standpoint): void {
  if (!makers.includes(role)) throw notAllowed(`Your role in this project is ${role}; this takes owner or editor.`);
}

/** @throws Refusal 403 for work that is not one's own, or that somebody else could decide on */
export function demandAlone(standpoint: Standpoint): void {
  const hindrance = selfCheckHindrance(standpoint);
  if (hindrance) throw notAllowed(hindrance);
}

/** @throws Refusal 409 that says who was faster, and when */
export function demandUndecided({ state }: Revision, decisions: readonly Decision[]): void {
  if (!undecided.has(state)) throw new Refusal(409, "decided", decidedSentence(decisions));
}

const verbs = {
  accept: "accepted this revision",
  return: "returned this revision",
  "self-check": "marked this revision self-checked",
  withdraw: "withdrew this revision",
};

function decidedSentence(decisions: readonly Decision[]): string {
  const last = decisions[decisions.length - 1];
  return `${last.by.name} ${verbs[last.kind]} on ${instant(last.at)}.`;
}

/** "1 Dec 2026, 14:02 UTC" */
function instant(at: string): string {
  const options = { day: "numeric", month: "short", year: "numeric", hour: "2-digit", minute: "2-digit" } as const;
  return `${new Intl.DateTimeFormat("en-GB", { ...options, timeZone: "UTC" }).format(new Date(at))} UTC`;
}
