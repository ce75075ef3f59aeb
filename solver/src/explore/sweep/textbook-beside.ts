import { numericField } from "../../scenario/numeric-fields.ts";
import type { Records, Scenario } from "../../scenario/scenario.ts";
import { withValues } from "../links.ts";
import { analyticThresholds } from "../threshold/analytic-thresholds.ts";
import { startedFrom } from "../threshold/starts.ts";
import type { AnalyticThreshold, Target } from "../threshold/threshold.ts";
import type { LimitLine, LinePoint } from "./limit-lines.ts";
import type { SweepPlan } from "./sweep-plan.ts";

/** What a formula says of a searched line. */
export interface TextbookBeside extends Pick<AnalyticThreshold, "key" | "label" | "formula" | "source"> {
  /** The places of the line looked at, and the value of the second field that the formula has there, SI. */
  readonly points: readonly LinePoint[];
  /** (searched − formula)/|formula| there: the least and the largest. */
  readonly least: number;
  readonly largest: number;
}

const mostPlaces = 6;
const withoutSticking: Target = { kind: "outcome", outcomes: ["stick-slip"], isWanted: false };

/**
 * The formulas for where stick–slip ends, laid beside a line of that: at a few of its places, the first field as there. None
 * where the cells do not start from rest, which the formulas speak of.
 */
export function textbookBeside(
  scenario: Scenario,
  { axes, links }: SweepPlan,
  { between, points }: LimitLine,
  records?: Records,
): TextbookBeside[] {
  if (!between.includes("stick-slip") || !startsAtRest(scenario, records)) return [];
  const [across, up] = axes.map(({ path }) => path);
  const found = placesOf(points).flatMap((point) => {
    const there = withValues(scenario, [[across, point.across]], links);
    const range = rangeAbout(point.up, numericField(scenario, up)?.minimum);
    const question = { scenario: there, path: up, ...range, target: withoutSticking, links };
    return analyticThresholds(question, [], records)
      .filter(({ start }) => start === "rest")
      .map((analytic) => ({ analytic, point }));
  });
  return [...new Set(found.map(({ analytic }) => analytic.key))].map((key) => {
    const own = found.filter(({ analytic }) => analytic.key === key);
    const [{ label, formula, source }] = own.map(({ analytic }) => analytic);
    const differences = own.map(({ analytic: { value }, point }) => (point.up - value) / Math.abs(value));
    return {
      ...{ key, label, formula, source },
      points: own.map(({ analytic, point }) => ({ across: point.across, up: analytic.value })),
      least: Math.min(...differences),
      largest: Math.max(...differences),
    };
  });
}

function startsAtRest(scenario: Scenario, records: Records | undefined): boolean {
  const rest = startedFrom(scenario, "rest", records)?.initial;
  const { displacement, velocity } = scenario.initial;
  return rest?.displacement === displacement && rest.velocity === velocity;
}

/** Even places along the line, its ends among them. */
function placesOf(points: readonly LinePoint[]): LinePoint[] {
  const count = Math.min(mostPlaces, points.length);
  if (count < 2) return [...points];
  return Array.from({ length: count }, (_, i) => points[Math.round((i * (points.length - 1)) / (count - 1))]);
}

/** A half to twice the value; a little either way of 0. */
function rangeAbout(value: number, minimum = -Infinity): { low: number; high: number } {
  const room = value === 0 ? 1e-9 : Math.abs(value) / 2;
  return { low: Math.max(minimum, value - room), high: value + 2 * room };
}
