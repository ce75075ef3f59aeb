import type { Anchor } from "@restband/api/contract";

/** Where the plot of a figure lies, px, and the times at its two ends. */
export interface PlotPlace {
  readonly left: number;
  readonly right: number;
  readonly from: number;
  readonly to: number;
}

/** A comment on the time axis: where its number stands, and the span it is about. */
export interface Pin {
  readonly number: number;
  readonly x: number;
  /** Of a span: its two ends; null for an instant. */
  readonly ends: readonly [number, number] | null;
  /** Left edge of the column it leads to; null where that stands in a later row. */
  readonly column: number | null;
}

export const xOfTime = ({ left, right, from, to }: PlotPlace, t: number): number =>
  left + ((right - left) * (t - from)) / (to - from);

/** The time at a place, within the axis. */
export function timeOfX({ left, right, from, to }: PlotPlace, x: number): number {
  const share = Math.min(1, Math.max(0, (x - left) / (right - left)));
  return from + share * (to - from);
}

/** The middle of what a comment is about, s; null for what is not on the time axis. */
export function middleOf(anchor: Anchor): number | null {
  if (anchor.kind === "instant") return anchor.t;
  return anchor.kind === "span" ? (anchor.from + anchor.to) / 2 : null;
}

/** Comments in the order of their columns: along the time axis first, then those on fields and on the whole. */
export function inOrder<C extends { readonly anchor: Anchor; readonly number: number }>(comments: readonly C[]): C[] {
  const place = ({ anchor }: C) => middleOf(anchor) ?? Infinity;
  return [...comments].sort((a, b) => place(a) - place(b) || a.number - b.number || 0);
}

/** The pins of comments that are in order: those of the first row lead to their columns. */
export function pinsOf(
  comments: readonly { readonly anchor: Anchor; readonly number: number }[],
  plot: PlotPlace,
  columns: readonly number[],
): Pin[] {
  return comments.flatMap(({ anchor, number }, i) => {
    const middle = middleOf(anchor);
    if (middle === null) return [];
    const ends = anchor.kind === "span" ? ([xOfTime(plot, anchor.from), xOfTime(plot, anchor.to)] as const) : null;
    return [{ number, x: xOfTime(plot, middle), ends, column: columns[i] ?? null }];
  });
}

/**
 * The level, px below the axis, at which each leader turns towards its column, so that no two cross: of leaders that go
 * left the later turns lower, of those that go right the earlier does.
 */
export function turnsOf(pins: readonly Pin[], top: number, step: number): number[] {
  const goesRight = ({ x, column }: Pin) => column !== null && column > x;
  return pins.map((pin, i) => {
    const before = pins.slice(0, i).filter((other) => other.column !== null && !goesRight(other)).length;
    const after = pins.slice(i + 1).filter((other) => goesRight(other)).length;
    return top + step * (goesRight(pin) ? after : before);
  });
}
