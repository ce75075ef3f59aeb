import { kineticField, staticBelowKinetic, staticField } from "./coefficients.ts";
import type { FrictionLaw } from "./friction-law.ts";

export interface Stribeck {
  model: "stribeck";
  static: number;
  kinetic: number;
  velocity: number;
  exponent: number;
  fluid: number;
}

/**
 * Friction that falls with speed: μ(v) = μk + (μs − μk) exp(−(v/vs)^δ), and b·v as a force besides.
 * δ = 1 Tustin 1947; δ between 0.5 and 1 Bo & Pavelescu 1982; δ = 2 a Gaussian (from memory).
 */
export const stribeck: FrictionLaw<"stribeck", Stribeck> = {
  model: "stribeck",
  label: "Stribeck",
  summary: "falls with speed",
  sentence:
    "with friction {static} before it moves, falling towards {kinetic} over a sliding speed of {velocity} " +
    "with exponent {exponent}, and {fluid} of fluid damping",
  fields: [
    staticField,
    kineticField,
    {
      key: "velocity",
      label: "Stribeck velocity",
      symbol: "vs",
      dimension: "slidingVelocity",
      exclusiveMinimum: 0,
      initial: 0.01,
      help: "sliding speed over which friction falls",
    },
    {
      key: "exponent",
      label: "Exponent",
      symbol: "δ",
      dimension: "none",
      exclusiveMinimum: 0,
      initial: 2,
      help: "1 exponential, 2 bell-shaped",
    },
    {
      key: "fluid",
      label: "Fluid damping",
      symbol: "b",
      dimension: "fluidDamping",
      minimum: 0,
      default: 0,
      initial: 0,
      help: "of the lubricant film, per face speed",
    },
  ],
  source: "Tustin 1947; Bo & Pavelescu 1982",
  faults: staticBelowKinetic,
  compile: ({ static: atRest, kinetic, velocity, exponent, fluid }) => {
    const fall = atRest - kinetic;
    return {
      atRest,
      atOnset: atRest,
      constant: null,
      coefficient: (v) => kinetic + fall * Math.exp(-((v / velocity) ** exponent)),
      slope: (v) => {
        const ratio = (v / velocity) ** exponent;
        return ((-fall * exponent * ratio) / v) * Math.exp(-ratio);
      },
      fluid,
      corners: [],
      isSteepAtRest: exponent < 1,
    };
  },
};
