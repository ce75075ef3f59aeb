import type { Unit } from "../../format/unit.ts";

export type PanelKey = "displacement" | "velocity" | "acceleration" | "friction" | "drive";

/** The range of a panel in SI, and the unit it is drawn in. */
export interface PanelScale {
  readonly key: PanelKey;
  readonly low: number;
  readonly high: number;
  readonly unit: Unit;
}

/** A panel in place: px from the top of the figure. */
export interface PanelFrame extends PanelScale {
  readonly top: number;
  readonly height: number;
}

/** The whole figure in place. Panels share the time axis and lie one below the other. */
export interface Frame {
  readonly width: number;
  readonly height: number;
  /** Room beside the panels, px: for the figures of the axes, and for the readings. */
  readonly left: number;
  readonly right: number;
  readonly from: number;
  readonly to: number;
  readonly panels: readonly PanelFrame[];
}

const heights: Record<PanelKey, number> = {
  displacement: 196,
  velocity: 116,
  acceleration: 116,
  friction: 132,
  drive: 116,
};
/** Above each panel: its unit stands there. */
const HEAD = 34;
const FOOT = 58;

/** Lays the panels out. A narrow figure has no gutter: readings then stand above it. */
export function frameOf(width: number, range: { from: number; to: number }, scales: readonly PanelScale[]): Frame {
  const isNarrow = width < 700;
  let top = 0;
  const panels = scales.map((scale) => {
    const panel = { ...scale, top: top + HEAD, height: heights[scale.key] };
    top += HEAD + panel.height;
    return panel;
  });
  return { width, height: top + FOOT, left: isNarrow ? 52 : 76, right: isNarrow ? 14 : 180, ...range, panels };
}

export const plotWidth = ({ width, left, right }: Frame): number => Math.max(1, width - left - right);

/** Where a time stands, px from the left edge of the figure. */
export const xOf = (frame: Frame, t: number): number =>
  frame.left + ((t - frame.from) / (frame.to - frame.from)) * plotWidth(frame);

/** The time at a place; within the range. */
export function timeAt(frame: Frame, x: number): number {
  const share = Math.min(1, Math.max(0, (x - frame.left) / plotWidth(frame)));
  return frame.from + share * (frame.to - frame.from);
}

/** Where a value stands, px from the top of the figure. */
export const yOf = ({ top, height, low, high }: PanelFrame, value: number): number =>
  top + ((high - value) / (high - low)) * height;

/** A range that holds all values with a little air; one of no height is opened by `least`, or by its own size. */
export function padded(low: number, high: number, least: number): { low: number; high: number } {
  const size = high - low;
  const air = size > 0 ? 0.06 * size : Math.max(least, 0.5 * Math.abs(high));
  return { low: low - air, high: high + air };
}
