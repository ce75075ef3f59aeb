import type { Scenario, TolerancePlan } from "@restband/solver";
import { formatNumber } from "../../../format/format-number.ts";
import { listed } from "../../../format/words.ts";
import { exploreField } from "../explore-field.ts";

/** A study in a line of a list: "1000 draws of static friction and kinetic friction". */
export function studyTitle({ inputs, joint, runs }: TolerancePlan, scenario: Scenario): string {
  const paths = [...inputs.map(({ path }) => path), ...joint.flatMap((each) => each.paths)];
  const names = paths.map((path) => exploreField(scenario, path)?.name ?? path);
  return `${formatNumber(runs, 9)} draws of ${listed(names)}`.slice(0, 200);
}
