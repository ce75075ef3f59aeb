import { planRanges, type Scenario } from "@restband/solver";

export { exploreRanges } from "@restband/solver";

/** Whether any value of a scenario is known as a range, one that can be run or not. */
export function hasRanges(scenario: Scenario): boolean {
  const { ranges, leftOut } = planRanges(scenario);
  return ranges.length > 0 || leftOut.length > 0;
}
