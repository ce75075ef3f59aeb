import { cellOutcomes } from "@restband/solver";
import { outcomeWords } from "../../../format/outcomes.ts";
import { cornerOf, type MapFrame } from "./map-frame.ts";
import type { SweepCells } from "./sweep-cells.ts";

export interface RegionLabel {
  readonly words: string;
  readonly x: number;
  readonly y: number;
  readonly width: number;
}

/** About so wide is a letter of the labels, px. */
const LETTER = 7.9;
/** Regions smaller than this share of the map are not named on it. */
const LEAST_SHARE = 0.03;

/** The name of each outcome in the middle of its longest run of cells along a row. */
export function regionLabels(cells: SweepCells, first: number, frame: MapFrame): RegionLabel[] {
  const total = frame.columns * frame.rows;
  const longest = new Map<number, { row: number; from: number; length: number; count: number }>();
  for (let row = 0; row < frame.rows; row++) {
    let from = 0;
    for (let column = 1; column <= frame.columns; column++) {
      const code = cells.code(first + row * frame.columns + from);
      if (column < frame.columns && cells.code(first + row * frame.columns + column) === code) continue;
      if (code !== null && code >= 0) {
        const best = longest.get(code);
        const count = (best?.count ?? 0) + column - from;
        const isBetter = !best || column - from > best.length;
        longest.set(code, isBetter ? { row, from, length: column - from, count } : { ...best, count });
      }
      from = column;
    }
  }
  return [...longest]
    .filter(([, { count }]) => count >= LEAST_SHARE * total)
    .map(([code, { row, from, length }]) => labelOf(outcomeWords[cellOutcomes[code]], frame, row, from + length / 2));
}

function labelOf(words: string, frame: MapFrame, row: number, column: number): RegionLabel {
  const { x, y } = cornerOf(frame, column, row);
  const width = words.length * LETTER + 16;
  const right = frame.left + frame.columns * frame.cellWidth;
  const inside = Math.min(Math.max(x, frame.left + width / 2 + 4), right - width / 2 - 4);
  return { words, x: inside, y: y + frame.cellHeight / 2, width };
}
