import { hasStraightSpring, holdsMoreThanItSlides, isFed, slidesAtOneForce, sticksAndSlips } from "./conditions.ts";
import { dampingLeftOut, stickSlipCycle } from "./feed.ts";
import type { TextbookCompanion } from "./textbook-companion.ts";

/** Half the way the spring works in each cycle. */
export const slipAmplitude: TextbookCompanion = {
  key: "slip-amplitude",
  label: "Amplitude of the spring",
  formula: "A = √(d^2 + V^2/ω^2)",
  source: "Harmonic arc and straight load-up, derived here; textbook knowledge, from memory",
  dimension: "displacement",
  conditions: [isFed, hasStraightSpring, slidesAtOneForce, holdsMoreThanItSlides, sticksAndSlips],
  value: (kase) => stickSlipCycle(kase).amplitude,
  ofRun: ({ result }) => result.quantities.amplitude ?? null,
  note: dampingLeftOut,
};
