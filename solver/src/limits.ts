import { isCutOff } from "./outcome.ts";
import { quantityOf } from "./quantities/index.ts";
import type { Ended, LimitVerdict } from "./result.ts";
import type { Limit } from "./scenario/scenario.ts";

/**
 * The verdict on one limit. The margin is the room left in the quantity's own unit, negative when broken, the smaller of
 * two bounds; exactly equal is kept. What has no value, or comes from a run that was cut off, cannot be judged: that is
 * not kept, and `reason` says why.
 * @param value of the quantity, null where it has none; of a cut-off run, that of the motion so far
 */
export function verdictOn(limit: Limit, value: number | null, ended: Ended): LimitVerdict {
  const cutOff = cutOffReason(ended);
  if (cutOff !== null) return { ...limit, value, kept: null, margin: null, reason: cutOff };
  if (value === null) return { ...limit, value, kept: null, margin: null, reason: absence(limit.quantity) };
  const room = Math.min((limit.max ?? Infinity) - value, value - (limit.min ?? -Infinity));
  return { ...limit, value, kept: room >= 0, margin: room };
}

function cutOffReason(ended: Ended): string | null {
  if (!isCutOff(ended)) return null;
  if (ended === "cancelled") return "The run was cancelled before its end.";
  const allowed = ended === "max-events" ? "events" : "work";
  return `The run reached the most ${allowed} it is allowed before its end.`;
}

function absence(name: string): string {
  const { label, absent } = quantityOf(name);
  return `${label} has no value in this run: ${absent ?? "it is not defined here"}.`;
}
