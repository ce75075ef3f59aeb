import { formatNumber } from "../../format/format-number.ts";
import { fromSi } from "../../format/unit.ts";
import { bandWords, frictionWords, rubs } from "./sketch-labels.ts";
import { arrow, label } from "./sketch-parts.ts";
import { sketchScale } from "./sketch-scale.ts";
import { labelBox, type Shape } from "./sketch-shapes.ts";
import { scaleWords } from "./sketch-words.ts";
import type { SketchState } from "./sketch-state.ts";

/** Room at both ends for half a figure. */
const inset = 22;
const axis = 64;

/** The scale beneath the sketch: friction at the cursor, the rest band, a needle where the body is. 0 … width × 0 … 104 px. */
export function bandScale(state: SketchState, width: number): Shape[] {
  const scale = sketchScale(state);
  const x = (value: number): number => inset + ((width - 2 * inset) * (value - scale.low)) / (scale.high - scale.low);
  const at = (si: number): number => x(fromSi(si, scale.unit));
  const needle = Math.max(0, Math.min(width, at(state.place)));
  return [
    ...friction(state),
    ...band(state, at, width),
    {
      kind: "line",
      points: [
        [x(scale.low), axis],
        [x(scale.high), axis],
      ],
      tone: "ink",
      width: 1.25,
    },
    ...scale.ticks.flatMap((tick): Shape[] => [
      {
        kind: "line",
        points: [
          [x(tick), axis],
          [x(tick), axis + 5],
        ],
        tone: "ink",
        width: 1.25,
      },
      label([x(tick), axis + 15], formatNumber(tick, 4), "middle", { tone: "quiet", isFigure: true }),
    ]),
    {
      kind: "line",
      points: [
        [needle, 37],
        [needle, axis],
      ],
      tone: "ink",
      width: 1.75,
    },
    {
      kind: "area",
      points: [
        [needle - 5, 31],
        [needle + 5, 31],
        [needle, 39],
      ],
      tone: "ink",
      width: 0,
      fill: "solid",
    },
    label([width, axis + 34], `${scaleWords(state.scenario)}, ${scale.unit.label}`, "end", { tone: "quiet" }),
  ];
}

function band(state: SketchState, at: (si: number) => number, width: number): Shape[] {
  if (state.band === null) return [];
  const { centre, half } = state.band;
  const [left, right] = [at(centre - half), at(centre + half)];
  const words = label([0, 22], bandWords(state), "end", { tone: "band", isBold: true });
  const room = labelBox(words).right - labelBox(words).left;
  const end = Math.min(width, Math.max(right, width * 0.42 + room));
  return [
    {
      kind: "area",
      points: [
        [left, 42],
        [right, 42],
        [right, axis],
        [left, axis],
      ],
      tone: "band",
      width: 0,
      fill: "hatch-band",
    },
    {
      kind: "line",
      points: [
        [left, 38],
        [left, axis],
      ],
      tone: "band",
      width: 2,
    },
    {
      kind: "line",
      points: [
        [right, 38],
        [right, axis],
      ],
      tone: "band",
      width: 2,
    },
    { ...words, at: [end, 22] },
  ];
}

/** Friction on the body at the cursor: where it points and how large it is. */
function friction(state: SketchState): Shape[] {
  if (!rubs(state.scenario)) return [];
  const { f, phase } = state.here;
  const tone = phase === 0 ? "stick" : "slip";
  const line = f === 0 ? [] : [f > 0 ? arrow([4, 4], [44, 4], tone) : arrow([44, 4], [4, 4], tone)];
  return [...line, label([52, 4], frictionWords(state), "start", { tone })];
}
