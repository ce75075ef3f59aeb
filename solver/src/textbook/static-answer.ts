import { hasSpring } from "./conditions.ts";
import { drivingForce } from "./driving-force.ts";
import { initialSum, steadyPush, type TextbookCase } from "./textbook-case.ts";
import type { Condition, TextbookCompanion } from "./textbook-companion.ts";
import type { Problem } from "../scenario/problem.ts";
import { isConstantFrom } from "../quantities/drive.ts";

/** The largest force that friction must balance while the body stands: of F + W − k d − k3 d³. */
function needOf(problem: Problem): number {
  const { base, stiffness, cubic, initial } = problem;
  const d = initial.displacement - initialSum(base);
  const steady = steadyPush(problem) - stiffness * d - cubic * d ** 3;
  return Math.abs(steady) + (drivingForce(problem)?.amplitude ?? 0);
}

const startsAtRest: Condition = ({ problem }) =>
  problem.initial.velocity === 0 && problem.beltVelocity === 0 ? null : "It does not start at rest on its counterface.";

const meetsOneForce: Condition = ({ problem }) =>
  isConstantFrom(problem, 0) || drivingForce(problem) !== null
    ? null
    : "What drives it is neither constant nor one harmonic force.";

const canHold: Condition = (kase) => {
  if (kase.problem.ripple !== null) return "The pressing force ripples, so what friction holds is not one force.";
  if (kase.staticForce === 0 || kase.scenario.contact.law.model === "bristle") return "Nothing holds it at rest.";
  return shareOf(kase) <= 1 ? null : "The force overcomes static friction, so there is no static answer.";
};

const shareOf = ({ problem, staticForce }: TextbookCase): number => needOf(problem) / staticForce;

/** The static answer: a body whose force never overcomes friction stands still; the share of friction it uses. */
export const staticAnswer: TextbookCompanion = {
  key: "static-answer",
  label: "Share of static friction used",
  formula: "(|F_0 + W − k x_0| + P)/F_s",
  source: "Equilibrium at rest with Coulomb friction",
  dimension: "none",
  conditions: [hasSpring, startsAtRest, meetsOneForce, canHold],
  value: shareOf,
  ofRun: ({ result }) => result.quantities.holdUse ?? null,
  note: () => "At 1 or less nothing moves, for ever.",
};
