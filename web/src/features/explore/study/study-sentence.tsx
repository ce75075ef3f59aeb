import type { Distribution, JointInput, Scenario, TolerancePlan } from "@restband/solver";
import { say } from "../../../format/format-quantity.ts";
import { formatNumber } from "../../../format/format-number.ts";
import { listed } from "../../../format/words.ts";
import { exploreField } from "../explore-field.ts";
import { linkWords } from "../link-words.ts";
import type { Measure } from "../../../format/unit.ts";

/** What was asked, in sentences. */
export function StudySentence({ plan, scenario }: { plan: TolerancePlan; scenario: Scenario }) {
  const inputs = plan.inputs.map(({ path, distribution }) => {
    const field = exploreField(scenario, path);
    return field ? `${field.name} ${distributionWords(distribution, field.measure)}` : path;
  });
  const together = plan.joint.map((joint) => jointWords(joint, scenario));
  const sampling = plan.sampling === "latin-hypercube" ? "as a Latin hypercube" : "as plain random numbers";
  return (
    <p className="leading-[1.7]">
      {formatNumber(plan.runs, 9)} draws {sampling}, seed {plan.seed}: {listed([...inputs, ...together])}.
      {plan.correlations.map(({ first, second, value }) => (
        <span key={`${first} ${second}`}>
          {" "}
          Rank correlation of {nameAt(plan, scenario, first)} and {nameAt(plan, scenario, second)}:{" "}
          {formatNumber(value)}.
        </span>
      ))}
      {linkWords(plan.links, scenario)}
    </p>
  );
}

const nameAt = ({ inputs }: TolerancePlan, scenario: Scenario, i: number): string =>
  exploreField(scenario, inputs[i].path)?.name ?? inputs[i].path;

/** "mass and stiffness together, normal about 120 kg and 4 N/μm with deviations of 6 kg and 0.2 N/μm, correlated by 0.3 (fit of pull test 2)" */
function jointWords({ paths, means, covariance, source }: JointInput, scenario: Scenario): string {
  const fields = paths.map((path) => exploreField(scenario, path));
  const said = (values: readonly number[]): string =>
    listed(values.map((value, i) => say(value, fields[i]?.measure ?? plain, { digits: 4 })));
  const deviations = covariance.map((row, i) => Math.sqrt(row[i]));
  const correlations = covariance.flatMap((row, i) =>
    row.slice(0, i).map((value, j) => formatNumber(value / deviations[i] / deviations[j], 3)),
  );
  const names = listed(paths.map((path, i) => fields[i]?.name ?? path));
  return `${names} together, normal about ${said(means)} with deviations of ${said(deviations)}, correlated by ${listed(correlations)}${source === undefined ? "" : ` (${source})`}`;
}

const plain: Measure = { dimension: "none", motion: "linear" };

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
