/** A stretch of one kind: above the line (1), below it (−1) or across it (0). */
export interface StripInterval {
  readonly from: number;
  readonly to: number;
  readonly phase: -1 | 0 | 1;
}

interface StripFrame {
  from: number;
  to: number;
  width: number;
  height: number;
}

/** Paths of a strip, one per kind. */
export interface StripShapes {
  forward: string;
  stick: string;
  back: string;
}

/** Below this width, in pixels, stretches are no longer told apart but shown by their share. */
const NARROW = 2;

/**
 * Draws stretches as blocks: forward fills the upper half, back the lower, stick the middle half. Where they become too
 * narrow to be told apart each column shows the share of its time spent in each kind as a height.
 */
export function stripShapes(intervals: readonly StripInterval[], frame: StripFrame): StripShapes {
  const visible = intervals.filter(({ from, to }) => to > frame.from && from < frame.to);
  const isDense = visible.length * NARROW > frame.width;
  return isDense ? columns(visible, frame) : blocks(visible, frame);
}

function blocks(intervals: readonly StripInterval[], { from, to, width, height }: StripFrame): StripShapes {
  const x = (t: number): number => round((Math.min(Math.max(t, from), to) - from) * (width / (to - from)));
  const draw = (phase: number, top: number, tall: number): string =>
    intervals
      .filter((interval) => interval.phase === phase)
      .map((interval) => rectangle(x(interval.from), top, Math.max(0.75, x(interval.to) - x(interval.from)), tall))
      .join("");
  return {
    forward: draw(1, 0, height / 2),
    stick: draw(0, height / 4, height / 2),
    back: draw(-1, height / 2, height / 2),
  };
}

function columns(intervals: readonly StripInterval[], frame: StripFrame): StripShapes {
  const count = Math.max(1, Math.floor(frame.width / NARROW));
  const share = shares(intervals, frame, count);
  const shapes: StripShapes = { forward: "", stick: "", back: "" };
  const half = frame.height / 2;
  for (let i = 0; i < count; i++) {
    const x = round((i * frame.width) / count);
    const wide = round(frame.width / count);
    const [back, stick, forward] = [share[0][i], share[1][i], share[2][i]].map((part) => round(part * half));
    if (forward > 0) shapes.forward += rectangle(x, round(half - forward), wide, forward);
    if (back > 0) shapes.back += rectangle(x, half, wide, back);
    if (stick > 0) shapes.stick += rectangle(x, round(half - stick / 2), wide, stick);
  }
  return shapes;
}

/** Per kind (−1, 0, 1 in this order) the share of each column's time. */
function shares(intervals: readonly StripInterval[], { from, to }: StripFrame, count: number): Float64Array[] {
  const share = [-1, 0, 1].map(() => new Float64Array(count));
  const perColumn = (to - from) / count;
  for (const interval of intervals) {
    const start = Math.max(interval.from, from);
    const end = Math.min(interval.to, to);
    const last = Math.min(count - 1, Math.floor((end - from) / perColumn));
    for (let i = Math.floor((start - from) / perColumn); i <= last; i++) {
      const inside = Math.min(end, from + (i + 1) * perColumn) - Math.max(start, from + i * perColumn);
      share[interval.phase + 1][i] += Math.max(0, inside) / perColumn;
    }
  }
  return share;
}

const rectangle = (x: number, y: number, width: number, height: number): string =>
  `M${x} ${y}h${round(width)}v${height}h${-round(width)}z`;

const round = (value: number): number => Math.round(value * 100) / 100;
