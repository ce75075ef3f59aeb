import { kineticField, staticBelowKinetic, staticField } from "./coefficients.ts";
import type { FrictionLaw } from "./friction-law.ts";

export interface Bristle {
  model: "bristle";
  static: number;
  kinetic: number;
  velocity: number;
  stiffness: number;
  damping: number;
  fluid: number;
}

/**
 * Faces that touch by bristles: ż = v − σ0|v|z/g(v), f = −(σ0 z + σ1 ż + σ2 v), g(v) = N (μk + (μs − μk) exp(−(v/vs)²)).
 * `coefficient` is the steady curve g/N; the bending z and σ1 are in `bristle`, σ2 in `fluid`.
 */
export const bristle: FrictionLaw<"bristle", Bristle> = {
  model: "bristle",
  label: "Bristle",
  summary: "gives elastically before it slips",
  sentence:
    "with friction {static} before it moves, falling towards {kinetic} over a sliding speed of {velocity}, on bristles " +
    "of stiffness {stiffness} and damping {damping}, and {fluid} of fluid damping",
  fields: [
    staticField,
    kineticField,
    {
      key: "velocity",
      label: "Stribeck velocity",
      symbol: "vs",
      dimension: "slidingVelocity",
      exclusiveMinimum: 0,
      initial: 0.001,
      help: "sliding speed over which friction falls",
    },
    {
      key: "stiffness",
      label: "Bristle stiffness",
      symbol: "σ0",
      dimension: "bristleStiffness",
      exclusiveMinimum: 0,
      initial: 1e5,
      help: "of the contact before it slips",
    },
    {
      key: "damping",
      label: "Bristle damping",
      symbol: "σ1",
      dimension: "fluidDamping",
      minimum: 0,
      initial: 300,
      help: "of the contact before it slips",
    },
    {
      key: "fluid",
      label: "Fluid damping",
      symbol: "σ2",
      dimension: "fluidDamping",
      minimum: 0,
      default: 0,
      initial: 0,
      help: "of the lubricant film, per face speed",
    },
  ],
  source: "Canudas de Wit, Olsson, Åström & Lischinsky 1995 (LuGre)",
  faults: staticBelowKinetic,
  compile: ({ static: atRest, kinetic, velocity, stiffness, damping, fluid }) => {
    const fall = atRest - kinetic;
    const bell = (v: number) => fall * Math.exp(-((v / velocity) ** 2));
    return {
      atRest,
      atOnset: atRest,
      constant: null,
      coefficient: (v) => kinetic + bell(v),
      slope: (v) => ((-2 * v) / velocity ** 2) * bell(v),
      fluid,
      corners: [],
      bristle: { stiffness, damping, kinetic, velocity },
    };
  },
};
