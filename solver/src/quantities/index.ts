import { amplitude } from "./amplitude.ts";
import { cycleStickFraction } from "./cycle-stick-fraction.ts";
import { dampingRatio } from "./damping-ratio.ts";
import { driftPerCycle } from "./drift-per-cycle.ts";
import { driveForcePeak } from "./drive-force-peak.ts";
import { driveForceRms } from "./drive-force-rms.ts";
import { followingErrorPeak } from "./following-error-peak.ts";
import { followingErrorRms } from "./following-error-rms.ts";
import { frictionPowerMean } from "./friction-power-mean.ts";
import { frictionPowerPeak } from "./friction-power-peak.ts";
import { halfCycles } from "./half-cycles.ts";
import { holdUse } from "./hold-use.ts";
import { lostMotion } from "./lost-motion.ts";
import { meanDisplacement } from "./mean-displacement.ts";
import { naturalHz } from "./natural-hz.ts";
import { peakAcceleration, peakDisplacement, peakVelocity, slipVelocityPeak } from "./peaks.ts";
import type { Quantity } from "./quantity.ts";
import { restBand } from "./rest-band.ts";
import { restDisplacement } from "./rest-displacement.ts";
import { restOffset } from "./rest-offset.ts";
import { restTime } from "./rest-time.ts";
import { settleOffset } from "./settle-offset.ts";
import { settleTime } from "./settle-time.ts";
import { slipDistance } from "./slip-distance.ts";
import { slipPerCycle } from "./slip-per-cycle.ts";
import { stickFraction } from "./stick-fraction.ts";
import { stickSlipHz } from "./stick-slip-hz.ts";
import { sticksPerCycle } from "./sticks-per-cycle.ts";
import { transmissibility } from "./transmissibility.ts";
import { velocityRipple } from "./velocity-ripple.ts";

/** Every quantity, in the order tables show them. A new one is one file and one line here. */
export const quantities: readonly Quantity[] = [
  naturalHz,
  dampingRatio,
  restBand,
  restTime,
  restDisplacement,
  restOffset,
  halfCycles,
  peakDisplacement,
  peakVelocity,
  peakAcceleration,
  slipVelocityPeak,
  amplitude,
  meanDisplacement,
  stickFraction,
  sticksPerCycle,
  stickSlipHz,
  cycleStickFraction,
  slipDistance,
  velocityRipple,
  followingErrorPeak,
  followingErrorRms,
  settleTime,
  settleOffset,
  lostMotion,
  holdUse,
  slipPerCycle,
  driftPerCycle,
  driveForcePeak,
  driveForceRms,
  frictionPowerPeak,
  frictionPowerMean,
  transmissibility,
];

/** The description of a quantity by its name; throws RangeError where there is none of that name. */
export function quantityOf(name: string): Quantity {
  const quantity = quantities.find((each) => each.name === name);
  if (quantity === undefined) throw new RangeError(`no quantity is called ${JSON.stringify(name)}`);
  return quantity;
}
