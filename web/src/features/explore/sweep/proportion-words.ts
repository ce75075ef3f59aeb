import type { LimitLine, Scenario, SweepPlan } from "@restband/solver";
import { nounOf } from "../../../format/noun.ts";
import { exploreField } from "../explore-field.ts";
import { sayTowards } from "../say-value.ts";
import { say } from "../../../format/format-quantity.ts";
import { sideWords } from "./line-names.ts";
import { isSmoothLimit, longestOf } from "./use-limit-lines.ts";

/** Points that a rule of proportion may not miss by more than so much. */
const MOST_OFF = 0.03;
const FEWEST = 4;

/**
 * "Smooth sliding needs about 7.0 mm/s of feed for every 0.1 of kinetic friction." Said where the searched limit of smooth
 * sliding is a straight line through nothing, to three percent; null where it is not.
 */
export function proportionWords(lines: readonly LimitLine[], plan: SweepPlan, scenario: Scenario): string | null {
  if (plan.axes.length < 2) return null;
  const line = longestOf(lines.filter(isSmoothLimit));
  if (!line || line.points.length < FEWEST) return null;
  const ratios = line.points.map(({ across, up }) => up / across);
  const mean = ratios.reduce((sum, each) => sum + each, 0) / ratios.length;
  if (!(mean > 0) || ratios.some((ratio) => Math.abs(ratio / mean - 1) > MOST_OFF)) return null;
  const [across, up] = plan.axes.map(({ path }) => exploreField(scenario, path));
  if (!across || !up) return null;
  const step = 10 ** Math.floor(Math.log10(Math.max(...line.points.map((point) => Math.abs(point.across)))));
  const needed = sayTowards(mean * step, up.measure, "up", { digits: 2 });
  return `Smooth sliding needs about ${needed} of ${up.name} for every ${say(step, across.measure)} of ${across.name}. Below that the ${nounOf(scenario)} ${sideWords(line.between[0])}.`;
}
