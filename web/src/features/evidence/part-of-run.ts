/** A part of a run, s. */
export interface Range {
  readonly from: number;
  readonly to: number;
}

/** Not closer than this share of the run. */
const CLOSEST = 1e-5;

/** The part made `factor` times as wide about an instant, which keeps its place; within the run, the whole of it at most. */
export function zoomed({ from, to }: Range, whole: number, about: number, factor: number): Range {
  const width = Math.min(whole, Math.max(CLOSEST * whole, (to - from) * factor));
  const share = Math.min(1, Math.max(0, (about - from) / (to - from)));
  return placed(about - share * width, width, whole);
}

/** The part between two instants in either order, as far as the run reaches; widened where it is closer than can be seen. */
export function between(one: number, other: number, whole: number): Range {
  const [from, to] = [Math.max(0, Math.min(one, other)), Math.min(whole, Math.max(one, other))];
  const width = Math.max(to - from, CLOSEST * whole);
  return placed(width > to - from ? (from + to - width) / 2 : from, width, whole);
}

/** The least width of a part, s. */
export const closest = (whole: number): number => CLOSEST * whole;

/** The part moved along by `by` seconds, as far as the run reaches. */
export const panned = ({ from, to }: Range, whole: number, by: number): Range => placed(from + by, to - from, whole);

/** The part itself where it holds the instant, else moved so that the instant is in its middle. */
export function following(part: Range, whole: number, t: number): Range {
  if (t >= part.from && t <= part.to) return part;
  const width = part.to - part.from;
  return placed(t - width / 2, width, whole);
}

export const isClosest = ({ from, to }: Range, whole: number): boolean => to - from <= CLOSEST * whole * (1 + 1e-9);

export const isWhole = ({ from, to }: Range, whole: number): boolean => from <= 0 && to >= whole;

function placed(wanted: number, width: number, whole: number): Range {
  const from = Math.min(Math.max(0, wanted), Math.max(0, whole - width));
  return { from, to: Math.min(whole, from + width) };
}
