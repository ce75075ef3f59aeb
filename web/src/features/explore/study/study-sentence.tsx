import type { Distribution, Scenario, TolerancePlan } from "@restband/solver";
import { say } from "../../../format/format-quantity.ts";
import { formatNumber } from "../../../format/format-number.ts";
import { listed } from "../../../format/words.ts";
import { exploreField } from "../explore-field.ts";
import type { Measure } from "../../../format/unit.ts";

/** What was asked, in sentences. */
export function StudySentence({ plan, scenario }: { plan: TolerancePlan; scenario: Scenario }) {
  const inputs = plan.inputs.map(({ path, distribution }) => {
    const field = exploreField(scenario, path);
    return field ? `${field.name} ${distributionWords(distribution, field.measure)}` : path;
  });
  const sampling = plan.sampling === "latin-hypercube" ? "as a Latin hypercube" : "as plain random numbers";
  return (
    <p className="leading-[1.7]">
      {formatNumber(plan.runs, 9)} draws {sampling}, seed {plan.seed}: {listed(inputs)}.
      {plan.correlations.map(({ first, second, value }) => (
        <span key={`${first} ${second}`}>
          {" "}
          Rank correlation of {nameAt(plan, scenario, first)} and {nameAt(plan, scenario, second)}:{" "}
          {formatNumber(value)}.
        </span>
      ))}
    </p>
  );
}

const nameAt = ({ inputs }: TolerancePlan, scenario: Scenario, i: number): string =>
  exploreField(scenario, inputs[i].path)?.name ?? inputs[i].path;

function distributionWords(distribution: Distribution, measure: Measure): string {
  const words = (value: number): string => say(value, measure, { digits: 4 });
  switch (distribution.kind) {
    case "uniform":
      return `evenly from ${words(distribution.low)} to ${words(distribution.high)}`;
    case "normal":
      return `normal about ${words(distribution.mean)} with a deviation of ${words(distribution.deviation)}`;
    case "truncated":
      return `normal about ${words(distribution.mean)}, cut at ${words(distribution.low)} and ${words(distribution.high)}`;
    case "triangular":
      return `triangular from ${words(distribution.low)} to ${words(distribution.high)}, likeliest ${words(distribution.likeliest)}`;
  }
}
