import type { Phase } from "../../result.ts";
import type { ClosedForm } from "./closed-form.ts";
import type { Stance } from "./stance.ts";
import { heldTolerance } from "./watch.ts";

/**
 * The second set-valued element, S = ρ k |d| sgn(ḋ) of displacement-proportional damping: chooses the quadrant (signs of ḋ
 * and d just after s.t), or the lock at ḋ = 0. The inputs are located at s.t. Without the element both signs read 1.
 */
export function orient(form: ClosedForm, s: Stance): void {
  if (!form.hasElement) {
    s.spring = 1;
    s.side = 1;
    return;
  }
  if (s.contact === 0) s.spring = springOfStick(form, s);
  else if (form.isCarriedWithBase()) s.spring = s.contact;
  else if (s.velocity !== 0) s.spring = Math.sign(s.velocity) as Phase;
  else s.spring = springOfSlip(form, s);
  orientSide(s);
}

/** The sign of d just after s.t: at d = 0 that of ḋ. */
export function orientSide(s: Stance): void {
  s.side = (Math.sign(s.position) || s.spring || 1) as Phase;
}

/** 0 where a stuck body keeps its deflection (both elements hold together), else the sign of ḋ = u̇ − ẏ. */
function springOfStick(form: ClosedForm, s: Stance): Phase {
  if (form.isCarriedWithBase()) return 0;
  if (s.velocity !== 0) return Math.sign(s.velocity) as Phase;
  return (-Math.sign(form.inputs.evaluate(0).baseAcceleration) || 1) as Phase;
}

/** At ḋ = 0 in a slip: 0 where |need| ≤ ρ k |d|, else the side of the force that cannot be held. */
function springOfSlip(form: ClosedForm, s: Stance): Phase {
  s.spring = 0;
  form.take(s);
  form.carried.evaluate(0);
  const { need, room } = form.carried;
  return Math.abs(need) <= room * (1 + heldTolerance) ? 0 : (-Math.sign(need) as Phase);
}
