import type { Outcome } from "@restband/solver";

/** Each outcome in a word or two, as scales and tables say it, and the drawing that goes with it. */
export const outcomeWords: Record<Outcome, string> = {
  "never-moved": "never moves",
  "came-to-rest": "comes to rest",
  "too-short": "too short to tell",
  growing: "grows",
  "stick-slip": "sticks and slips",
  settles: "settles",
  "not-settled": "not settled",
  "smooth-sliding": "slides smoothly",
};
