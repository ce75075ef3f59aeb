import type { Label, Point, Shape, Tone } from "./sketch-shapes.ts";

/** From along (u) and above (w) the guide to the page. */
export type Place = (u: number, w: number) => Point;

/** A guide that rises by an angle (degrees) towards growing u, turned about u = w = 0. */
export function inclinedPlace(degrees: number): Place {
  const angle = (degrees * Math.PI) / 180;
  const [cosine, sine] = [Math.cos(angle), Math.sin(angle)];
  return (u, w) => [u * cosine - w * sine, -u * sine - w * cosine];
}

const stroke = 1.75;

/** A zigzag coil from u to v at height w. */
export function coil(place: Place, u: number, v: number, w: number): Shape {
  const lead = Math.min(12, (v - u) / 5);
  const turns = 7;
  const pitch = (v - u - 2 * lead) / turns;
  const teeth = Array.from({ length: turns * 2 }, (_, i) =>
    place(u + lead + (i / 2 + 0.25) * pitch, w + (i % 2 === 0 ? 7 : -7)),
  );
  const points = [place(u, w), place(u + lead, w), ...teeth, place(v - lead, w), place(v, w)];
  return { kind: "line", points, tone: "ink", width: stroke };
}

/** A dashpot from u to v at height w: rod and piston on the left, pot on the right. */
export function dashpot(place: Place, u: number, v: number, w: number): Shape[] {
  const middle = (u + v) / 2;
  const line = (...points: Point[]): Shape => ({ kind: "line", points, tone: "ink", width: stroke });
  return [
    line(place(u, w), place(middle, w)),
    line(place(middle, w + 5), place(middle, w - 5)),
    line(place(middle - 9, w + 8), place(middle + 11, w + 8), place(middle + 11, w - 8), place(middle - 9, w - 8)),
    line(place(middle + 11, w), place(v, w)),
  ];
}

/** What stands still: a hatched strip with its edge towards the body. `depth` is along −w. */
export function ground(place: Place, u: number, v: number, w: number, depth: number): Shape[] {
  return [
    {
      kind: "area",
      points: [place(u, w), place(v, w), place(v, w - depth), place(u, w - depth)],
      tone: "ink",
      width: 0,
      fill: "hatch-ground",
    },
    { kind: "line", points: [place(u, w), place(v, w)], tone: "ink", width: stroke },
  ];
}

/** A wall at u from w to top, hatched on its far side; `depth` may be negative. */
export function wall(place: Place, u: number, w: number, top: number, depth: number): Shape[] {
  return [
    {
      kind: "area",
      points: [place(u, w), place(u, top), place(u + depth, top), place(u + depth, w)],
      tone: "ink",
      width: 0,
      fill: "hatch-ground",
    },
    { kind: "line", points: [place(u, w), place(u, top)], tone: "ink", width: stroke },
  ];
}

/** A rectangle from u to v, w to top. */
export function block(place: Place, u: number, v: number, w: number, top: number, fill: "raised" | "solid"): Shape {
  const points = [place(u, w), place(v, w), place(v, top), place(u, top)];
  return { kind: "area", points, tone: "ink", width: fill === "solid" ? 0 : stroke, fill };
}

export const label = (
  at: Point,
  text: string,
  anchor: Label["anchor"],
  more: Partial<Pick<Label, "tone" | "isBold" | "isFigure">> = {},
): Label => ({ kind: "label", at, text, anchor, tone: "ink", ...more });

export const arrow = (from: Point, to: Point, tone: Tone = "ink"): Shape => ({ kind: "arrow", from, to, tone });

/** An arrow along the guide that points with the sign of a value from `u`, `length` long; nothing at 0. */
export function signedArrow(place: Place, u: number, w: number, length: number, value: number, tone: Tone): Shape[] {
  if (value === 0) return [];
  const [from, to] = value > 0 ? [u - length, u] : [u, u - length];
  return [arrow(place(from, w), place(to, w), tone)];
}
