import { inlinePoints, recordBytes, recordDigest } from "../scenario/canonical.ts";
import type { Term, TermKind } from "../scenario/scenario.ts";
import { base64Lines } from "./base64.ts";
import { pythonList, pythonNumber as n } from "./literals.ts";

/**
 * A term of force or base in Python. `value` are its value and its first two rates of change as expressions of `t` (an array
 * or a number) and `at`, a time inside the present stretch between corners, which tells the branch.
 */
export interface TermPart {
  /** Statements before the functions that use them. */
  readonly setUp?: readonly string[];
  readonly value: readonly [value: string, rate: string, second: string];
  /** Expressions of the instants at which the term is not smooth, each a list. */
  readonly corners: readonly string[];
  /** Expression of the instant from which the term never changes again. */
  readonly constantFrom: string;
}

type TermOf<Kind extends TermKind> = Extract<Term, { kind: Kind }>;
type Writers = { readonly [Kind in TermKind]: (term: TermOf<Kind>, name: string) => TermPart };

/** One writer for each kind; `name` is a Python name of the term's own. */
const writers: Writers = {
  constant: ({ value }) => ({ value: [n(value), "0.0", "0.0"], corners: [], constantFrom: "0.0" }),
  ramp: ({ rate, start, stop }) => {
    const end = stop === "none" ? "INFINITE" : n(stop);
    return {
      value: [
        `ramp(t, at, ${n(rate)}, ${n(start)}, ${end})`,
        `(${n(rate)} if ${n(start)} <= at < ${end} else 0.0)`,
        "0.0",
      ],
      corners: [`[${n(start)}, ${end}]`],
      constantFrom: end,
    };
  },
  step: ({ value, start }) => ({
    value: [`(${n(value)} if at >= ${n(start)} else 0.0)`, "0.0", "0.0"],
    corners: [`[${n(start)}]`],
    constantFrom: n(start),
  }),
  harmonic: ({ amplitude, hz, phase }) => wave(n(amplitude), hz, phase),
  unbalance: ({ mass, eccentricity, hz, phase }) =>
    wave(`${n(mass)} * ${n(eccentricity)} * (TURN * ${n(hz)}) ** 2`, hz, phase),
  pulse: ({ shape, peak, start, duration }) => ({
    value: [`pulse(t, at, ${JSON.stringify(shape)}, ${n(peak)}, ${n(start)}, ${n(duration)})`, "0.0", "0.0"],
    corners: [`[${n(start)}, ${n(start)} + ${n(duration)} / 2, ${n(start)} + ${n(duration)}]`],
    constantFrom: `${n(start)} + ${n(duration)}`,
  }),
  chirp: ({ amplitude, fromHz, toHz, seconds, spacing }) => ({
    value: [
      `chirp(t, at, ${n(amplitude)}, ${n(fromHz)}, ${n(toHz)}, ${n(seconds)}, ${JSON.stringify(spacing)})`,
      "0.0",
      "0.0",
    ],
    corners: [`[${n(seconds)}]`],
    constantFrom: n(seconds),
  }),
  move: ({ distance, speed, acceleration, start }, name) =>
    travel(name, [distance, speed, acceleration, start, 1, Infinity]),
  staircase: ({ increment, speed, acceleration, start, count, dwell }, name) =>
    travel(name, [increment, speed, acceleration, start, count, dwell]),
  record: (term, name) => points(name, term, "held"),
  "acceleration-record": (term, name) => points(name, term, "zero"),
};

/** A term in Python; a record carries its points (`not-covered.ts` has seen to it that they are there). */
export function termPart(term: Term, name: string): TermPart {
  const write = writers[term.kind] as (term: Term, name: string) => TermPart;
  return write(term, name);
}

/** Whether this kind is written at all: kinds added later are not covered before they have a line above. */
export const isWritten = (kind: string): boolean => kind in writers;

/** A term that is 0 for ever is no input. */
export function isNothing(term: Term): boolean {
  switch (term.kind) {
    case "constant":
    case "step":
      return term.value === 0;
    case "ramp":
      return term.rate === 0;
    case "harmonic":
    case "chirp":
      return term.amplitude === 0;
    case "unbalance":
      return term.mass * term.eccentricity === 0;
    case "pulse":
      return term.peak === 0;
    case "move":
      return term.distance === 0;
    case "staircase":
      return term.increment === 0;
    default:
      return false;
  }
}

function wave(factor: string, hz: number, phase: number): TermPart {
  const amplitude = factor.startsWith("-") ? `(${factor})` : factor;
  const angle = `TURN * ${n(hz)} * t + np.radians(${n(phase)})`;
  return {
    value: [
      `${amplitude} * np.cos(${angle})`,
      `-${amplitude} * (TURN * ${n(hz)}) * np.sin(${angle})`,
      `-${amplitude} * (TURN * ${n(hz)}) ** 2 * np.cos(${angle})`,
    ],
    corners: [],
    constantFrom: "INFINITE",
  };
}

function travel(name: string, [distance, speed, acceleration, start, count, dwell]: readonly number[]): TermPart {
  const period = dwell === Infinity ? "INFINITE" : n(dwell);
  const made = `Travel(${[distance, speed, acceleration, start].map(n).join(", ")}, ${count}, ${period})`;
  return {
    setUp: [`${name} = ${made}`],
    value: [`${name}.place(t, at)`, `${name}.speed(t, at)`, `${name}.acceleration(at)`],
    corners: [`${name}.corners()`],
    constantFrom: `${name}.end()`,
  };
}

function points(name: string, term: TermOf<"record" | "acceleration-record">, outside: "held" | "zero"): TermPart {
  const { times, values } = "times" in term ? term : { times: [], values: [] };
  const isHeld = outside === "held" ? "True" : "False";
  const isLong = times.length > inlinePoints;
  return {
    setUp: isLong
      ? packed(name, times, values, isHeld)
      : [`${name} = Record(${pythonList(times)}, ${pythonList(values)}, ${isHeld})`],
    value: [`${name}.value(t, at)`, `${name}.rate(at)`, "0.0"],
    corners: [`${name}.times`],
    constantFrom: `${name}.end()`,
  };
}

/** A long record as the bytes that its digest is of. */
function packed(name: string, times: readonly number[], values: readonly number[], isHeld: string): string[] {
  return [
    `# ${times.length} times and as many values, little-endian doubles as base64; the code goes on below them`,
    `${name} = Record(*unpacked("${recordDigest(times, values)}", """`,
    ...base64Lines(recordBytes(times, values)),
    `"""), ${isHeld})`,
  ];
}
