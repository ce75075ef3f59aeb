import type { Outcome } from "@restband/solver";

/** A tick of a logarithmic scale: its place in decades from the middle, and its value. */
export interface Tick {
  readonly at: number;
  readonly value: number;
  readonly isLabelled: boolean;
}

/** The ticks at 1, 2, … 9 of each decade, labelled at 1, 2 and 5, within `reach` decades of `middle` (not 0). */
export function ticksOf(middle: number, reach: number): Tick[] {
  const size = Math.abs(middle);
  const first = Math.floor(Math.log10(size) - reach);
  const decades = Array.from({ length: Math.ceil(2 * reach) + 2 }, (_, i) => first + i);
  return decades
    .flatMap((decade) => [1, 2, 3, 4, 5, 6, 7, 8, 9].map((digit) => tick(digit, decade, middle)))
    .filter(({ at }) => Math.abs(at) <= reach + 1e-9);
}

function tick(digit: number, decade: number, middle: number): Tick {
  const value = Number(`${digit}e${decade}`) * Math.sign(middle);
  return { at: Math.log10(value / middle), value, isLabelled: digit === 1 || digit === 2 || digit === 5 };
}

/** Neighbouring points of one outcome; between two outcomes the boundary is drawn half way. */
export interface Stretch {
  readonly from: number;
  readonly to: number;
  readonly outcome: Outcome | null | undefined;
}

/** Joins outcomes at equal steps over [−reach, reach]; points not known yet take the nearest known one before them. */
export function stretchesOf(outcomes: readonly (Outcome | null | undefined)[], reach: number): Stretch[] {
  if (outcomes.length < 2) return [];
  const step = (2 * reach) / (outcomes.length - 1);
  const filled = filledUp(outcomes);
  const stretches: Stretch[] = [];
  filled.forEach((outcome, i) => {
    const from = i === 0 ? -reach : -reach + (i - 0.5) * step;
    const to = i === filled.length - 1 ? reach : -reach + (i + 0.5) * step;
    const last = stretches.at(-1);
    if (last && last.outcome === outcome) stretches[stretches.length - 1] = { ...last, to };
    else stretches.push({ from, to, outcome });
  });
  return stretches;
}

function filledUp<T>(values: readonly (T | undefined)[]): (T | undefined)[] {
  let last: T | undefined;
  return values.map((value) => (last = value === undefined ? last : value));
}
