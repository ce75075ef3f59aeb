import type { SolidDamping } from "./solid-damping.ts";

export interface NoSolid {
  model: "none";
}

/** S = 0. */
export const none: SolidDamping<"none", NoSolid> = {
  model: "none",
  label: "None",
  summary: "the spring itself loses nothing",
  sentence: "no solid damping",
  fields: [],
  source: "by definition",
  faults: () => [],
  compile: () => ({ viscous: 0, proportional: 0 }),
};
