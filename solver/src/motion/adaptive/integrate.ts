import type { Work } from "../../numerics/first-zero.ts";
import { Solver } from "./vendor-odex.js";

/** Of the adaptive method, where nobody asks for another. */
export const usualTolerance = 1e-10;

/** A smooth initial-value problem y′ = f(t, y) over [from, to]. */
export interface Integration {
  readonly from: number;
  readonly to: number;
  readonly start: readonly number[];
  /** Fills `out` with f(t, y). */
  rates(t: number, y: readonly number[], out: number[]): void;
  /** Typical size of each unknown: the absolute tolerance is `tolerance` times it. */
  readonly sizes: readonly number[];
  /** A time in which things change, s; no step is longer than `longest`. */
  readonly unit: number;
  readonly longest: number;
  /** Relative tolerance. */
  readonly tolerance: number;
  /** Counts right-hand sides against the run's cap. */
  readonly work: Work;
  /** Each accepted step with its dense output; false stops. */
  onStep(from: number, to: number, dense: (i: number, t: number) => number): boolean;
}

/** Why the right-hand side cannot be asked again. */
class Halt extends Error {}

/**
 * Integrates by Gragg–Bulirsch–Stoer extrapolation with dense output (odex; Hairer, Nørsett & Wanner, Solving Ordinary
 * Differential Equations I, II.9). Time and unknowns are scaled, since odex floors its first step at 1e-4 and takes one
 * tolerance for all. It is halted from within where the work runs out or a value is no longer finite: odex itself would
 * accept steps of NaN.
 *
 * @returns how far it came, s
 */
export function integrate(of: Integration): number {
  const { from, to, start, sizes, unit, work } = of;
  const solver = new Solver(start.length);
  solver.relativeTolerance = of.tolerance;
  solver.absoluteTolerance = of.tolerance;
  solver.initialStepSize = Math.min(0.02, (to - from) / unit / 4);
  solver.maxStepSize = Math.min(of.longest, to - from) / unit;
  solver.maxSteps = 1e9;
  // its check divides by the first slope: a body that starts with v = a = 0 would have its step halved to nothing
  solver.stabilityCheckCount = 0;
  solver.denseOutput = true;
  const y = start.map(() => 0);
  const rates = start.map(() => 0);
  let reached = from;
  const scaledRates = (x: number, scaled: number[]): number[] => {
    if (++work.spent > work.allowed) throw new Halt("the work allowed is spent");
    for (let i = 0; i < y.length; i++) y[i] = scaled[i] * sizes[i];
    of.rates(from + x * unit, y, rates);
    return rates.map((rate, i) => finite((rate * unit) / sizes[i]));
  };
  const end = (to - from) / unit;
  try {
    solver.solve(
      scaledRates,
      0,
      start.map((value, i) => value / sizes[i]),
      end,
      (_, xOld, x, __, dense) => {
        if (dense === undefined || x === xOld) return true;
        const stepEnd = x >= end ? to : from + x * unit;
        const stepStart = from + xOld * unit;
        reached = stepEnd;
        if (!(stepEnd > stepStart)) return true; // shorter than the clock can tell
        return of.onStep(stepStart, stepEnd, (i, t) => dense(i, (t - from) / unit) * sizes[i]);
      },
    );
  } catch (error) {
    if (!(error instanceof Halt)) throw error;
  }
  return reached;
}

function finite(value: number): number {
  if (!Number.isFinite(value)) throw new Halt("a value is no longer finite");
  return value;
}
