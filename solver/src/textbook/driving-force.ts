import { isConstantFrom } from "../quantities/drive.ts";
import type { Problem } from "../scenario/problem.ts";
import { slidingForce, type TextbookCase } from "./textbook-case.ts";

/** The one harmonic force on a body, N (N·m) and rad/s. */
export interface DrivingForce {
  /** P, > 0. */
  readonly amplitude: number;
  /** Ω. */
  readonly omega: number;
}

/** The one harmonic force where all else put in is constant and no belt runs; null elsewhere. */
export function drivingForce(problem: Problem): DrivingForce | null {
  const harmonics = problem.force.filter(({ nature }) => nature === "harmonic");
  const others = problem.force.filter(({ nature }) => nature !== "harmonic");
  const isAlone = isConstantFrom({ ...problem, force: others }, 0) && problem.beltVelocity === 0;
  if (harmonics.length !== 1 || !isAlone) return null;
  const [{ amplitude, hz }] = harmonics[0].harmonics(0);
  return amplitude === 0 ? null : { amplitude: Math.abs(amplitude), omega: 2 * Math.PI * hz };
}

/** The same in the ratios of the textbooks: r = Ω/ω, β = F_k/P, and P/k in m (rad). */
export interface ForcedRatios {
  readonly r: number;
  readonly beta: number;
  readonly unit: number;
}

/** For a case that conditions have found driven by one force. */
export function forcedRatios(kase: TextbookCase): ForcedRatios {
  const { amplitude, omega } = drivingForce(kase.problem) ?? { amplitude: NaN, omega: NaN };
  const { stiffness } = kase.problem;
  return { r: omega / kase.omega, beta: slidingForce(kase) / amplitude, unit: amplitude / stiffness };
}

/** True at resonance as near as a frequency can be entered: without damping no amplitude is steady there. */
export const isUnboundedAt = (r: number): boolean => Math.abs(r - 1) <= 1e-9;
