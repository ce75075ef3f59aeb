import { axisValues, type Continuation, type Scenario, type SweepAxis, type SweepPlan } from "@restband/solver";
import { say } from "../../../format/format-quantity.ts";
import { formatNumber } from "../../../format/format-number.ts";
import { exploreField } from "../explore-field.ts";

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
      What happens when {plan.axes.map((axis) => axisWords(axis, scenario)).join(" and ")}?{linkWords(plan, scenario)}
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

function linkWords({ links }: SweepPlan, scenario: Scenario): string {
  return Object.entries(links)
    .map(([path, link]) => {
      if ("keep" in link) return " The damping keeps its ratio.";
      const [name, of] = [path, link.of].map((each) => exploreField(scenario, each)?.name ?? each);
      return ` ${name.charAt(0).toUpperCase()}${name.slice(1)} is ${formatNumber(link.factor, 4)} times ${of}.`;
    })
    .join("");
}
