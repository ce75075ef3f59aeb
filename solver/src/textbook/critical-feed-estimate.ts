import { criticalSpeedRatio, hasCriticalFeed, jumpSpeed } from "./critical-feed.ts";
import type { TextbookCompanion } from "./textbook-companion.ts";

const estimate = (ratio: number): number => 1 / Math.sqrt(4 * Math.PI * ratio);

/** The same for small ζ: the loss of one cycle balanced against the regained speed. */
export const criticalFeedEstimate: TextbookCompanion = {
  key: "critical-feed-estimate",
  label: "Lowest smooth feed, estimate",
  formula: "ΔF/√(4π ζ k m)",
  source: "Form of Derjaguin, Push & Tolstoi 1957 and Brockley, Cameron & Potter 1967, from memory",
  dimension: "velocity",
  conditions: hasCriticalFeed,
  value: (kase) => jumpSpeed(kase) * estimate(kase.ratio),
  ofRun: () => null,
  note: ({ ratio }) => {
    const over = 100 * (estimate(ratio) / criticalSpeedRatio(ratio) - 1);
    return `For small damping; on the safe side, here by ${over.toPrecision(2)}\u00a0%.`;
  },
};
