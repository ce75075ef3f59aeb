import { axisValues, type Scenario, type SweepAxis, type SweepPlan } from "@restband/solver";
import { say } from "../../../format/format-quantity.ts";
import { exploreField } from "../explore-field.ts";

/** A sweep in a line of a list: "kinetic friction 0.02 to 0.4 × feed 0.02 mm/s to 200 mm/s". */
export const sweepTitle = ({ axes }: SweepPlan, scenario: Scenario): string =>
  axes
    .map((axis) => axisWords(axis, scenario))
    .join(" × ")
    .slice(0, 200);

function axisWords(axis: SweepAxis, scenario: Scenario): string {
  const field = exploreField(scenario, axis.path);
  if (!field) return axis.path;
  const values = axisValues(axis);
  const [low, high] = [values[0], values[values.length - 1]].map((value) => say(value, field.measure));
  return `${field.name} ${low} to ${high}`;
}
