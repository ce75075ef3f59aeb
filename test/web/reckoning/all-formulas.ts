import type { Formula } from "../../../web/src/features/reckoning/formula/formula.ts";
import { inertias } from "../../../web/src/features/reckoning/inertias/index.ts";
import { sheetFor } from "../../../web/src/features/reckoning/sheets/index.ts";
import { springs } from "../../../web/src/features/reckoning/springs/index.ts";
import { transmissions } from "../../../web/src/features/reckoning/transmissions/index.ts";

const ways = Object.entries(sheetFor).flatMap(([key, sheet]) =>
  (["linear", "angular"] as const).flatMap((motion) =>
    sheet(motion).ways.map((way): [string, Formula] => [`${key} ${way.key}, ${motion}`, way]),
  ),
);

/** Every formula a person can meet, with a name for messages. */
export const allFormulas: readonly [string, Formula][] = [
  ...[...springs, ...inertias, ...transmissions].map((formula): [string, Formula] => [formula.key, formula]),
  ...ways,
];

/** A formula of a list by its key. */
export function formulaOf(list: readonly Formula[], key: string): Formula {
  const found = list.find((formula) => formula.key === key);
  if (!found) throw new Error(`There is no formula ${key}.`);
  return found;
}
