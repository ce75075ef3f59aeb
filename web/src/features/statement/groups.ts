import type { SwitchedOff } from "@restband/api/contract";
import type { Fault, Scenario } from "@restband/solver";
import { isUnder } from "./path.ts";
import { bodySentence } from "./sentence/body-sentence.ts";
import { contactSentence } from "./sentence/contact-sentence.ts";
import { driveSentence } from "./sentence/drive-sentence.ts";
import { limitsSentence } from "./sentence/limits-sentence.ts";
import type { Piece } from "./sentence/piece.ts";
import { startSentence } from "./sentence/start-sentence.ts";

export type GroupKey = "body" | "contact" | "drive" | "start" | "limits";

/** A group of the statement: its name, its sentence, and the members of the scenario it holds. */
export interface Group {
  readonly key: GroupKey;
  readonly name: string;
  readonly roots: readonly string[];
  /** `off`: terms told too that are switched off. */
  readonly sentence: (scenario: Scenario, off?: readonly SwitchedOff[]) => Piece[];
}

/** The five groups in the order of the page; together they hold every member of the format. */
export const groups: readonly Group[] = [
  {
    key: "body",
    name: "Body",
    roots: ["format", "title", "purpose", "motion", "body", "solid"],
    sentence: bodySentence,
  },
  { key: "contact", name: "Contact", roots: ["contact"], sentence: contactSentence },
  { key: "drive", name: "Drive", roots: ["base", "force", "incline"], sentence: driveSentence },
  { key: "start", name: "Start, span", roots: ["initial", "span", "settleBand"], sentence: startSentence },
  { key: "limits", name: "Limits", roots: ["limits", "origins"], sentence: limitsSentence },
];

/** The group a path belongs to; what names no member of its own belongs to the first. */
export function groupOf(path: string): Group {
  const subject = path.startsWith("origins.") ? path.slice("origins.".length) : path;
  return groups.find(({ roots }) => roots.some((root) => isUnder(subject, root))) ?? groups[0];
}

/** What of the faults belongs to a group. */
export const faultsIn = (faults: readonly Fault[], group: Group): Fault[] =>
  faults.filter(({ path }) => groupOf(path).key === group.key);
