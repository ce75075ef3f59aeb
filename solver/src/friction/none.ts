import type { FrictionLaw } from "./friction-law.ts";

export interface NoFriction {
  model: "none";
}

/** No contact friction: f = 0, and every crossing of v_r = 0 is a turn. */
export const none: FrictionLaw<"none", NoFriction> = {
  model: "none",
  label: "None",
  summary: "no contact friction",
  sentence: "without friction",
  fields: [],
  source: "by definition",
  faults: () => [],
  compile: () => ({
    atRest: 0,
    atOnset: 0,
    constant: 0,
    coefficient: () => 0,
    slope: () => 0,
    fluid: 0,
    corners: [],
  }),
};
