import type { FieldWords } from "../features/compare/compare-fields.ts";
import { originText } from "../features/statement/origin/origin-words.ts";
import { readPath } from "../features/statement/path.ts";
import { fieldAt, measureOf } from "../features/statement/scenario-fields.ts";
import { joined, readInput } from "../format/format-quantity.ts";

/** The members of a scenario as the statement says them. */
export const fieldWords: FieldWords = {
  read: (scenario, path) => readPath(scenario, path),
  label: (scenario, path) => fieldAt(scenario, path)?.label ?? path,
  value(scenario, path) {
    const value = readPath(scenario, path);
    const field = fieldAt(scenario, path);
    return typeof value === "number" && field ? joined(readInput(value, measureOf(scenario, field))) : String(value);
  },
  origin(scenario, path) {
    const origin = scenario.origins[path];
    return origin ? originText(scenario, path, origin) : null;
  },
};
