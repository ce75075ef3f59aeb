import type { Problem } from "../scenario/problem.ts";

/** The size of the friction force on a sliding body, r [μ(r|v_r|) N + b r|v_r|], N (N·m); 0 without contact. */
export function slidingFriction(problem: Problem, slip: number, normal: number): number {
  if (!(normal > 0)) return 0;
  const { law, radius } = problem;
  if (law.constant !== null) return radius * law.constant * normal;
  const speed = radius * Math.abs(slip);
  return radius * (law.coefficient(speed) * normal + law.fluid * speed);
}
