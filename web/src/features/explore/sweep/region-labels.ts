import { cellOutcomes } from "@restband/solver";
import { sideWords } from "./line-names.ts";
import { cornerOf, type MapFrame } from "./map-frame.ts";
import type { Shown } from "./shown.ts";
import type { SweepCells } from "./sweep-cells.ts";

/** A name on the map: its middle and how wide it is, px. */
export interface RegionLabel {
  readonly words: string;
  readonly x: number;
  readonly y: number;
  readonly width: number;
}

/** The longest runs of cells of one side along a row, and how many cells it has in all. */
interface Region {
  runs: { row: number; from: number; length: number }[];
  count: number;
}

/** About so wide is a letter of the labels, px. */
const LETTER = 7.9;
/** Regions smaller than this share of the map are not named on it. */
const LEAST_SHARE = 0.03;

/**
 * The name of each outcome, or of each verdict of a limit, in the middle of its longest run of cells along a row; where
 * several rows have one so long, in the middle one of them.
 */
export function regionLabels(cells: SweepCells, first: number, frame: MapFrame, shown: Shown): RegionLabel[] {
  const regions = new Map<string, Region>();
  for (let row = 0; row < frame.rows; row++) {
    const wordsAt = (column: number) => wordsOf(cells, first + row * frame.columns + column, shown);
    for (let from = 0, column = 1; column <= frame.columns; column++) {
      const words = wordsAt(from);
      if (column < frame.columns && wordsAt(column) === words) continue;
      if (words !== null) regions.set(words, withRun(regions.get(words), { row, from, length: column - from }));
      from = column;
    }
  }
  return [...regions]
    .filter(([, { count }]) => count >= LEAST_SHARE * frame.columns * frame.rows)
    .map(([words, { runs }]) => {
      const { row, from, length } = runs[runs.length >> 1];
      return labelOf(words, frame, row, from + length / 2);
    });
}

function withRun(region: Region | undefined, run: Region["runs"][number]): Region {
  const longest = region?.runs[0]?.length ?? 0;
  const count = (region?.count ?? 0) + run.length;
  if (region && run.length < longest) return { ...region, count };
  return { runs: region && run.length === longest ? [...region.runs, run] : [run], count };
}

function wordsOf(cells: SweepCells, cell: number, shown: Shown): string | null {
  if (shown.kind === "limit") {
    const kept = cells.kept(cell, shown.limit);
    return kept === null ? null : sideWords(kept ? "kept" : "broken");
  }
  const code = cells.code(cell);
  return code === null || code < 0 ? null : sideWords(cellOutcomes[code]);
}

function labelOf(words: string, frame: MapFrame, row: number, column: number): RegionLabel {
  const { x, y } = cornerOf(frame, column, row);
  const width = words.length * LETTER + 16;
  const right = frame.left + frame.columns * frame.cellWidth;
  const inside = Math.min(Math.max(x, frame.left + width / 2 + 4), right - width / 2 - 4);
  return { words, x: inside, y: y + frame.cellHeight / 2, width };
}
