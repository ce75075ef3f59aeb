const SMALL = ["no", "one", "two", "three", "four", "five", "six", "seven", "eight", "nine", "ten", "eleven", "twelve"];

/** A count in running text: words up to twelve, figures from there on. */
export const sayCount = (count: number): string => SMALL[count] ?? String(count);

/** "one limit", "four limits". */
export const sayMany = (count: number, noun: string, plural = `${noun}s`): string =>
  `${sayCount(count)} ${count === 1 ? noun : plural}`;

export const capitalised = (sentence: string): string => sentence.charAt(0).toUpperCase() + sentence.slice(1);

/** "a, b and c". */
export function listed(items: readonly string[]): string {
  if (items.length < 2) return items.join("");
  return `${items.slice(0, -1).join(", ")} and ${items[items.length - 1]}`;
}

/** Clock time of an instant, "14:02", in the reader's own zone. */
export const sayClock = (instant: Date): string =>
  `${String(instant.getHours()).padStart(2, "0")}:${String(instant.getMinutes()).padStart(2, "0")}`;
