import type { Entries } from "../formula/entries.ts";
import { startEntries } from "../formula/entries.ts";
import type { Formula } from "../formula/formula.ts";

/** One member of a chain while it is entered. */
export interface Member {
  readonly id: number;
  readonly formula: string;
  /** What the person calls it. */
  readonly name: string;
  readonly entries: Entries;
}

/** Parts that belong together, one after another or side by side, perhaps behind a transmission. */
export interface Group {
  readonly id: number;
  readonly join: "series" | "parallel";
  /** Key of the transmission they stand behind; "" where they stand before none. */
  readonly through: string;
  readonly entries: Entries;
  readonly parts: readonly Part[];
}

export type Part = Member | Group;

export const isGroup = (part: Part): part is Group => "parts" in part;

/** An empty group, numbered. */
export const emptyGroup = (id: number, join: Group["join"]): Group => ({
  id,
  join,
  through: "",
  entries: {},
  parts: [],
});

/** A new member of a kind, with its customary numbers. */
export const newMember = (id: number, formula: Formula): Member => ({
  id,
  formula: formula.key,
  name: formula.label.split(",")[0],
  entries: startEntries(formula),
});

/** A number no part of the tree has. */
export const nextId = (part: Part): number =>
  1 + (isGroup(part) ? Math.max(part.id, ...part.parts.map((each) => nextId(each) - 1)) : part.id);

/** The tree with one part put in another's place, or taken away by null. */
export function replaced(group: Group, id: number, by: Part | null): Group {
  const parts = group.parts.flatMap((part) => {
    if (part.id === id) return by ?? [];
    return isGroup(part) ? replaced(part, id, by) : part;
  });
  return { ...group, parts };
}
