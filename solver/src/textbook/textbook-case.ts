import { isConstantFrom } from "../quantities/drive.ts";
import type { Result } from "../result.ts";
import { compileProblem } from "../scenario/compile-problem.ts";
import type { Problem } from "../scenario/problem.ts";
import type { Records, Scenario } from "../scenario/scenario.ts";

/** A scenario and its result in the symbols of the textbooks; SI. */
export interface TextbookCase {
  readonly problem: Problem;
  readonly result: Result;
  readonly scenario: Scenario;
  /** F_s = μs N r: what friction holds at rest, N (N·m); without ripple. */
  readonly staticForce: number;
  /** F_k = μk N r while sliding, N (N·m); null where it changes with speed. */
  readonly kineticForce: number | null;
  /** ω = √(k/m), rad/s; 0 without a spring. */
  readonly omega: number;
  /** c + c_h, N·s/m (N·m·s/rad). */
  readonly damping: number;
  /** ζ = (c + c_h)/(2√(km)); 0 without a spring. */
  readonly ratio: number;
  /** v_0 of a regularised law F tanh(v/v_0), m/s between the faces. */
  readonly regularVelocity: number;
}

/** What a reader may choose beside the scenario. */
export interface TextbookSettings {
  /** See `TextbookCase.regularVelocity`; 1 mm/s unless given. */
  readonly regularVelocity?: number;
  /** Points of records the scenario names by digest. */
  readonly records?: Records;
}

/** Reads a checked scenario and its result; throws RangeError where a record's points are missing. */
export function textbookCase(scenario: Scenario, result: Result, settings: TextbookSettings = {}): TextbookCase {
  const problem = compileProblem(scenario, settings.records);
  const { inertia, stiffness, viscous, solid, law, normal, radius } = problem;
  const damping = viscous + solid.viscous;
  return {
    problem,
    result,
    scenario,
    staticForce: law.atRest * normal * radius,
    kineticForce: law.constant === null ? null : law.constant * normal * radius,
    omega: Math.sqrt(stiffness / inertia),
    damping,
    ratio: stiffness > 0 ? damping / (2 * Math.sqrt(stiffness * inertia)) : 0,
    regularVelocity: settings.regularVelocity ?? 1e-3,
  };
}

/** F_k where conditions have made sure that it is one number. */
export const slidingForce = ({ kineticForce }: TextbookCase): number => kineticForce ?? NaN;

/** x_k = F_k/k, m (rad). */
export const slidingOffset = (kase: TextbookCase): number => slidingForce(kase) / kase.problem.stiffness;

/** True where the input of the body never changes: no force, base or belt puts motion into it. */
export const isFree = ({ problem }: TextbookCase): boolean => isConstantFrom(problem, 0) && problem.beltVelocity === 0;

/** Sum of polynomials and harmonics of some terms at t = 0. */
export function initialSum(terms: Problem["force"]): number {
  const polynomial = new Float64Array(4);
  let sum = 0;
  for (const term of terms) {
    term.addPolynomial(0, polynomial);
    for (const { amplitude, hz, phase, origin } of term.harmonics(0))
      sum += amplitude * Math.cos(phase - 2 * Math.PI * hz * origin);
  }
  return sum + polynomial[0];
}

/** What pushes the body all the time: constant forces and its weight's share along the guide, N (N·m). */
export const steadyPush = ({ force, weight }: Problem): number =>
  initialSum(force.filter(({ nature }) => nature !== "harmonic")) + weight;

/** Where the body would stand without friction under its constant inputs alone: y + (F + W)/k, m (rad). */
export const equilibrium = ({ problem }: TextbookCase): number =>
  initialSum(problem.base) + steadyPush(problem) / problem.stiffness;
