import { hasStraightSpring, holdsMoreThanItSlides, isFed, slidesAtOneForce, sticksAndSlips } from "./conditions.ts";
import { dampingLeftOut, meanTime, stickSlipCycle } from "./feed.ts";
import type { TextbookCompanion } from "./textbook-companion.ts";

/** Load-up of the spring by 2d at V. */
export const stickTime: TextbookCompanion = {
  key: "stick-time",
  label: "Time stuck in each cycle",
  formula: "2d/V",
  source: "Harmonic arc and straight load-up, derived here; textbook knowledge, from memory",
  dimension: "time",
  conditions: [isFed, hasStraightSpring, slidesAtOneForce, holdsMoreThanItSlides, sticksAndSlips],
  value: (kase) => stickSlipCycle(kase).stick,
  ofRun: ({ result }) => meanTime(result, "stop", "break-away"),
  note: dampingLeftOut,
};
