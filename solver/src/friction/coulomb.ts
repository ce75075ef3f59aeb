import { kineticField, staticBelowKinetic, staticField } from "./coefficients.ts";
import type { FrictionLaw } from "./friction-law.ts";

export interface Coulomb {
  model: "coulomb";
  static: number;
  kinetic: number;
}

/** μ = μk while sliding, up to μs at rest. */
export const coulomb: FrictionLaw<"coulomb", Coulomb> = {
  model: "coulomb",
  label: "Coulomb",
  summary: "one value at rest, one while sliding",
  sentence: "with friction {static} before it moves and {kinetic} while it slides",
  fields: [staticField, kineticField],
  source: "Amontons; Coulomb",
  faults: staticBelowKinetic,
  compile: (law) => ({
    atRest: law.static,
    atOnset: law.kinetic,
    constant: law.kinetic,
    coefficient: () => law.kinetic,
    slope: () => 0,
    fluid: 0,
    corners: [],
  }),
};
