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
import { arrow, block, dashpot, ground, inclinedPlace, label, wall } from "./sketch-parts.ts";
import { shiftOf } from "./sketch-scale.ts";
import type { Point, Shape } from "./sketch-shapes.ts";
import type { SketchState } from "./sketch-state.ts";

const radius = 54;
const centre: Point = [112, 0];
/** Level axes about the rotor's centre. */
const level = inclinedPlace(0);

/** The rotor seen along its shaft: spiral spring to the base, damper, pads at the rim; x turns it against the clock. */
export function angularSketch(state: SketchState, width: number): Shape[] {
  const base = width - 18;
  const angle = shiftOf(state, (55 * Math.PI) / 180);
  return [
    ...pads(state),
    { kind: "disc", centre, radius, tone: "ink", width: 1.75, fill: "raised" },
    mark(angle),
    ...link(state, angle, base),
    { kind: "disc", centre, radius: 4, tone: "ink", width: 0, fill: "solid" },
    label([0, -(radius + 36)], inertiaWords(state.scenario), "start", { isBold: true, isFigure: true }),
    ...baseMotion(state, base),
    ...torque(state),
  ];
}

/** A point at an angle against the clock from the right, at a distance from the centre. */
const around = (angle: number, distance: number): Point => [
  centre[0] + distance * Math.cos(angle),
  centre[1] - distance * Math.sin(angle),
];

/** The notch that shows how far the rotor is turned; straight up at zero. */
const mark = (angle: number): Shape => ({
  kind: "line",
  points: [around(Math.PI / 2 + angle, radius - 18), around(Math.PI / 2 + angle, radius)],
  tone: "ink",
  width: 3,
});

function link({ scenario }: SketchState, angle: number, base: number): Shape[] {
  const [spring, damper] = [springWords(scenario), damperWords(scenario)];
  if (spring === "" && damper === "" && scenario.base.length === 0) return [];
  const parts: Shape[] = wall(level, base, -62, 62, 9);
  const middle = (centre[0] + radius + base) / 2;
  if (spring !== "") {
    parts.push({ kind: "line", points: [...spiral(angle), [base, -20]], tone: "ink", width: 1.75 });
    parts.push(label([middle, -32], spring, "middle"));
  }
  if (damper !== "") {
    const lug = around(-0.5 + angle * 0.25, radius);
    parts.push(...dashpot(level, lug[0], base, -lug[1]), label([middle, lug[1] + 18], damper, "middle"));
  }
  return parts;
}

/** From the hub, which turns, outwards to the end that the base holds. */
function spiral(angle: number): Point[] {
  const turns = 2.25;
  const end = Math.asin(20 / 30);
  const count = 60;
  return Array.from({ length: count + 1 }, (_, i) => {
    const part = i / count;
    return around(end - (1 - part) * (2 * Math.PI * turns - angle), 7 + part * 23);
  });
}

function pads({ scenario }: SketchState): Shape[] {
  if (!rubs(scenario)) return [];
  const { faces } = scenario.contact.normal;
  const pad = (side: 1 | -1): Shape[] => {
    const at = (w: number): number => side * w;
    const far = radius + 12;
    return [
      block(level, centre[0] - 16, centre[0] + 16, at(radius), at(far), "solid"),
      ...ground(level, centre[0] - 26, centre[0] + 26, at(far), -side * 8),
      arrow([centre[0], -at(far + 40)], [centre[0], -at(far + 10)]),
    ];
  };
  const words = [
    pressWords(scenario),
    beltWords(scenario),
    scenario.contact.counterface === "base" ? "pads go with the base" : "",
  ];
  const texts = words.filter((each) => each !== "");
  return [
    ...pad(1),
    ...(faces > 1 ? pad(-1) : []),
    ...texts.map((text, i) => label([centre[0] + 10, -(radius + 46) + 16 * i], text, "start")),
  ];
}

function baseMotion({ scenario }: SketchState, base: number): Shape[] {
  const words = baseWords(scenario);
  if (words === "") return [];
  return [
    arrow([base + 4, 76], [base + 4, 100]),
    arrow([base + 4, 100], [base + 4, 76]),
    label([base - 6, 88], words, "end"),
  ];
}

/** The applied torque as an arc about the rotor, with its sense at the cursor. */
function torque(state: SketchState): Shape[] {
  if (state.scenario.force.length === 0) return [];
  const words = label([0, 78], appliedWords(state), "start");
  if (state.force === 0) return [words];
  const arc = Array.from({ length: 21 }, (_, i) => around(Math.PI * (0.8 + 0.02 * i), radius + 12));
  const points = state.force > 0 ? arc : [...arc].reverse();
  const last = points.length - 1;
  return [
    { kind: "line", points: points.slice(0, last), tone: "ink", width: 1.75 },
    arrow(points[last - 1], points[last]),
    words,
  ];
}
