import type { Work } from "../numerics/first-zero.ts";
import type { Problem } from "../scenario/problem.ts";
import type { Inputs } from "./inputs.ts";
import type { SlipMaker } from "./form.ts";
import { commonPeriod, ratesOf } from "./common-period.ts";
import type { Stance } from "./stance.ts";
import { Stepper } from "./stepper.ts";

const cyclesAhead = 1000;

/**
 * When a body stuck at `stance` breaks away if the inputs go on for ever: Infinity where it never does, NaN where the
 * allowed work did not suffice to tell. Moves, pulses and records are followed to their end; from there ramps always
 * break the stick in a time that their rate bounds, and harmonics (the ripple of N like one) are followed over a common
 * period, or 1,000 periods of the slowest where there is none so short.
 */
export function nextBreakAway(problem: Problem, stance: Stance, allowed: number, makeSlip: SlipMaker): number {
  const work: Work = { spent: 0, allowed };
  const stepper = new Stepper(problem, work, makeSlip);
  const s = { ...stance };
  const { inputs } = stepper.form;
  inputs.locate(s.t);
  // a ripple that lets the contact go has corners for ever: it is looked over like any other harmonic
  while (inputs.corner < Infinity) {
    if (++work.spent > allowed) return NaN;
    if (stepper.step(s, inputs.corner) === "break-away") return s.t;
    if (stepper.outOfWork) return NaN;
  }
  const period = lookOver(ratesOf(problem, inputs));
  const drift = endlessRate(problem, inputs, s);
  if (drift === 0) return breaksBefore(stepper, s, s.t + period);
  const horizon = driftHorizon(problem, stepper, s) / Math.abs(drift);
  if (period === 0) return breaksBefore(stepper, s, s.t + horizon);
  return afterManyPeriods(problem, stepper, s, period, Math.ceil(horizon / period));
}

function breaksBefore(stepper: Stepper, s: Stance, limit: number): number {
  while (s.t < limit) {
    if (stepper.step(s, limit) === "break-away") return s.t;
    if (stepper.outOfWork) return NaN;
  }
  return Infinity;
}

/**
 * Periodic inputs with a drift on top: what breaks the stick in one period breaks it in every later one, so the first
 * such period is found by bisection and only that one is followed.
 */
function afterManyPeriods(problem: Problem, stepper: Stepper, s: Stance, period: number, most: number): number {
  const stretchRate = problem.counterface === "base" ? 0 : problem.beltVelocity - stepper.form.inputs.base[1];
  const breakIn = (n: number): number => {
    const then = { ...s, t: s.t + n * period, position: s.position + n * period * stretchRate };
    stepper.form.inputs.locate(then.t);
    if (stepper.rejudge(then) === "break-away") return then.t;
    return breaksBefore(stepper, then, then.t + period);
  };
  let low = -1;
  let high = most;
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    const t = breakIn(middle);
    if (Number.isNaN(t)) return NaN;
    if (t < Infinity) high = middle;
    else low = middle;
  }
  return breakIn(high);
}

/** A force that nothing here can hold, N: room, what is needed now, and twice every swing. */
function driftHorizon(problem: Problem, stepper: Stepper, s: Stance): number {
  const { inputs, carried, elementSlope, grip, viscous } = stepper.form;
  stepper.form.take(s);
  carried.evaluate(0);
  const swing = inputs.forceBound(0) + problem.stiffness * inputs.baseBound(0) + viscous * inputs.baseBound(1);
  const room = grip * (inputs.normal + inputs.rippleBound(0)) + elementSlope * Math.abs(s.position);
  // the second set-valued element takes its share of the growing spring force (ρ < 1)
  return (2 * (Math.abs(carried.need) + room + 2 * swing)) / (1 - problem.solid.proportional);
}

/**
 * Rate at which the needed force grows for ever, N/s; of a spring that stiffens (k3) at least this, up to its sign. 0 where
 * spring and force ramp cancel but for their rounding.
 */
function endlessRate(problem: Problem, inputs: Inputs, s: Stance): number {
  if (problem.counterface === "base") return inputs.force[1];
  const stretchRate = problem.beltVelocity - inputs.base[1];
  const stiffness = problem.stiffness + problem.cubic * s.position ** 2;
  const spring = stiffness * stretchRate;
  const rate = spring - inputs.force[1];
  return Math.abs(rate) > 2 ** -50 * (Math.abs(spring) + Math.abs(inputs.force[1])) ? rate : 0;
}

/** How long periodic inputs are looked at, s: a hair over their common period, or 1,000 of the slowest; 0 without any. */
function lookOver(rates: readonly number[]): number {
  if (rates.length === 0) return 0;
  return (commonPeriod(rates) ?? cyclesAhead / Math.min(...rates)) * (1 + 1e-9);
}
