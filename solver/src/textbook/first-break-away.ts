import { isFed } from "./conditions.ts";
import { dampingLeftOut, speedOf } from "./feed.ts";
import { hasStraightSpring } from "./conditions.ts";
import { initialSum, type TextbookCase } from "./textbook-case.ts";
import type { Condition, TextbookCompanion } from "./textbook-companion.ts";

const startsRelaxed: Condition = ({ problem, result }) => {
  const isRelaxed = problem.initial.displacement === initialSum(problem.base) && initialSum(problem.force) === 0;
  if (!isRelaxed || problem.weight !== 0) return "The spring is not relaxed at the start.";
  return result.events[1]?.kind === "break-away" && result.events[1].t > 0
    ? null
    : "It does not start stuck, or does not break away in this run.";
};

const pressesAlike: Condition = ({ staticForce, problem }) =>
  staticForce > 0 && problem.ripple === null ? null : "Friction does not hold it with one force.";

/** When the feed sets in, s: the latest start among the ramps of the base. */
const startOf = ({ scenario }: TextbookCase): number =>
  Math.max(0, ...scenario.base.map((term) => (term.kind === "ramp" ? term.start : 0)));

/** The first load-up of a relaxed spring: F_s/(kV) after the feed sets in; longer than the later ones. */
export const firstBreakAway: TextbookCompanion = {
  key: "first-break-away",
  label: "First break-away",
  formula: "F_s/(k V)",
  source: "Straight load-up of the spring, textbook knowledge, from memory",
  dimension: "time",
  conditions: [isFed, hasStraightSpring, pressesAlike, startsRelaxed],
  value: (kase) => startOf(kase) + kase.staticForce / (kase.problem.stiffness * speedOf(kase)),
  ofRun: ({ result }) => result.events[1].t,
  note: dampingLeftOut,
};
