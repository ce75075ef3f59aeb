import { criticalSpeedRatio, feedBeside, hasCriticalFeed, jumpSpeed } from "./critical-feed.ts";
import type { TextbookCase } from "./textbook-case.ts";
import type { TextbookCompanion } from "./textbook-companion.ts";

const criticalFeed = (kase: TextbookCase): number => jumpSpeed(kase) * criticalSpeedRatio(kase.ratio);

/** The lowest feed without stick–slip, from the closed form of the slip. */
export const criticalFeedExact: TextbookCompanion = {
  key: "critical-feed-exact",
  label: "Lowest smooth feed, exact",
  formula: "velocity never regains V",
  source: "Closed form of one slip with damping, derived here",
  dimension: "velocity",
  conditions: hasCriticalFeed,
  value: criticalFeed,
  // one run has one feed: the lowest is found by a search over runs
  ofRun: () => null,
  note: (kase) => feedBeside(kase, criticalFeed(kase)),
};
