import type { CompiledTerm, ExcitationTerm } from "./excitation-term.ts";
import { level, line, piecewise } from "./piecewise.ts";
import { startField } from "./shared-fields.ts";
import { noHarmonics, stillTerm } from "./still-term.ts";

export interface Pulse {
  kind: "pulse";
  shape: "half-sine" | "rectangle" | "triangle";
  peak: number;
  start: number;
  duration: number;
}

export const pulse: ExcitationTerm<"pulse", Pulse> = {
  kind: "pulse",
  label: "Pulse",
  summary: "a single push of given shape",
  places: ["force"],
  sentence: { force: "A {shape} pulse of {peak} starts at {start} and lasts {duration}" },
  fields: [
    { key: "peak", label: "Peak", dimension: "force", initial: 50 },
    startField,
    { key: "duration", label: "Duration", dimension: "time", exclusiveMinimum: 0, initial: 0.05 },
  ],
  choices: [
    {
      key: "shape",
      label: "Shape",
      options: [
        { value: "half-sine", label: "half-sine" },
        { value: "rectangle", label: "rectangular" },
        { value: "triangle", label: "triangular" },
      ],
    },
  ],
  source: "by definition",
  faults: () => [],
  compile: (term) => (term.shape === "half-sine" ? halfSine(term) : straight(term)),
};

/** peak·sin(π(t − start)/duration) as the piece of a harmonic between two corners. */
function halfSine({ peak, start, duration }: Pulse): CompiledTerm {
  const end = start + duration;
  const active = [{ amplitude: peak, hz: 1 / (2 * duration), phase: -Math.PI / 2, origin: start }];
  return {
    ...stillTerm,
    ...piecewise([level(-Infinity, 0), level(start, 0), level(end, 0)]),
    harmonics: (t) => (t >= start && t < end ? active : noHarmonics),
    isConstantFrom: (t) => t >= end || peak === 0,
  };
}

/** Sides of a triangle are anchored at its feet, so that both begin and end at exactly 0. */
function straight({ shape, peak, start, duration }: Pulse): CompiledTerm {
  const end = start + duration;
  const rate = (2 * peak) / duration;
  const body =
    shape === "rectangle"
      ? [level(start, peak)]
      : [line(start, start, 0, rate), line(start + duration / 2, end, 0, -rate)];
  return { ...stillTerm, ...piecewise([level(-Infinity, 0), ...body, level(end, 0)]) };
}
