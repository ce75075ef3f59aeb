import { cellCount, sizesOf } from "./axis-values.ts";
import { rowLength } from "../cells/cell-row.ts";
import type { SweepPlan } from "./sweep-plan.ts";

/*
 * The cells of a sweep are run and saved by tiles. Without continuation the first tile is a coarse look: cells at even
 * distances over the whole map. The others are blocks of neighbours, so that those at a boundary of the coarse look can be
 * run first. With continuation a tile is whole lines, each in the order its cells follow one another.
 */

export const mostTileCells = 4096;
/** A tile as base64 stays below a megabyte. */
const mostTileBytes = 720_000;
const blocksAcross = 8;
const smallestSide = 8;
const blocksAlong = 64;

/** How many cells a tile of this sweep has at most. */
export const mostCellsOf = (plan: SweepPlan): number =>
  Math.min(mostTileCells, Math.floor(mostTileBytes / (8 * rowLength(plan))));

/** How many tiles a sweep has. */
export const tileCount = (plan: SweepPlan): number =>
  plan.continuation === "none" ? blocksOf(plan).length + 1 : lineTiles(plan).tiles;

/** The indices of a tile's cells, in the order of its rows. Throws RangeError where the sweep has no such tile. */
export function tileCells(plan: SweepPlan, tile: number): Uint32Array {
  if (!Number.isInteger(tile) || tile < 0 || tile >= tileCount(plan))
    throw new RangeError(`this sweep has no tile ${tile}; it has ${tileCount(plan)}`);
  if (plan.continuation !== "none") return cellsOfLines(plan, tile);
  return tile === 0 ? coarseCells(plan) : blockCells(plan, blocksOf(plan)[tile - 1]);
}

/**
 * The order in which the tiles are best run: the coarse look, then the blocks it shows a boundary in (cells of other
 * outcomes or verdicts within the block or at its edges), then the rest.
 *
 * @param coarse rows of the first tile; null while they are not known: then the tiles as they are numbered
 */
export function tileOrder(plan: SweepPlan, coarse: Float64Array | null): number[] {
  const all = Array.from({ length: tileCount(plan) }, (_, tile) => tile);
  if (coarse === null || plan.continuation !== "none") return all;
  const kinds = coarseKinds(plan, coarse);
  const atBoundary = blocksOf(plan).map((block) => new Set(kinds(block)).size > 1);
  return [
    0,
    ...all.slice(1).filter((tile) => atBoundary[tile - 1]),
    ...all.slice(1).filter((tile) => !atBoundary[tile - 1]),
  ];
}

interface Block {
  /** First and one past the last place along each axis. */
  readonly from: readonly [number, number];
  readonly to: readonly [number, number];
}

/** Sides of a block, and the distance of the cells of the coarse look. */
function grainOf(plan: SweepPlan): { sides: [number, number]; steps: [number, number] } {
  const sizes = sizesOf(plan);
  const across = plan.axes.length === 1 ? blocksAlong : blocksAcross;
  const sides = sizes.map((size) => Math.max(Math.ceil(size / across), Math.min(size, smallestSide))) as [
    number,
    number,
  ];
  while (sides[0] * sides[1] > mostCellsOf(plan)) {
    const larger = sides[0] >= sides[1] ? 0 : 1;
    sides[larger] = Math.ceil(sides[larger] / 2);
  }
  return { sides, steps: sides.map((side) => Math.max(1, Math.ceil(side / 2))) as [number, number] };
}

/** Blocks that hold cells besides those of the coarse look. */
function blocksOf(plan: SweepPlan): Block[] {
  const sizes = sizesOf(plan);
  const { sides } = grainOf(plan);
  const blocks: Block[] = [];
  for (let j = 0; j < sizes[1]; j += sides[1])
    for (let i = 0; i < sizes[0]; i += sides[0])
      blocks.push({ from: [i, j], to: [Math.min(i + sides[0], sizes[0]), Math.min(j + sides[1], sizes[1])] });
  const { steps } = grainOf(plan);
  return blocks.filter(({ from, to }) =>
    steps.some((step, i) => step > 1 && (to[i] - from[i] > 1 || from[i] % step !== 0)),
  );
}

function blockCells(plan: SweepPlan, { from, to }: Block): Uint32Array {
  const [size] = sizesOf(plan);
  const { steps } = grainOf(plan);
  const cells: number[] = [];
  for (let j = from[1]; j < to[1]; j++)
    for (let i = from[0]; i < to[0]; i++) if (i % steps[0] !== 0 || j % steps[1] !== 0) cells.push(j * size + i);
  return Uint32Array.from(cells);
}

function coarseCells(plan: SweepPlan): Uint32Array {
  const [first, second] = sizesOf(plan);
  const { steps } = grainOf(plan);
  const cells: number[] = [];
  for (let j = 0; j < second; j += steps[1]) for (let i = 0; i < first; i += steps[0]) cells.push(j * first + i);
  return Uint32Array.from(cells);
}

/** What the coarse look found within a block and just past its far edges, as texts to be compared. */
function coarseKinds(plan: SweepPlan, rows: Float64Array): (block: Block) => string[] {
  const length = rowLength(plan);
  const sizes = sizesOf(plan);
  const { steps } = grainOf(plan);
  const across = Math.ceil(sizes[0] / steps[0]);
  const up = Math.ceil(sizes[1] / steps[1]);
  const kindAt = (i: number, j: number) => {
    const offset = (j * across + i) * length;
    return `${rows[offset]} ${rows[offset + 1]}`;
  };
  return ({ from, to }) => {
    const kinds: string[] = [];
    const last = [Math.min(across - 1, Math.ceil(to[0] / steps[0])), Math.min(up - 1, Math.ceil(to[1] / steps[1]))];
    for (let j = Math.floor(from[1] / steps[1]); j <= last[1]; j++)
      for (let i = Math.floor(from[0] / steps[0]); i <= last[0]; i++) kinds.push(kindAt(i, j));
    return kinds;
  };
}

function lineTiles(plan: SweepPlan): { linesEach: number; tiles: number } {
  const [first] = sizesOf(plan);
  const lines = cellCount(plan) / first;
  const linesEach = Math.max(1, Math.min(Math.floor(mostCellsOf(plan) / first), Math.ceil(lines / blocksAlong)));
  return { linesEach, tiles: Math.ceil(lines / linesEach) };
}

function cellsOfLines(plan: SweepPlan, tile: number): Uint32Array {
  const [first, second] = sizesOf(plan);
  const { linesEach } = lineTiles(plan);
  const lines = cellCount(plan) / first;
  const cells: number[] = [];
  for (let line = tile * linesEach; line < Math.min(lines, (tile + 1) * linesEach); line++) {
    const isDown = plan.continuation === "down" || line >= second;
    for (let i = 0; i < first; i++) cells.push(line * first + (isDown ? first - 1 - i : i));
  }
  return Uint32Array.from(cells);
}
