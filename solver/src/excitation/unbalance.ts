import type { ExcitationTerm } from "./excitation-term.ts";
import { harmonicTerm } from "./harmonic-term.ts";
import { hzField, phaseField } from "./shared-fields.ts";

export interface Unbalance {
  kind: "unbalance";
  mass: number;
  eccentricity: number;
  hz: number;
  phase: number;
}

/** The force of a turning unbalance along the guide: m_u e ω² cos(ω t + φ). */
export const unbalance: ExcitationTerm<"unbalance", Unbalance> = {
  kind: "unbalance",
  label: "Unbalance",
  summary: "a turning mass off its axis",
  places: ["force"],
  motions: ["linear"],
  sentence: { force: "An unbalance of {mass} at {eccentricity} turns at {hz} with phase {phase}" },
  fields: [
    { key: "mass", label: "Unbalanced mass", symbol: "mu", dimension: "mass", initial: 0.05 },
    { key: "eccentricity", label: "Eccentricity", symbol: "e", dimension: "length", initial: 0.05 },
    { ...hzField, label: "Speed" },
    phaseField,
  ],
  source: "m e ω², common practice",
  faults: () => [],
  compile: ({ mass, eccentricity, hz, phase }) =>
    harmonicTerm(mass * eccentricity * (2 * Math.PI * hz) ** 2, hz, phase),
};
