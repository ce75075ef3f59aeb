import type { Phase } from "../result.ts";
import type { Form } from "./form.ts";
import type { Stance } from "./stance.ts";
import { heldTolerance } from "./watch.ts";

/**
 * The second set-valued element, S = ρ k |d| sgn(ḋ) of displacement-proportional damping: chooses the quadrant (signs of ḋ
 * and d just after s.t), or the lock at ḋ = 0. The inputs are located at s.t. Without the element both signs read 1.
 */
export function orient(form: Form, s: Stance): void {
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
function springOfStick(form: Form, s: Stance): Phase {
  if (form.isCarriedWithBase()) return 0;
  if (s.velocity !== 0) return Math.sign(s.velocity) as Phase;
  return (-Math.sign(form.inputs.evaluate(0).baseAcceleration) || s.spring || 1) as Phase;
}

/** At ḋ = 0 in a slip: 0 where |need| ≤ ρ k |d|, else the side of the force that cannot be held. */
function springOfSlip(form: Form, s: Stance): Phase {
  s.spring = 0;
  form.take(s);
  form.carried.evaluate(0);
  const { need, room } = form.carried;
  return Math.abs(need) <= room * (1 + heldTolerance) ? 0 : (-Math.sign(need) as Phase);
}

/**
 * Judges the instant at which v_r and ḋ are both 0 though u̇ = ẏ does not last: the acceleration a solves
 * m a ∈ F + W − k d − ρk|d| Sgn(a − ÿ) − friction Sgn(a − ü), which is monotone in a and so has one solution: stuck
 * (a = ü), locked to the base (a = ÿ), or a slip of both with the signs that its own a confirms. Sets `contact` and `spring`.
 */
export function chooseBoth(form: Form, s: Stance): void {
  const { inertia, stiffness } = form.problem;
  const v = form.inputs.evaluate(0);
  const carrier = form.contactCarrier === "base" ? v.baseAcceleration : 0;
  const free = v.force - stiffness * s.position - form.problem.cubic * s.position ** 3;
  const element = form.elementSlope * Math.abs(s.position);
  const slide = form.slide * v.normal;
  const grip = form.grip * v.normal;
  const ahead = Math.sign(carrier - v.baseAcceleration) || s.spring || 1;
  const isWithin = (force: number, room: number): boolean => room > 0 && Math.abs(force) <= room * (1 + heldTolerance);
  if (isWithin(inertia * carrier - free + ahead * element, grip)) {
    s.contact = 0;
    s.spring = ahead as Phase;
  } else if (isWithin(inertia * v.baseAcceleration - free - ahead * slide, element)) {
    s.contact = -ahead as Phase;
    s.spring = 0;
  } else {
    const middle = Math.max(carrier, v.baseAcceleration);
    const above = free - slide - element > inertia * middle;
    const below = free + slide + element < inertia * Math.min(carrier, v.baseAcceleration);
    s.contact = (above ? 1 : below ? -1 : -ahead) as Phase;
    s.spring = (above ? 1 : below ? -1 : ahead) as Phase;
  }
  orientSide(s);
}
