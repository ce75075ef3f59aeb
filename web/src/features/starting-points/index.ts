import { axisReversal } from "./cases/axis-reversal.ts";
import { drawer } from "./cases/drawer.ts";
import { forcedClamp } from "./cases/forced-clamp.ts";
import { frictionDampedIsolator } from "./cases/friction-damped-isolator.ts";
import { machineSlide } from "./cases/machine-slide.ts";
import { massOnABelt } from "./cases/mass-on-a-belt.ts";
import { moveAndSettle } from "./cases/move-and-settle.ts";
import { padBrake } from "./cases/pad-brake.ts";
import { ringDownCoupon } from "./cases/ring-down-coupon.ts";
import { shakenPart } from "./cases/shaken-part.ts";
import { smallSteps } from "./cases/small-steps.ts";
import { valveSpool } from "./cases/valve-spool.ts";
import { verticalStage } from "./cases/vertical-stage.ts";
import type { StartingPoint } from "./starting-point.ts";

/** Every starting point, in the order they are offered. */
export const startingPoints: readonly StartingPoint[] = [
  machineSlide,
  axisReversal,
  smallSteps,
  moveAndSettle,
  padBrake,
  frictionDampedIsolator,
  forcedClamp,
  verticalStage,
  shakenPart,
  massOnABelt,
  drawer,
  valveSpool,
  ringDownCoupon,
];
