import { hasStraightSpring, holdsMoreThanItSlides, isFed, slidesAtOneForce, sticksAndSlips } from "./conditions.ts";
import { dampingLeftOut, speedOf, stickSlipCycle } from "./feed.ts";
import type { TextbookCompanion } from "./textbook-companion.ts";

/** Fastest sliding past the counterface: V + Aω. */
export const peakSlipSpeed: TextbookCompanion = {
  key: "peak-slip-speed",
  label: "Fastest slip",
  formula: "V + A ω",
  source: "Harmonic arc and straight load-up, derived here; textbook knowledge, from memory",
  dimension: "velocity",
  conditions: [isFed, hasStraightSpring, slidesAtOneForce, holdsMoreThanItSlides, sticksAndSlips],
  value: (kase) => speedOf(kase) + stickSlipCycle(kase).amplitude * kase.omega,
  ofRun: ({ result }) => result.quantities.slipVelocityPeak ?? null,
  note: dampingLeftOut,
};
