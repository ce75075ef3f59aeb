import type { Work } from "../../numerics/first-zero.ts";
import type { Problem } from "../../scenario/problem.ts";
import type { Inputs } from "../inputs.ts";
import type { Stance } from "./stance.ts";
import { Stepper } from "./stepper.ts";

const cyclesAhead = 1000;

/**
 * When a body stuck at `stance` breaks away if the inputs go on for ever: Infinity where it never does, NaN where the
 * allowed work did not suffice to tell. Moves, pulses and records are followed to their end; from there ramps always
 * break the stick in a time that their rate bounds, and harmonics (the ripple of N like one) are followed over a common
 * period, or 1,000 periods of the slowest where there is none so short.
 */
export function nextBreakAway(problem: Problem, stance: Stance, allowed: number): number {
  const work: Work = { spent: 0, allowed };
  const stepper = new Stepper(problem, work);
  const s = { ...stance };
  const { inputs } = stepper.form;
  inputs.locate(s.t);
  while (inputs.end < Infinity) {
    if (++work.spent > allowed) return NaN;
    const happening = stepper.step(s, inputs.end);
    if (happening === "break-away") return s.t;
    if (stepper.outOfWork) return NaN;
  }
  const limit = s.t + horizon(problem, stepper, s);
  while (s.t < limit) {
    if (stepper.step(s, limit) === "break-away") return s.t;
    if (stepper.outOfWork) return NaN;
  }
  return Infinity;
}

/** How long after the last corner the stick must be watched. */
function horizon(problem: Problem, stepper: Stepper, s: Stance): number {
  const { inputs, carried } = stepper.form;
  const periods = commonPeriod(problem, inputs);
  const drift = endlessRate(problem, inputs);
  if (drift === 0) return periods;
  stepper.form.take(s);
  carried.evaluate(0);
  const swing =
    inputs.forceBound(0) + problem.stiffness * inputs.baseBound(0) + stepper.form.viscous * inputs.baseBound(1);
  const element = stepper.form.elementSlope * Math.abs(s.position);
  const grip = stepper.form.grip * (inputs.normal + inputs.rippleBound(0));
  // twice over: the second set-valued element takes less than the spring does (ρ < 1)
  const slope = Math.abs(drift) * (1 - problem.solid.proportional);
  return (2 * (Math.abs(carried.need) + grip + 2 * swing + 2 * element)) / slope + periods;
}

/** Rate at which the needed force grows for ever, N/s. */
function endlessRate(problem: Problem, inputs: Inputs): number {
  if (problem.counterface === "base") return inputs.force[1];
  const stretchRate = problem.beltVelocity - inputs.base[1];
  return problem.stiffness * stretchRate - inputs.force[1];
}

function commonPeriod(problem: Problem, inputs: Inputs): number {
  const rates: number[] = [];
  for (const term of [...problem.force, ...problem.base]) {
    for (const harmonic of term.harmonics(inputs.origin)) rates.push(harmonic.hz);
  }
  if (problem.ripple !== null) rates.push(problem.ripple.hz);
  if (rates.length === 0) return 0;
  const slowest = Math.min(...rates);
  for (let n = 1; n < cyclesAhead; n++) {
    const isCommon = rates.every((hz) => Math.abs((n * hz) / slowest - Math.round((n * hz) / slowest)) <= 1e-9 * n);
    if (isCommon) return (n / slowest) * (1 + 1e-9);
  }
  return cyclesAhead / slowest;
}
