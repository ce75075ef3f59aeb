import { hasStraightSpring, holdsMoreThanItSlides, isFed, slidesAtOneForce, sticksAndSlips } from "./conditions.ts";
import { dampingLeftOut, meanTime, stickSlipCycle } from "./feed.ts";
import type { TextbookCompanion } from "./textbook-companion.ts";

/** The slip of each cycle, an arc of a sine. */
export const slipTime: TextbookCompanion = {
  key: "slip-time",
  label: "Time slipping in each cycle",
  formula: "(2/ω)(π − atan(d ω/V))",
  source: "Harmonic arc and straight load-up, derived here; textbook knowledge, from memory",
  dimension: "time",
  conditions: [isFed, hasStraightSpring, slidesAtOneForce, holdsMoreThanItSlides, sticksAndSlips],
  value: (kase) => stickSlipCycle(kase).slip,
  ofRun: ({ result }) => meanTime(result, "break-away", "stop"),
  note: dampingLeftOut,
};
