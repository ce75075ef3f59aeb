import { say } from "../../format/format-quantity.ts";
import { loopMargin, holdLevels } from "./loop-figure.ts";
import type { LoopAxis, LoopFrame, LoopPart } from "./loop-frame.ts";
import type { RunView } from "./run-view.ts";
import { driveSpeed } from "./scales.ts";

/** A word at a line, px from the sheet's top left. */
export interface LoopLabel {
  readonly text: string;
  readonly x: number;
  readonly y: number;
  readonly anchor: "start" | "middle" | "end";
  readonly tone: "slip" | "stick" | "quiet" | "ink";
}

/** Of a sheet, px. */
export interface Size {
  readonly width: number;
  readonly height: number;
}

/** Where a value stands along the sheet, px. */
export const acrossOf = ({ low, high }: LoopAxis, value: number, { width }: Size): number =>
  loopMargin.left + ((value - low) / (high - low)) * (width - loopMargin.left - loopMargin.right);

/** Where a value stands down the sheet, px. */
export const downOf = ({ low, high }: LoopAxis, value: number, { height }: Size): number =>
  loopMargin.top + ((high - value) / (high - low)) * (height - loopMargin.top - loopMargin.bottom);

/** The words at the lines of a loop: what slides, what is stuck, and what it is measured against. */
export function loopLabels(view: RunView, part: LoopPart, frame: LoopFrame, size: Size): LoopLabel[] {
  const { left, right } = loopMargin;
  const level = (text: string, value: number, tone: LoopLabel["tone"]): LoopLabel => ({
    text,
    // What the velocity is measured against runs through the loop's middle; what friction can hold, along its edge.
    x: tone === "stick" ? size.width - right - 4 : (left + size.width - right) / 2,
    y: downOf(frame.upright, value, size) - 6,
    anchor: tone === "stick" ? "end" : "middle",
    tone,
  });
  const levels =
    frame.key === "velocity"
      ? driveSpeed(view).map((speed) => level(view.scenario.base.length > 0 ? "feed" : "belt", speed, "quiet"))
      : holdLevels(view, part, frame).map((force) =>
          level(`holds up to ${say(Math.abs(force), frame.upright.measure, { digits: 4 })}`, force, "stick"),
        );
  return apart([...levels, ...stretchLabels(part, frame, size), ...endLabels(part, frame, size)], size);
}

/** Events of one kind closer than this share of an axis stand at one place. */
const SAME = 0.03;

/** Where a cycle breaks away and where it stops; nothing where every one does so at another place. */
function endLabels(part: LoopPart, frame: LoopFrame, size: Size): LoopLabel[] {
  const { samples, places, events } = part;
  const { across, upright } = frame;
  const values = frame.key === "velocity" ? samples.v : samples.f;
  // Friction jumps at an event: a stick ends with the force before it, and begins with the one after it.
  const at = (text: string, indices: readonly number[]): LoopLabel[] => {
    if (indices.length === 0) return [];
    const met = indices.map((i) => places[i]);
    if (Math.max(...met) - Math.min(...met) > SAME * (across.high - across.low)) return [];
    const last = indices[indices.length - 1];
    const x = acrossOf(across, places[last], size);
    const isLeft = x < size.width / 2;
    // The phase plane has room within the loop, the force loop outside it.
    const anchor = isLeft === (frame.key === "velocity") ? "start" : "end";
    const y = downOf(upright, values[last], size) - 8;
    return [{ text, x: x + (anchor === "end" ? -8 : 8), y, anchor, tone: "quiet" }];
  };
  const ends = events.filter((i) => i > 0 && samples.phase[i - 1] === 0);
  return [
    ...at("breaks away", frame.key === "velocity" ? ends : ends.map((i) => i - 1)),
    ...at(
      "stops",
      events.filter((i) => samples.phase[i] === 0),
    ),
  ];
}

/** About the width of a letter and the height of a line, px. */
const LETTER = 7;
const LINE = 16;

/** Each label within the sheet; of two that would lie over each other the first stays. */
export function apart(labels: readonly LoopLabel[], { width }: Size): LoopLabel[] {
  const kept: LoopLabel[] = [];
  for (const label of labels) {
    const [left, right] = endsOf(label);
    const inside = { ...label, x: label.x - Math.max(0, right - (width - 4)) + Math.max(0, 4 - left) };
    if (!kept.some((other) => isOver(other, inside))) kept.push(inside);
  }
  return kept;
}

function isOver(one: LoopLabel, other: LoopLabel): boolean {
  const [[from, to], [start, end]] = [endsOf(one), endsOf(other)];
  return Math.abs(one.y - other.y) < LINE && from < end && start < to;
}

function endsOf({ text, x, anchor }: LoopLabel): [number, number] {
  const wide = LETTER * text.length;
  const left = x - { start: 0, middle: wide / 2, end: wide }[anchor];
  return [left, left + wide];
}

/** Where the words stand along the longest slip and stick, and px from the line there. */
const spots = {
  velocity: { slip: { share: 0.5, dx: 0, dy: -10 }, stick: { share: 0.5, dx: 0, dy: -10 }, anchor: "middle" },
  friction: { slip: { share: 0.75, dx: 0, dy: 18 }, stick: { share: 0.3, dx: 12, dy: 10 }, anchor: "start" },
} as const;

/** At the longest slip and the longest stick. */
function stretchLabels(part: LoopPart, frame: LoopFrame, size: Size): LoopLabel[] {
  const values = frame.key === "velocity" ? part.samples.v : part.samples.f;
  const at = (tone: "slip" | "stick", text: string): LoopLabel[] => {
    const spot = spots[frame.key][tone];
    const i = longest(part, (phase) => (phase === 0) === (tone === "stick"), spot.share);
    if (i === null) return [];
    const x = acrossOf(frame.across, part.places[i], size) + spot.dx;
    const y = downOf(frame.upright, values[i], size) + spot.dy;
    return [{ text, x, y, anchor: spots[frame.key].anchor, tone }];
  };
  return [...at("slip", "slipping"), ...at("stick", "stuck")];
}

/** The sample at a share of the stretch that reaches farthest; null without one. */
function longest({ samples, places, events }: LoopPart, isKind: (phase: number) => boolean, share: number) {
  const edges = [0, ...events, places.length];
  let best: { reach: number; index: number } | null = null;
  for (let k = 0; k + 1 < edges.length; k++) {
    const [from, to] = [edges[k], edges[k + 1] - 1];
    if (to <= from || !isKind(samples.phase[from])) continue;
    const reach = Math.abs(places[to] - places[from]);
    if (!best || reach > best.reach) best = { reach, index: Math.round(from + share * (to - from)) };
  }
  return best?.index ?? null;
}
