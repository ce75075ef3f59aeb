import { quantities, type LimitVerdict, type Result } from "@restband/solver";
import { outcomeWords } from "../../format/outcomes.ts";
import { capitalised, listed, sayMany } from "../../format/words.ts";

/** What two runs came to in one quantity. */
export interface AnswerRow {
  readonly name: string;
  readonly label: string;
  readonly values: readonly [number | null, number | null];
  /** What has become of its limit: "now kept", "still broken"; null where neither has one. */
  readonly limit: { readonly word: string; readonly tone: "kept" | "broken" | "quiet" } | null;
}

export interface AnswerComparison {
  readonly outcomes: readonly [string, string];
  /** Those that differ or have a limit; those with a limit first. */
  readonly rows: readonly AnswerRow[];
  /** Quantities both have, without a limit, that are the same. */
  readonly same: number;
}

/** Values closer than this share of the larger are the same to anybody who reads them. */
const resolution = 1e-9;

/** Two results side by side, quantity by quantity. */
export function compareAnswers(a: Result, b: Result): AnswerComparison {
  const rows = quantities
    .map(({ name, label }): AnswerRow => {
      const values = [a.quantities[name] ?? null, b.quantities[name] ?? null] as const;
      return { name, label, values, limit: limitWords(verdictOf(a, name), verdictOf(b, name)) };
    })
    .filter(({ values }) => values[0] !== null || values[1] !== null);
  const told = rows.filter((row) => row.limit !== null || !isSame(row.values));
  return {
    outcomes: [outcomeOf(a), outcomeOf(b)],
    rows: [...told.filter(({ limit }) => limit), ...told.filter(({ limit }) => !limit)],
    same: rows.length - told.length,
  };
}

/** The comparison in a sentence or two: what has become of the outcome, and of the limits. */
export function comparisonWords({ outcomes: [a, b], rows }: AnswerComparison): string {
  const outcome = a === b ? `Both: ${a}.` : `The first: ${a}. The second: ${b}.`;
  const count = (word: string) => rows.filter(({ limit }) => limit?.word === word).length;
  const limits = [limitCount(count("now kept"), "kept"), limitCount(count("now broken"), "broken")].filter(Boolean);
  return [outcome, limits.length > 0 ? `${capitalised(listed(limits))}.` : ""].filter(Boolean).join(" ");
}

const limitCount = (count: number, word: string): string =>
  count === 0 ? "" : `${sayMany(count, "limit")} ${count === 1 ? "is" : "are"} now ${word}`;

const outcomeOf = ({ outcome }: Result): string => (outcome ? outcomeWords[outcome] : "cut off");

const isSame = ([a, b]: AnswerRow["values"]): boolean =>
  a === b || (a !== null && b !== null && Math.abs(a - b) <= resolution * Math.max(Math.abs(a), Math.abs(b)));

/** Of several limits on one quantity the worst counts. */
function verdictOf({ limits }: Result, name: string): LimitVerdict["kept"] | undefined {
  const kept = limits.filter(({ quantity }) => quantity === name).map((limit) => limit.kept);
  return kept.includes(false) ? false : kept.includes(null) ? null : kept.length > 0 ? true : undefined;
}

type Kept = LimitVerdict["kept"] | undefined;

function limitWords(a: Kept, b: Kept): AnswerRow["limit"] {
  if (a === undefined && b === undefined) return null;
  if (b === undefined) return { word: "no limit here", tone: "quiet" };
  if (b === null) return { word: "cannot be judged", tone: "quiet" };
  const tone = b ? "kept" : "broken";
  if (a === undefined) return { word: `${tone}, no limit there`, tone };
  if (a === b) return { word: b ? "kept" : "still broken", tone };
  return { word: `now ${tone}`, tone };
}
