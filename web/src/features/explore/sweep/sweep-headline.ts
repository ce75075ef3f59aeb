import { cellOutcomes, type Outcome } from "@restband/solver";
import { formatNumber } from "../../../format/format-number.ts";
import { listed } from "../../../format/words.ts";
import type { SweepCells } from "./sweep-cells.ts";

/** What several cells do, and what one does. */
const doings: Record<Outcome, readonly [string, string]> = {
  "never-moved": ["never move", "never moves"],
  "came-to-rest": ["come to rest", "comes to rest"],
  "too-short": ["are too short to tell", "is too short to tell"],
  growing: ["grow", "grows"],
  "stick-slip": ["stick and slip", "sticks and slips"],
  settles: ["settle", "settles"],
  "not-settled": ["have not settled", "has not settled"],
  "smooth-sliding": ["slide smoothly", "slides smoothly"],
};
const unanswered = ["have no answer", "has no answer"] as const;

/** How many cells came to what, the most first: "Of 224 cells 150 stick and slip and 74 slide smoothly." */
export function sweepHeadline(cells: SweepCells): string {
  const counts = countsOf(cells);
  if (counts.length === 0) return "No cell is there yet.";
  const parts = counts.map(({ doing, count }) => `${figure(count)} ${doing}`);
  return `Of ${figure(cells.done)} cells ${listed(parts)}.`;
}

const figure = (count: number): string => formatNumber(count, 9);

/** Cells by what they came to, the most first; those refused or cut off last. */
function countsOf(cells: SweepCells): { doing: string; count: number }[] {
  const counts = new Map<number, number>();
  for (let cell = 0; cell < cells.count; cell++) {
    const code = cells.code(cell);
    if (code !== null) counts.set(Math.max(-1, code), (counts.get(Math.max(-1, code)) ?? 0) + 1);
  }
  return [...counts]
    .sort(([a, x], [b, y]) => Number(b >= 0) - Number(a >= 0) || y - x)
    .map(([code, count]) => {
      const [many, one] = code < 0 ? unanswered : doings[cellOutcomes[code]];
      return { doing: count === 1 ? one : many, count };
    });
}
