import type { CompiledTerm } from "../excitation/excitation-term.ts";
import type { Problem } from "../scenario/problem.ts";

/** Everything put in from outside. A ripple of N is no input. */
export function inputsOf({ force, base }: Problem): readonly CompiledTerm[] {
  return [...force, ...base];
}

/** True where the base only stands or runs on: ramps and constants, with at least one ramp. */
export function isFed({ base }: Problem): boolean {
  return (
    base.some(({ nature }) => nature === "ramp") &&
    base.every(({ nature }) => nature === "ramp" || nature === "constant")
  );
}

/** True where all inputs are constant or harmonic, and at least one is harmonic. */
export function isPeriodic(problem: Problem): boolean {
  const inputs = inputsOf(problem);
  return (
    inputs.some(({ nature }) => nature === "harmonic") &&
    inputs.every(({ nature }) => nature === "harmonic" || nature === "constant")
  );
}

/** The lowest frequency among the inputs, Hz; null without a harmonic input. */
export function lowestHz(problem: Problem): number | null {
  const all = inputsOf(problem).flatMap(({ hz }) => (hz === null ? [] : [hz]));
  return all.length === 0 ? null : Math.min(...all);
}

/** True where no input changes any more from t on. */
export function isConstantFrom(problem: Problem, t: number): boolean {
  return inputsOf(problem).every((term) => term.isConstantFrom(t));
}
