import type { ExcitationTerm } from "./excitation-term.ts";
import { harmonicTerm } from "./harmonic-term.ts";
import { hzField, phaseField } from "./shared-fields.ts";

export interface HarmonicInput {
  kind: "harmonic";
  amplitude: number;
  hz: number;
  phase: number;
}

export const harmonic: ExcitationTerm<"harmonic", HarmonicInput> = {
  kind: "harmonic",
  label: "Harmonic",
  summary: "swings at one frequency all the time",
  places: ["force", "base"],
  sentence: {
    force: "A force swings by ±{amplitude} at {hz} with phase {phase}",
    base: "The far end of the spring swings by ±{amplitude} at {hz} with phase {phase}",
  },
  fields: [
    { key: "amplitude", label: "Amplitude", dimension: "force", initial: 10, initialOnBase: 0.001 },
    hzField,
    phaseField,
  ],
  source: "by definition",
  faults: () => [],
  compile: ({ amplitude, hz, phase }) => harmonicTerm(amplitude, hz, phase),
};
