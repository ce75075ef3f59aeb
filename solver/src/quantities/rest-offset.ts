import type { Problem } from "../scenario/problem.ts";
import type { Quantity } from "./quantity.ts";

export const restOffset: Quantity = {
  name: "restOffset",
  label: "Rest offset",
  dimension: "displacement",
  signed: true,
  meaning: "how far from the equilibrium without friction, k d + k3 d³ = F + W, the body stands still for good",
  absent: "the body does not come to rest for good, or has no steady equilibrium to rest at",
  value: (reading) => {
    const { restTime, problem } = reading;
    if (restTime === null || !problem.force.every((term) => term.isConstantFrom(restTime))) return null;
    const { d, force } = reading.at(restTime);
    const equilibrium = equilibriumOf(problem, force + problem.weight);
    return equilibrium === null ? null : d - equilibrium;
  },
};

/**
 * d with k d + k3 d³ = P: the root that a load growing from 0 leads to. Null without a spring, and where a softening one
 * (k3 < 0) cannot carry P. Newton's method, from the side on which it closes in without overshoot.
 */
function equilibriumOf({ stiffness, cubic }: Problem, load: number): number | null {
  if (stiffness === 0) return cubic === 0 ? null : Math.cbrt(load / cubic);
  if (cubic === 0) return load / stiffness;
  const most = cubic < 0 ? Math.sqrt(stiffness / (-3 * cubic)) : Infinity;
  if (Math.abs(load) > ((2 * stiffness) / 3) * most) return null;
  let d = cubic > 0 ? load / stiffness : 0;
  for (let i = 0; i < 100; i++) {
    const step = ((stiffness + cubic * d * d) * d - load) / (stiffness + 3 * cubic * d * d);
    if (!(Math.abs(step) > 1e-15 * Math.abs(d))) break;
    d -= step;
  }
  return d;
}
