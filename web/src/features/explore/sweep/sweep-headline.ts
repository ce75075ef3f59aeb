import { cellOutcomes, type Scenario } from "@restband/solver";
import { nounOf } from "../../../format/noun.ts";
import { formatNumber } from "../../../format/format-number.ts";
import { outcomeWords } from "../../../format/outcomes.ts";
import { capitalised, listed } from "../../../format/words.ts";
import type { SweepCells } from "./sweep-cells.ts";

/** How many cells came to what, the most first: "The carriage sticks and slips in 150 of 224 cells, slides smoothly in 74." */
export function sweepHeadline(cells: SweepCells, scenario: Scenario): string {
  const counts = countsOf(cells);
  if (counts.length === 0) return "No cell is there yet.";
  const parts = counts.map(({ words, count }, i) =>
    i === 0
      ? `${words} in ${formatNumber(count, 9)} of ${formatNumber(cells.done, 9)} cells`
      : `${words} in ${formatNumber(count, 9)}`,
  );
  return capitalised(`the ${nounOf(scenario)} ${listed(parts)}.`);
}

/** Cells by what they came to, the most first; those refused or cut off last. */
export function countsOf(cells: SweepCells): { words: string; count: number }[] {
  const counts = new Map<number, number>();
  for (let cell = 0; cell < cells.count; cell++) {
    const code = cells.code(cell);
    if (code !== null) counts.set(Math.max(-1, code), (counts.get(Math.max(-1, code)) ?? 0) + 1);
  }
  return [...counts]
    .sort(([a, x], [b, y]) => Number(b >= 0) - Number(a >= 0) || y - x)
    .map(([code, count]) => ({ words: code < 0 ? "has no answer" : outcomeWords[cellOutcomes[code]], count }));
}
