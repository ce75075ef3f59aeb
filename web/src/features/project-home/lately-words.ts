import type { ActivityEntry } from "@restband/api/contract";
import { listed, sayMany } from "../../format/words.ts";

/** An act in a sentence: `before`, the revision and scenario it was done to (links where they are here), `after`. */
export interface Told {
  readonly id: number;
  readonly at: string;
  readonly before: string;
  readonly revision: { id: string; number: number } | null;
  readonly scenario: { id: string; title: string; isThere: boolean } | null;
  readonly after: string;
}

/** A trail in sentences, newest first. Saves of one scenario by one person in a row are told once, with all they changed. */
export function tellTrail(entries: readonly ActivityEntry[], ownId: string): Told[] {
  return merged(entries).map((entry) => tell(entry, ownId));
}

function merged(entries: readonly ActivityEntry[]): ActivityEntry[] {
  const rows: ActivityEntry[] = [];
  for (const entry of entries) {
    const last = rows.at(-1);
    if (last && isSameSaving(last, entry)) {
      const changed = [...new Set([...changedIn(last), ...changedIn(entry)])].join(" ");
      rows[rows.length - 1] = { ...last, detail: { ...last.detail, changed } };
    } else rows.push(entry);
  }
  return rows;
}

const isSameSaving = (a: ActivityEntry, b: ActivityEntry): boolean =>
  a.act === "scenario.saved" &&
  b.act === a.act &&
  a.by.accountId === b.by.accountId &&
  a.subject?.id === b.subject?.id &&
  new Date(a.at).toDateString() === new Date(b.at).toDateString();

const changedIn = ({ detail }: ActivityEntry): string[] =>
  String(detail.changed ?? "")
    .split(" ")
    .filter(Boolean);

const partNames: Readonly<Record<string, string>> = {
  body: "the body",
  solid: "the solid damping",
  contact: "the contact",
  incline: "the incline",
  force: "the force",
  base: "the drive",
  initial: "the start",
  span: "the span",
  settleBand: "the settle band",
  limits: "the limits",
  purpose: "the purpose",
  origins: "the origins",
  motion: "the kind of motion",
};

/** Too many parts to name them. */
const MOST_PARTS = 3;

function changedWords(entry: ActivityEntry): string {
  const members = changedIn(entry);
  const parts = members.flatMap((key) => partNames[key] ?? []);
  if (members.length === 1 && members[0] === "title") return "renamed ";
  if (members.length === 0) return "saved ";
  return parts.length === 0 || parts.length > MOST_PARTS ? "changed " : `changed ${listed(parts)} of `;
}

type Sentence = { verb: string; hasScenario?: boolean; after?: string };

const sentences: Readonly<Record<string, (entry: ActivityEntry, whom: string) => Sentence>> = {
  "project.created": () => ({ verb: "began the project." }),
  "project.changed": () => ({ verb: "changed the project’s name or description." }),
  "project.archived": () => ({ verb: "archived the project." }),
  "project.restored": () => ({ verb: "restored the project." }),
  "member.added": ({ detail }, whom) => ({ verb: `added ${whom} as ${detail.role}.` }),
  "member.changed": ({ detail }, whom) => ({ verb: `made ${whom} ${detail.role}.` }),
  "member.removed": ({ by, subject }, whom) => ({
    verb: subject?.id === by.accountId ? "left the project." : `removed ${whom}.`,
  }),
  "scenario.created": () => ({ verb: "began ", hasScenario: true }),
  "scenario.saved": (entry) => ({ verb: changedWords(entry), hasScenario: true }),
  "scenario.duplicated": () => ({ verb: "made the copy ", hasScenario: true }),
  "scenario.moved-out": () => ({ verb: "moved ", hasScenario: true, after: " to another project" }),
  "scenario.moved-in": () => ({ verb: "moved ", hasScenario: true, after: " here from another project" }),
  "scenario.archived": () => ({ verb: "archived ", hasScenario: true }),
  "scenario.restored": () => ({ verb: "restored ", hasScenario: true }),
  "exploration.created": ({ detail }) => ({ verb: `began a ${String(detail.kind)} of `, hasScenario: true }),
  "exploration.deleted": ({ detail }) => ({ verb: `deleted a ${String(detail.kind)} of `, hasScenario: true }),
  "revision.frozen": () => ({ verb: "froze ", hasScenario: true }),
  "revision.replayed": ({ detail }) => ({
    verb: "replayed ",
    hasScenario: true,
    after: `: ${verdictOf(detail.verdict)}`,
  }),
  "revision.accepted": () => ({ verb: "accepted ", hasScenario: true }),
  "revision.returned": () => ({ verb: "returned ", hasScenario: true }),
  "revision.self-checked": () => ({ verb: "checked their own ", hasScenario: true }),
  "revision.withdrawn": () => ({ verb: "withdrew ", hasScenario: true }),
  "review.asked": ({ detail }) => ({ verb: `asked ${String(detail.reviewer)} to review `, hasScenario: true }),
  "comment.added": () => ({ verb: "commented on ", hasScenario: true }),
  "comment.answered": () => ({ verb: "answered a comment on ", hasScenario: true }),
  "comment.settled": () => ({ verb: "settled a comment on ", hasScenario: true }),
  "comment.reopened": () => ({ verb: "opened again a comment on ", hasScenario: true }),
  "checklist.set": ({ detail }) => ({ verb: `set the checklist: ${sayMany(Number(detail.count), "point")}.` }),
  "cases.created": ({ detail }) => ({
    verb: `made ${sayMany(Number(detail.count), "scenario")} of a table of cases.`,
  }),
};

const verdicts: Readonly<Record<string, string>> = {
  agrees: "it agrees",
  differs: "it differs",
  sensitive: "it is sensitive",
};

const verdictOf = (verdict: string | number | undefined): string => verdicts[String(verdict)] ?? String(verdict);

/** The revision an act was done to; null where it was the scenario itself. */
function revisionOf({ detail }: ActivityEntry): Told["revision"] {
  const { revisionId: id, number } = detail;
  return typeof id === "string" && typeof number === "number" ? { id, number } : null;
}

function tell(entry: ActivityEntry, ownId: string): Told {
  const { id, at, by, subject } = entry;
  const whom = subject?.id === ownId ? "you" : (subject?.name ?? "");
  // An act of a newer server is told by its plain name.
  const { verb, hasScenario, after = "" } = sentences[entry.act]?.(entry, whom) ?? { verb: `${entry.act}.` };
  const before = `${by.accountId === ownId ? "You" : by.name} ${verb}`;
  if (!hasScenario || !subject) return { id, at, before, revision: null, scenario: null, after: "" };
  const scenario = { id: subject.id, title: subject.name || "Untitled", isThere: subject.isThere };
  return { id, at, before, revision: revisionOf(entry), scenario, after: `${after}.` };
}
