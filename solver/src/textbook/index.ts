import { coulombDecrement } from "./coulomb-decrement.ts";
import { criticalFeedEstimate } from "./critical-feed-estimate.ts";
import { criticalFeedExact } from "./critical-feed-exact.ts";
import { dampedSwing } from "./damped-swing.ts";
import { denHartogAmplitude } from "./den-hartog-amplitude.ts";
import { envelopeSlope } from "./envelope-slope.ts";
import { equivalentViscousAmplitude } from "./equivalent-viscous-amplitude.ts";
import { firstBreakAway } from "./first-break-away.ts";
import { halfCyclesToRest } from "./half-cycles-to-rest.ts";
import { linearStability } from "./linear-stability.ts";
import { logarithmicDecrement } from "./logarithmic-decrement.ts";
import { peakSlipSpeed } from "./peak-slip-speed.ts";
import { regularisedCreep } from "./regularised-creep.ts";
import { reidRatio } from "./reid-ratio.ts";
import { resonanceGrowth } from "./resonance-growth.ts";
import { restPosition } from "./rest-position.ts";
import { slipAmplitude } from "./slip-amplitude.ts";
import { slipTime } from "./slip-time.ts";
import { solidDampingRatio } from "./solid-damping-ratio.ts";
import { solidDecrement } from "./solid-decrement.ts";
import { solidEquivalentDamping } from "./solid-equivalent-damping.ts";
import { solidLossPerCycle } from "./solid-loss-per-cycle.ts";
import { staticAnswer } from "./static-answer.ts";
import { stickSlipPeriod } from "./stick-slip-period.ts";
import { stickTime } from "./stick-time.ts";
import type { TextbookCompanion } from "./textbook-companion.ts";
import { timeToRest } from "./time-to-rest.ts";

/** Every textbook companion, in the order the checks show them. A new one is one file and one line here. */
export const textbookCompanions: readonly TextbookCompanion[] = [
  staticAnswer,
  coulombDecrement,
  envelopeSlope,
  dampedSwing,
  halfCyclesToRest,
  timeToRest,
  restPosition,
  logarithmicDecrement,
  reidRatio,
  solidDecrement,
  solidDampingRatio,
  denHartogAmplitude,
  equivalentViscousAmplitude,
  resonanceGrowth,
  solidLossPerCycle,
  solidEquivalentDamping,
  firstBreakAway,
  stickSlipPeriod,
  stickTime,
  slipTime,
  slipAmplitude,
  peakSlipSpeed,
  criticalFeedExact,
  criticalFeedEstimate,
  linearStability,
  regularisedCreep,
];
