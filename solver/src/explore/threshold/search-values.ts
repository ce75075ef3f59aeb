import type { Bounds } from "../../field.ts";

const digits = 5;
const closest = 1e-4;
/** Where a flip lies at 0 no relative distance is ever reached. */
const closestOfRange = 1e-9;

/** `points` values from low to high, both among them, the others of five digits; of whole numbers fewer where there are no more. */
export function scanValues(low: number, high: number, points: number, { integer }: Bounds): number[] {
  const isLog = low * high > 0 && Math.max(low / high, high / low) >= 10;
  const valueAt = (share: number) => (isLog ? low * (high / low) ** share : low + share * (high - low));
  const inner = Array.from({ length: points - 2 }, (_, i) => valueAt((i + 1) / (points - 1)));
  const rounded = inner.map((value) => (integer ? Math.round(value) : Number(value.toPrecision(digits))));
  return [...new Set([low, ...rounded.filter((value) => value > low && value < high), high])];
}

/**
 * The value to try next between two: on a grid of five digits, so that the ends of a bracket are the numbers people read.
 * Null where they are close enough: 1e-4 relative, neighbours on the grid, or whole numbers without one between.
 */
export function valueBetween(low: number, high: number, range: number, { integer }: Bounds): number | null {
  const middle = (low + high) / 2;
  if (integer) return high - low > 1 ? Math.floor(middle) : null;
  if (high - low <= closestOfRange * range) return null;
  const size = Math.max(Math.abs(low), Math.abs(high));
  const step = 10 ** (Math.floor(Math.log10(size)) - digits + 1);
  const onGrid = Number((Math.round(middle / step) * step).toPrecision(12));
  if (onGrid > low && onGrid < high) return onGrid;
  return high - low > closest * size * (1 + 1e-9) ? middle : null;
}
