import { formatExactly } from "../../format/format-number.ts";
import {
  appliedWords,
  baseWords,
  beltWords,
  damperWords,
  inertiaWords,
  pressWords,
  rubs,
  springWords,
} from "./sketch-labels.ts";
import {
  arrow,
  block,
  coil,
  dashpot,
  ground,
  inclinedPlace,
  label,
  signedArrow,
  wall,
  type Place,
} from "./sketch-parts.ts";
import { shiftOf } from "./sketch-scale.ts";
import type { Label, Shape } from "./sketch-shapes.ts";
import type { SketchState } from "./sketch-state.ts";

/** Measures of the drawing along and above the guide, CSS pixels. */
interface Measures {
  readonly place: Place;
  /** The guide runs from 0 to this. */
  readonly length: number;
  /** Left and right edge of the body. */
  readonly left: number;
  readonly right: number;
  /** Right end of the upper counterface of a clamped body. */
  readonly lid: number;
  /** Face of the base, towards the body. */
  readonly base: number;
  /** Degrees, and whether that is steep enough for labels to stand on one side. */
  readonly incline: number;
  readonly isSteep: boolean;
}

const foot = 6;
const top = 70;
const springAt = 54;
const damperAt = 28;
const steepFrom = 4;
const tallest = 230;

/** The body on its guide, with spring, damper, contact, base and forces; u grows with x, to the right and up the incline. */
export function linearSketch(state: SketchState, width: number): Shape[] {
  const { scenario } = state;
  const at = measuresFor(state, width);
  return [
    ...counterface(state, at),
    ...link(state, at),
    ...baseMotion(state, at),
    block(at.place, at.left, at.right, rubs(scenario) ? foot : 12, top, "raised"),
    ...feet(state, at),
    label(at.place((at.left + at.right) / 2, 40), inertiaWords(scenario), "middle", { isBold: true, isFigure: true }),
    ...pressing(state, at),
    ...applied(state, at),
    ...inclineMark(at),
  ];
}

function measuresFor(state: SketchState, width: number): Measures {
  const { incline, force } = state.scenario;
  const sine = Math.abs(Math.sin((incline * Math.PI) / 180));
  const cosine = Math.sqrt(1 - sine * sine);
  // the body's height leans sideways too: the whole is to fit across and to stay of a page's height
  const length = sine === 0 ? width : Math.max(190, Math.min(tallest / sine, (width - 120 * sine) / cosine));
  const breadth = length < 300 ? 76 : 112;
  const room = (force.length > 0 ? 62 : 0) + 26;
  const left = room + shiftOf(state, length < 300 ? 10 : 20);
  const isSteep = Math.abs(incline) >= steepFrom;
  return {
    place: inclinedPlace(incline),
    length,
    left,
    right: left + breadth,
    lid: room + breadth + 24,
    base: length - 18,
    incline,
    isSteep,
  };
}

function counterface({ scenario }: SketchState, { place, length, lid: end }: Measures): Shape[] {
  const { counterface: face, normal } = scenario.contact;
  const lid = rubs(scenario) && normal.faces > 1 ? ground(place, 0, end, top + foot, -9) : [];
  if (typeof face === "object") return [...belt(scenario, place, length), ...lid];
  if (face === "ground" || !rubs(scenario)) return [...ground(place, 0, length, 0, 9), ...lid];
  // a plate that goes with the base, on rollers
  const rollers = [0.2, 0.5, 0.8].map((part): Shape => ({
    kind: "disc",
    centre: place(part * length, -11),
    radius: 5,
    tone: "ink",
    width: 1.25,
    fill: "raised",
  }));
  return [block(place, 0, length, -6, 0, "raised"), ...rollers, ...ground(place, 0, length, -16, 9), ...lid];
}

function belt(scenario: SketchState["scenario"], place: Place, length: number): Shape[] {
  const roller = (u: number): Shape => ({
    kind: "disc",
    centre: place(u, -11),
    radius: 11,
    tone: "ink",
    width: 1.75,
    fill: "raised",
  });
  const { counterface: face } = scenario.contact;
  const direction = typeof face === "object" && face.velocity < 0 ? -1 : 1;
  const middle = length / 2;
  return [
    roller(12),
    roller(length - 12),
    { kind: "line", points: [place(12, 0), place(length - 12, 0)], tone: "ink", width: 1.75 },
    { kind: "line", points: [place(12, -22), place(length - 12, -22)], tone: "ink", width: 1.75 },
    arrow(place(middle - 62 - 18 * direction, -11), place(middle - 62 + 18 * direction, -11)),
    label(place(middle - 34, -11), beltWords(scenario), "start"),
  ];
}

/** Spring and damper between body and base, with what they are. */
function link({ scenario }: SketchState, { place, right, base, incline, isSteep }: Measures): Shape[] {
  const [spring, damper] = [springWords(scenario), damperWords(scenario)];
  const hasBase = spring !== "" || damper !== "" || scenario.base.length > 0;
  if (!hasBase) return [];
  const middle = (right + base) / 2;
  const parts: Shape[] = wall(place, base, 0, top + 14, 9);
  if (spring !== "") parts.push(coil(place, right, base, springAt));
  if (damper !== "") parts.push(...dashpot(place, right, base, damperAt));
  if (!isSteep) {
    if (spring !== "") parts.push(label(place(middle, springAt + 17), spring, "middle"));
    if (damper !== "") parts.push(label(place(middle, damperAt - 16), damper, "middle"));
    return parts;
  }
  // on a steep guide words stand on the free side of the spring, one above the other
  const [x, y] = place(middle, springAt + (scenario.contact.normal.faces > 1 ? 36 : isNearlyLevel(incline) ? 21 : 16));
  const words = [spring, damper].filter((each) => each !== "");
  return [
    ...parts,
    ...words.map((text, i) =>
      label([x, y + (i - words.length + 1) * 17], text, isNearlyLevel(incline) ? "middle" : outwards(incline)),
    ),
  ];
}

/** Labels on the free side of a rising guide run away from it. */
const outwards = (incline: number): Label["anchor"] => (incline > 0 ? "end" : "start");

/** On such a guide labels stand much as on a level one. */
const isNearlyLevel = (incline: number): boolean => Math.abs(incline) < 15;

const fallsGently = (incline: number): boolean => incline < 0 && incline > -45;

function baseMotion({ scenario }: SketchState, { place, base, incline, isSteep }: Measures): Shape[] {
  const words = baseWords(scenario);
  if (words === "") return [];
  const [term] = scenario.base;
  const isOneWay =
    scenario.base.length === 1 && (term.kind === "ramp" || term.kind === "move" || term.kind === "staircase");
  const isBack = isOneWay && travelOf(term) < 0;
  const isFalling = isSteep && fallsGently(incline);
  const height = top + (isFalling ? 50 : 26);
  const line = isBack
    ? [arrow(place(base + 9, height), place(base - 43, height))]
    : [arrow(place(base - 43, height), place(base + 9, height))];
  const both = isOneWay ? [] : [arrow(place(base + 9, height), place(base - 43, height))];
  const at = isFalling ? place(base - 50, height) : place(base + 9, height + 15);
  return [...line, ...both, label(at, words, isSteep && !isFalling ? outwards(incline) : "end")];
}

function travelOf(term: SketchState["scenario"]["base"][number]): number {
  if (term.kind === "ramp") return term.rate;
  if (term.kind === "move") return term.distance;
  return term.kind === "staircase" ? term.increment : 0;
}

/** Pads where faces rub, wheels where nothing does. */
function feet({ scenario }: SketchState, { place, left, right }: Measures): Shape[] {
  const [first, second] = [left + (right - left) * 0.22, right - (right - left) * 0.22];
  if (!rubs(scenario))
    return [first, second].map((u) => ({
      kind: "disc",
      centre: place(u, 6),
      radius: 6,
      tone: "ink",
      width: 1.75,
      fill: "raised",
    }));
  const pad = (u: number, w: number): Shape => block(place, u - 12, u + 12, w, w + foot, "solid");
  const upper = scenario.contact.normal.faces > 1 ? [pad(first, top), pad(second, top)] : [];
  return [pad(first, 0), pad(second, 0), ...upper];
}

function pressing({ scenario }: SketchState, { place, left, right, incline }: Measures): Shape[] {
  const words = pressWords(scenario);
  if (words === "" || !rubs(scenario)) return [];
  const middle = (left + right) / 2;
  const from = top + (scenario.contact.normal.faces > 1 ? 16 : 2);
  const [x, y] = place(middle, from + 38);
  const over = 36 * Math.sin((incline * Math.PI) / 180);
  const text = !isNearlyLevel(incline)
    ? label([x + over, y - 12], words, outwards(incline))
    : label([x + 9, y + 8], words, "start");
  return [arrow(place(middle, from + 38), place(middle, from)), text];
}

function applied(state: SketchState, { place, left, isSteep, incline }: Measures): Shape[] {
  if (state.scenario.force.length === 0) return [];
  const words = appliedWords(state);
  const at = isSteep ? outside(place, left, incline, words) : label(place(left - 2, 56), words, "end");
  return [...signedArrow(place, left - 3, 40, 46, state.force, "ink"), at];
}

/** Beyond anything that presses, or above the arrow where the guide falls gently. */
function outside(place: Place, left: number, incline: number, words: string): Label {
  if (fallsGently(incline)) return label(place(left - 8, 80), words, "end");
  return label(place(left - 26, top + 34), words, outwards(incline));
}

/** The angle at the lower end of the guide, and the weight that pulls along it. */
function inclineMark({ place, length, incline, left, right }: Measures): Shape[] {
  if (incline === 0) return [];
  const isRising = incline > 0;
  const [x, y] = place(isRising ? 0 : length, -12);
  const reach = isRising ? 30 : -30;
  const [cx, cy] = place((left + right) / 2, 22);
  return [
    {
      kind: "line",
      points: [
        [x, y],
        [x + reach, y],
      ],
      tone: "quiet",
      width: 1,
      isDashed: true,
    },
    label([x + reach + Math.sign(reach) * 6, y], `${formatExactly(Math.abs(incline))}°`, isRising ? "start" : "end", {
      tone: "quiet",
    }),
    arrow([cx, cy + 12], [cx, cy + 56]),
  ];
}
