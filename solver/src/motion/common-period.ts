import type { Problem } from "../scenario/problem.ts";
import type { Inputs } from "./inputs.ts";

const mostPeriods = 1000;

/** The rates of all harmonics acting at the inputs' origin, the ripple of N included, Hz. */
export function ratesOf(problem: Problem, inputs: Inputs): number[] {
  const rates: number[] = [];
  for (const term of [...problem.force, ...problem.base]) {
    for (const harmonic of term.harmonics(inputs.origin)) rates.push(harmonic.hz);
  }
  if (problem.ripple !== null) rates.push(problem.ripple.hz);
  return rates;
}

/** The shortest period that all rates share, s; null without rates, or where 1,000 periods of the slowest hold none. */
export function commonPeriod(rates: readonly number[]): number | null {
  if (rates.length === 0) return null;
  const slowest = Math.min(...rates);
  for (let n = 1; n <= mostPeriods; n++) {
    const fits = (hz: number): boolean => Math.abs((n * hz) / slowest - Math.round((n * hz) / slowest)) <= 1e-12 * n;
    if (rates.every(fits)) return n / slowest;
  }
  return null;
}
