import type { Scenario, Share, ToleranceSummary } from "@restband/solver";
import { nounOf } from "../../../format/noun.ts";
import { formatNumber } from "../../../format/format-number.ts";
import { outcomeWords } from "../../../format/outcomes.ts";

/** "93.2 %", and never all or none of them where it is not all or none. */
export function sayChance(value: number): string {
  const percent = 100 * value;
  if (percent > 0 && percent < 0.01) return "under 0.01 %";
  if (percent < 100 && percent > 99.99) return "over 99.99 %";
  return `${formatNumber(percent, percent > 99 ? 4 : 3)} %`;
}

/** "91.5 to 94.6 %". */
export const sayInterval = ({ low, high }: { low: number; high: number }): string =>
  `${formatNumber(100 * low, 3)} to ${formatNumber(100 * high, 3)} %`;

/** What a study says in a sentence. */
export function studyHeadline({ allLimits, outcomes }: ToleranceSummary, scenario: Scenario): string {
  if (allLimits) {
    const limits = scenario.limits.length === 1 ? "its limit" : "all its limits";
    return `The ${nounOf(scenario)} keeps ${limits} in ${shareWords(allLimits)}.`;
  }
  const likeliest = [...outcomes].sort((a, b) => b.share.count - a.share.count)[0];
  if (!likeliest) return "No draw has an answer.";
  return `The ${nounOf(scenario)} ${outcomeWords[likeliest.outcome]} in ${shareWords(likeliest.share)}.`;
}

function shareWords({ estimate, count, of }: Share): string {
  if (count === 0) return "none of the draws";
  return count === of ? "every draw that has an answer" : `${sayChance(estimate.value)} of the draws`;
}
