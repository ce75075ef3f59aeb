import type { Outcome } from "@restband/solver";
import type { ScanPoint } from "../../../compute/use-scan.ts";

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

/** Neighbouring points of one outcome, in decades from the middle; between two outcomes the boundary is half way. */
export interface Stretch {
  readonly from: number;
  readonly to: number;
  readonly outcome: Outcome | null;
}

/** Joins what a scan has found, its places 0…1 spread over [−reach, reach]. */
export function stretchesOf(points: readonly ScanPoint[], reach: number): Stretch[] {
  if (points.length < 2) return [];
  const place = (at: number): number => reach * (2 * at - 1);
  const stretches: Stretch[] = [];
  points.forEach(({ at, outcome }, i) => {
    const to = i === points.length - 1 ? reach : place((at + points[i + 1].at) / 2);
    const last = stretches.at(-1);
    if (last && last.outcome === outcome) stretches[stretches.length - 1] = { ...last, to };
    else stretches.push({ from: last?.to ?? -reach, to, outcome });
  });
  return stretches;
}
