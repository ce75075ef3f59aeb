import type { Result } from "../../result.ts";
import { checkScenario } from "../../scenario/check-scenario.ts";
import { numericField } from "../../scenario/numeric-fields.ts";
import type { Records } from "../../scenario/scenario.ts";
import {
  hasNoReidDamping,
  hasStraightSpring,
  isDrivenByOneForce,
  isUnderdamped,
  slidesAtOneForce,
} from "../../textbook/conditions.ts";
import { criticalFeedExact } from "../../textbook/critical-feed-exact.ts";
import { speedOf } from "../../textbook/feed.ts";
import { forcedRatios } from "../../textbook/driving-force.ts";
import { linearStability } from "../../textbook/linear-stability.ts";
import { noStopMotion } from "../../textbook/no-stop-motion.ts";
import { textbookCase, type TextbookCase } from "../../textbook/textbook-case.ts";
import type { Condition, TextbookCompanion } from "../../textbook/textbook-companion.ts";
import { solverVersion } from "../../version.ts";
import { defaultLinks, withValues } from "../links.ts";
import { scanValues } from "./search-values.ts";
import type { AnalyticThreshold, StartedSearch, StartKind, Target, ThresholdQuestion } from "./threshold.ts";

/** A formula that tells a threshold: it lies where `gap` is 0. */
interface Boundary extends Pick<TextbookCompanion, "key" | "label" | "formula" | "source" | "conditions"> {
  readonly start: StartKind;
  readonly gap: (kase: TextbookCase) => number;
}

const holdsAsItSlides: Condition = ({ staticForce, kineticForce }) =>
  staticForce === kineticForce ? null : "Static and kinetic friction differ, which the formula leaves out.";

/** All of them tell where stick–slip ends. */
const boundaries: readonly Boundary[] = [
  { ...criticalFeedExact, start: "rest", gap: (kase) => speedOf(kase) - criticalFeedExact.value(kase) },
  { ...linearStability, start: "steady-sliding", gap: (kase) => linearStability.value(kase) },
  {
    key: "no-stop-limit",
    label: "Largest friction without stops",
    formula: "ẋ keeps its sign between turning points",
    source: "Den Hartog 1931, Trans. ASME 53, 107; with damping from memory, recomputed",
    conditions: [
      hasStraightSpring,
      isDrivenByOneForce,
      slidesAtOneForce,
      isUnderdamped,
      hasNoReidDamping,
      holdsAsItSlides,
    ],
    start: "rest",
    gap: (kase) => {
      const { r, beta } = forcedRatios(kase);
      return noStopMotion(r, kase.ratio, beta)?.isWithoutStop ? 1 : -1;
    },
  },
];

const asksForNoStickSlip = (target: Target): boolean =>
  target.kind === "outcome" && target.outcomes.includes("stick-slip") !== target.isWanted;

/** The formulas read the scenario alone. */
const unrun: Result = {
  format: "restband-result/1",
  method: "exact",
  solverVersion,
  ended: "time",
  outcome: null,
  notes: [],
  events: [],
  limits: [],
  quantities: {},
  samples: null,
};

const points = 200;

/** What formulas say of a threshold, where any does: the value at which each puts it, nearest to what the search found. */
export function analyticThresholds(
  question: ThresholdQuestion,
  searches: readonly StartedSearch[],
  records?: Records,
): AnalyticThreshold[] {
  if (!asksForNoStickSlip(question.target)) return [];
  return boundaries.flatMap((boundary) => {
    const roots = rootsOf(boundary, question, records);
    if (roots.length === 0) return [];
    const { key, label, formula, source } = boundary;
    const middles = (searches.find(({ start }) => start === boundary.start)?.flips ?? []).map(
      ({ below, above }) => (below.value + above.value) / 2,
    );
    const pairs = roots.flatMap((value) =>
      middles.map((middle) => ({ value, difference: (middle - value) / Math.abs(value) })),
    );
    const nearest = pairs.sort((a, b) => Math.abs(a.difference) - Math.abs(b.difference))[0] ?? {
      value: roots[0],
      difference: null,
    };
    return [{ key, label, formula, source, start: boundary.start, ...nearest }];
  });
}

/** Where the gap changes its sign between values of the range, halved to rounding. */
function rootsOf({ conditions, gap }: Boundary, question: ThresholdQuestion, records: Records | undefined): number[] {
  const { scenario, path, low, high, links = defaultLinks(scenario, [path]) } = question;
  const gapAt = (value: number): number => {
    const moved = checkScenario(withValues(scenario, [[path, value]], links)).scenario;
    if (moved === null) return NaN;
    const kase = textbookCase(moved, unrun, { records });
    return conditions.some((condition) => condition(kase) !== null) ? NaN : gap(kase);
  };
  const values = scanValues(low, high, points, numericField(scenario, path) ?? {});
  const gaps = values.map(gapAt);
  return values.slice(1).flatMap((value, i) => (gaps[i] * gaps[i + 1] < 0 ? [halved(gapAt, values[i], value)] : []));
}

function halved(gapAt: (value: number) => number, from: number, to: number): number {
  let [low, high] = [from, to];
  const isPositive = gapAt(low) > 0;
  for (let i = 0; i < 60; i++) {
    const middle = (low + high) / 2;
    if (gapAt(middle) > 0 === isPositive) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
