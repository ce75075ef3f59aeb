import { compileProblem } from "../../scenario/compile-problem.ts";
import type { Problem } from "../../scenario/problem.ts";
import type { Records, Scenario } from "../../scenario/scenario.ts";
import { unsupported } from "../../scenario/unsupported.ts";
import { feedSpeed } from "../../textbook/feed.ts";
import { inputsAt } from "../motion-inputs.ts";
import type { StartKind } from "./threshold.ts";

/** How far from steady sliding a run starts, in V/ω: small enough to judge a small swing, large enough to stand above rounding. */
const trifle = 1e-3;

/**
 * The starts from which an outcome is searched: as the scenario has it; from rest too, where something drives the body; from
 * steady sliding too, where base or belt runs past it. A varied start is searched as it is.
 */
export function startsFor(scenario: Scenario, path: string, records?: Records): StartKind[] {
  if (path.startsWith("initial.") || unsupported(scenario, records) !== null) return ["scenario"];
  const problem = compileProblem(scenario, records);
  const isDriven = ![...problem.force, ...problem.base].every((term) => term.isConstantFrom(0));
  if (feedSpeed(problem) !== null) return ["scenario", "rest", "steady-sliding"];
  return isDriven && !problem.isRelative ? ["scenario", "rest"] : ["scenario"];
}

/** The scenario with another start; null where there is none of that kind at its values. */
export function startedFrom(scenario: Scenario, kind: StartKind, records?: Records): Scenario | null {
  if (kind === "scenario") return scenario;
  const problem = compileProblem(scenario, records);
  const initial = kind === "rest" ? restOn(problem) : steadySliding(problem);
  return initial === null ? null : { ...scenario, initial };
}

/** Spring relaxed, still on the counterface. */
function restOn(problem: Problem): Scenario["initial"] {
  const { y, rate } = inputsAt(problem, 0);
  const { counterface, beltVelocity } = problem;
  const velocity = counterface === "base" ? rate : counterface === "belt" ? beltVelocity : 0;
  return { displacement: y, velocity };
}

/** ḋ = 0 with the spring bent by what friction takes at that speed, but for a trifle. */
function steadySliding(problem: Problem): Scenario["initial"] | null {
  const { y, rate, force } = inputsAt(problem, 0);
  const { law, normal, radius, stiffness, inertia, weight, beltVelocity } = problem;
  const slip = rate - beltVelocity;
  const speed = feedSpeed(problem);
  if (speed === null || !(stiffness > 0) || Math.abs(Math.abs(slip) - speed) > 1e-9 * speed) return null;
  const faces = radius * Math.abs(slip);
  const friction = radius * (law.coefficient(faces) * normal + law.fluid * faces);
  const bent = deflectionOf(problem, force + weight - Math.sign(slip) * friction);
  return { displacement: y + bent + trifle * speed * Math.sqrt(inertia / stiffness), velocity: rate };
}

/** d with k d + k3 d³ = load, by Newton from the straight spring; of a softening spring its near root. */
function deflectionOf({ stiffness, cubic }: Problem, load: number): number {
  let d = load / stiffness;
  for (let i = 0; i < 50 && cubic !== 0; i++)
    d -= (stiffness * d + cubic * d ** 3 - load) / (stiffness + 3 * cubic * d * d);
  return d;
}
