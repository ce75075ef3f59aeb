import { sayClock } from "./words.ts";

const weekday = new Intl.DateTimeFormat("en", { weekday: "long" });
const dayMonth = new Intl.DateTimeFormat("en-GB", { day: "numeric", month: "short" });
const dayMonthYear = new Intl.DateTimeFormat("en-GB", { day: "numeric", month: "short", year: "numeric" });

/**
 * An instant as one says it, in the reader's own zone: "14:02" today, "yesterday", "Tuesday" within the last six days,
 * "3 Nov" within the year, "3 Nov 2025" before.
 */
export function sayWhen(instant: Date, now: Date = new Date()): string {
  const days = daysBetween(instant, now);
  if (days <= 0) return sayClock(instant);
  if (days === 1) return "yesterday";
  if (days <= 6) return weekday.format(instant);
  return (instant.getFullYear() === now.getFullYear() ? dayMonth : dayMonthYear).format(instant);
}

/** Midnights between two instants; counted by the calendar, so that a short night of the clock change counts as one. */
function daysBetween(earlier: Date, later: Date): number {
  const day = (date: Date) => Date.UTC(date.getFullYear(), date.getMonth(), date.getDate());
  return (day(later) - day(earlier)) / 86_400_000;
}

/** An instant in full, in the reader's own zone: "11 Nov 2026, 16:40". */
export const sayMoment = (instant: Date): string => `${dayMonthYear.format(instant)}, ${sayClock(instant)}`;
