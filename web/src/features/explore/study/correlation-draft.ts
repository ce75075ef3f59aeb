import type { Fault, RankCorrelation } from "@restband/solver";
import { parseNumber } from "../../../format/parse-number.ts";

/** A rank correlation as it is typed: of the values at two paths. */
export interface CorrelationDraft {
  readonly first: string;
  readonly second: string;
  readonly text: string;
}

/** What is typed as correlations of the inputs in their order; `faults` where one cannot be read. */
export function correlationsOf(
  drafts: readonly CorrelationDraft[],
  paths: readonly string[],
): { correlations: RankCorrelation[]; faults: Fault[] } {
  const faults: Fault[] = [];
  const correlations = drafts.map(({ first, second, text }, i) => {
    const read = parseNumber(text.trim());
    const at = `correlations[${i}]`;
    if (!read || !("value" in read)) faults.push({ path: `${at}.value`, message: "A number between −1 and 1." });
    if (first === second) faults.push({ path: `${at}.second`, message: "Choose another: it is the same value." });
    const value = read && "value" in read ? read.value : NaN;
    return { first: paths.indexOf(first), second: paths.indexOf(second), value };
  });
  return { correlations, faults };
}

/** Those of which both values still scatter. */
export const stillStanding = (drafts: readonly CorrelationDraft[], paths: readonly string[]): CorrelationDraft[] =>
  drafts.filter(({ first, second }) => paths.includes(first) && paths.includes(second));

/** The pairs of inputs without a correlation. */
export function freePairs(
  inputs: readonly { readonly path: string }[],
  drafts: readonly CorrelationDraft[],
): { first: string; second: string }[] {
  const isTaken = (a: string, b: string): boolean =>
    drafts.some(({ first, second }) => (first === a && second === b) || (first === b && second === a));
  return inputs.flatMap(({ path: first }, i) =>
    inputs.slice(i + 1).flatMap(({ path: second }) => (isTaken(first, second) ? [] : [{ first, second }])),
  );
}
