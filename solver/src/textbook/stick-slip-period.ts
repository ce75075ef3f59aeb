import { hasStraightSpring, holdsMoreThanItSlides, isFed, slidesAtOneForce, sticksAndSlips } from "./conditions.ts";
import { dampingLeftOut, meanTime, stickSlipCycle } from "./feed.ts";
import type { TextbookCompanion } from "./textbook-companion.ts";

/** Stick and slip together: the time from jump to jump. */
export const stickSlipPeriod: TextbookCompanion = {
  key: "stick-slip-period",
  label: "Time from jump to jump",
  formula: "2d/V + (2/ω)(π − atan(d ω/V))",
  source: "Harmonic arc and straight load-up, derived here; textbook knowledge, from memory",
  dimension: "time",
  conditions: [isFed, hasStraightSpring, slidesAtOneForce, holdsMoreThanItSlides, sticksAndSlips],
  value: (kase) => {
    const { slip, stick } = stickSlipCycle(kase);
    return slip + stick;
  },
  ofRun: ({ result }) => meanTime(result, "break-away", "break-away"),
  note: dampingLeftOut,
};
