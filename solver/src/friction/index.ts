import { bristle } from "./bristle.ts";
import { coulomb } from "./coulomb.ts";
import type { FrictionLaw } from "./friction-law.ts";
import { none } from "./none.ts";
import { stribeck } from "./stribeck.ts";
import { table } from "./table.ts";

/** Every friction law, in the order menus show them. A new law is one file and one line here. */
const laws = [none, coulomb, stribeck, table, bristle] as const;

type ValuesOf<Kind> = Kind extends FrictionLaw<string, infer Values> ? Values : never;

/** The `contact.law` of a scenario. */
export type Law = ValuesOf<(typeof laws)[number]>;

export const frictionLaws: readonly FrictionLaw<Law["model"], Law>[] = laws;

/** The description of a law by its `model`; throws RangeError where there is none of that name. */
export function lawOf(model: Law["model"]): FrictionLaw<Law["model"], Law> {
  const law = frictionLaws.find((each) => each.model === model);
  if (law === undefined) throw new RangeError(`no friction law is called ${JSON.stringify(model)}`);
  return law;
}
