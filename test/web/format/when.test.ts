import { describe, expect, it } from "vitest";
import { sayWhen } from "../../../web/src/format/when.ts";

// Friday, in the reader's own zone whatever that is.
const now = new Date(2026, 10, 27, 15, 30);

describe("an instant as one says it", () => {
  it.each([
    [new Date(2026, 10, 27, 9, 5), "09:05"],
    [new Date(2026, 10, 27, 0, 0), "00:00"],
    [new Date(2026, 10, 26, 23, 59), "yesterday"],
    [new Date(2026, 10, 25, 15, 0), "Wednesday"],
    [new Date(2026, 10, 21, 0, 0), "Saturday"],
    [new Date(2026, 10, 20, 23, 59), "20 Nov"],
    [new Date(2025, 11, 31, 12, 0), "31 Dec 2025"],
    // A server's clock a little ahead of the reader's is no reason to speak of tomorrow.
    [new Date(2026, 10, 27, 15, 31), "15:31"],
  ])("%s is %s", (instant, words) => expect(sayWhen(instant, now)).toBe(words));
});
