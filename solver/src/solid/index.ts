import { displacementProportional } from "./displacement-proportional.ts";
import { equivalentViscous } from "./equivalent-viscous.ts";
import { none } from "./none.ts";
import type { SolidDamping } from "./solid-damping.ts";

/** Every model of solid damping, in the order menus show them. A new one is one file and one line here. */
const models = [none, equivalentViscous, displacementProportional] as const;

type ValuesOf<Kind> = Kind extends SolidDamping<string, infer Values> ? Values : never;

/** The `solid` of a scenario. */
export type Solid = ValuesOf<(typeof models)[number]>;

export const solidDampings: readonly SolidDamping<Solid["model"], Solid>[] = models;

/** The description of a model by its name; throws RangeError where there is none of that name. */
export function solidOf(model: Solid["model"]): SolidDamping<Solid["model"], Solid> {
  const solid = solidDampings.find((each) => each.model === model);
  if (solid === undefined) throw new RangeError(`no solid damping is called ${JSON.stringify(model)}`);
  return solid;
}
