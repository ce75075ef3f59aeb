import type { Condition } from "./textbook-companion.ts";
import { isFree, slidingForce } from "./textbook-case.ts";
import { feedSpeed } from "./feed.ts";
import { drivingForce } from "./driving-force.ts";

/* What formulas ask of a case, each with the sentence that says what is amiss. */

export const hasSpring: Condition = ({ problem }) => (problem.stiffness > 0 ? null : "There is no spring.");

/** A spring that is straight, so that ω is one number. */
export const hasStraightSpring: Condition = (kase) =>
  hasSpring(kase) ?? (kase.problem.cubic === 0 ? null : "The spring is not straight: it has cubic stiffness.");

/** One friction force while sliding, above zero. */
export const slidesAtOneForce: Condition = (kase) => {
  if (kase.problem.ripple !== null) return "The pressing force ripples, so friction is not one force.";
  if (kase.kineticForce === null) return "Friction changes with speed; the formula knows one sliding friction.";
  return slidingForce(kase) > 0 ? null : "No friction acts while it slides.";
};

export const hasNoDryFriction: Condition = ({ staticForce, problem }) =>
  staticForce === 0 && problem.ripple === null ? null : "Dry friction acts besides, which the formula leaves out.";

/** Nothing is put in after the start. */
export const swingsFreely: Condition = (kase) =>
  isFree(kase) ? null : "It is driven; the formula is that of a body left to itself.";

export const isUndamped: Condition = ({ damping }) => (damping === 0 ? null : "It is damped besides.");
export const isDamped: Condition = ({ damping }) => (damping > 0 ? null : "There is no damping.");
export const isUnderdamped: Condition = ({ ratio }) =>
  ratio < 1 ? null : "It is damped so much (ζ of 1 or more) that it does not swing.";

export const hasNoDamper: Condition = ({ problem }) =>
  problem.viscous === 0 ? null : "A damper acts besides, which the formula leaves out.";
export const hasNoReidDamping: Condition = ({ problem }) =>
  problem.solid.proportional === 0 ? null : "Displacement-proportional solid damping acts besides.";
export const hasSolidDamping: Condition = ({ problem }) =>
  problem.solid.viscous > 0 || problem.solid.proportional > 0 ? null : "There is no solid damping.";

/** The base runs at one speed past the counterface. */
export const isFed: Condition = ({ problem }) =>
  feedSpeed(problem) === null ? "It is neither fed at one speed nor on a moving belt." : null;

export const holdsMoreThanItSlides: Condition = (kase) =>
  kase.staticForce > slidingForce(kase) ? null : "Static and kinetic friction are alike, so nothing jumps.";

export const sticksAndSlips: Condition = ({ result }) =>
  result.outcome === "stick-slip" ? null : "It does not stick and slip in this run.";

/** One harmonic force, constants at most besides. */
export const isDrivenByOneForce: Condition = ({ problem }) =>
  drivingForce(problem) === null ? "It is not driven by one harmonic force alone." : null;
