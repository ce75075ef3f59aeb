import { axisValues, type Continuation, type Scenario, type SweepAxis, type SweepPlan } from "@restband/solver";
import { say } from "../../../format/format-quantity.ts";
import { exploreField } from "../explore-field.ts";
import { linkWords } from "../link-words.ts";

const startsWords: Record<Continuation, string> = {
  none: "",
  up: " Each cell starts where its neighbour below ended.",
  down: " Each cell starts where its neighbour above ended.",
  both: " Each cell starts where its neighbour ended, up and then down.",
};

/** What was asked, in a sentence. */
export function SweepSentence({ plan, scenario }: { plan: SweepPlan; scenario: Scenario }) {
  const seconds = say(scenario.span.seconds, { dimension: "time", motion: scenario.motion });
  return (
    <p className="leading-[1.7]">
      What happens when {plan.axes.map((axis) => axisWords(axis, scenario)).join(" and ")}?
      {linkWords(plan.links, scenario)}
      {startsWords[plan.continuation]} Each run lasts {seconds}.
    </p>
  );
}

function axisWords(axis: SweepAxis, scenario: Scenario): string {
  const field = exploreField(scenario, axis.path);
  const values = axisValues(axis);
  if (!field) return axis.path;
  const [low, high] = [values[0], values[values.length - 1]].map((value) => say(value, field.measure));
  const spread = axis.spacing === "log" ? ", even in ratio" : "";
  return values.length === 1
    ? `${field.name} is ${low}`
    : `${field.name} runs from ${low} to ${high} in ${values.length} values${spread}`;
}
