import { betaQuantile } from "./beta.ts";
import { normalQuantile } from "./normal.ts";

export interface Interval {
  readonly low: number;
  readonly high: number;
}

/**
 * The interval of a probability by the score test (Wilson 1927), from `count` successes in `of` independent trials; 0…1
 * without trials. @param confidence 0.95, say
 */
export function wilsonInterval(count: number, of: number, confidence: number): Interval {
  if (of === 0) return { low: 0, high: 1 };
  const z = normalQuantile((1 + confidence) / 2);
  const share = count / of;
  const middle = share + (z * z) / (2 * of);
  const half = z * Math.sqrt((share * (1 - share)) / of + ((z / of) * (z / of)) / 4);
  const scale = 1 + (z * z) / of;
  return {
    low: count === 0 ? 0 : Math.max(0, (middle - half) / scale),
    high: count === of ? 1 : Math.min(1, (middle + half) / scale),
  };
}

/** The exact interval (Clopper & Pearson 1934): covers at least with this confidence whatever the probability is. */
export function exactInterval(count: number, of: number, confidence: number): Interval {
  const rest = (1 - confidence) / 2;
  return {
    low: count === 0 ? 0 : betaQuantile(rest, count, of - count + 1),
    high: count === of ? 1 : betaQuantile(1 - rest, count + 1, of - count),
  };
}
