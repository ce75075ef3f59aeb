import { formatNumber } from "../../format/format-number.ts";

/** "204 of 224 cells · 19 a second · about 2 s left"; without a rate until there is one to tell. */
export function rateWords(done: number, total: number, elapsedMs: number, noun = "cells"): string {
  const count = `${formatNumber(done, 9)} of ${formatNumber(total, 9)} ${noun}`;
  const rate = (1000 * done) / elapsedMs;
  if (elapsedMs < 400 || !(rate > 0)) return count;
  return `${count} · ${formatNumber(rate, 2)} a second · about ${timeWords((total - done) / rate)} left`;
}

/** A wait in words: "2 s", "4 min", "1.5 h". */
export function timeWords(seconds: number): string {
  if (seconds < 90) return `${Math.max(1, Math.round(seconds))} s`;
  return seconds < 5400 ? `${Math.round(seconds / 60)} min` : `${formatNumber(seconds / 3600, 2)} h`;
}
