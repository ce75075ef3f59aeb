import { kineticField, staticBelowKinetic, staticField } from "../../solver/src/friction/coefficients.ts";
import type { FrictionLaw } from "../../solver/src/friction/friction-law.ts";

export interface Fading {
  model: "fading";
  static: number;
  kinetic: number;
  until: number;
}

/** A law made up for tests: friction falls in a straight line from μs at rest to μk at a speed, constant beyond. */
export const fading: FrictionLaw<"fading", Fading> = {
  model: "fading",
  label: "Fading",
  summary: "falls in a straight line",
  sentence: "with friction {static} before it moves, fading to {kinetic} at {until}",
  fields: [
    staticField,
    kineticField,
    {
      key: "until",
      label: "Speed at the end",
      symbol: "vf",
      dimension: "slidingVelocity",
      exclusiveMinimum: 0,
      initial: 0.1,
    },
  ],
  source: "made up for tests",
  faults: staticBelowKinetic,
  compile: ({ static: atRest, kinetic, until }) => {
    const slope = (kinetic - atRest) / until;
    return {
      atRest,
      atOnset: atRest,
      constant: null,
      coefficient: (v) => (v < until ? atRest + slope * v : kinetic),
      slope: (v) => (v < until ? slope : 0),
      fluid: 0,
      corners: [until],
    };
  },
};
