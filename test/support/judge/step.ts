import type { EventKind, Phase } from "@restband/solver";
import { slipSide, type JudgedBody } from "./body.ts";
import { forceOn, type Stretch } from "./inputs.ts";

export interface JudgedState {
  t: number;
  x: number;
  v: number;
  phase: Phase;
}

/** What a step met: an event at its end, or nothing. */
type Met = Exclude<EventKind, "start" | "end"> | null;

/**
 * Carries the state over one step to `end`, within which the inputs are smooth. The midpoint rule for the smooth forces,
 * the set-valued ones by projection: the velocity at the end is the one for which the force lies in its set. Whether a body
 * whose sliding velocity would pass zero stops or turns is decided by the force that would hold it there, at `end`.
 */
export function step(state: JudgedState, body: JudgedBody, stretch: Stretch, end: number): Met {
  return state.phase === 0 ? ride(state, body, stretch, end) : slip(state, body, stretch, end);
}

/** The stuck body moves with its counterface; it breaks away at the end of the step in which it can no longer be held. */
function ride(state: JudgedState, body: JudgedBody, stretch: Stretch, end: number): Met {
  moveTo(state, end, state.x + stretch.face.at(end) - stretch.face.at(state.t), stretch.face.rate(end));
  state.phase = slipSide(body, stretch, end, state.x);
  return state.phase === 0 ? null : "break-away";
}

function slip(state: JudgedState, body: JudgedBody, stretch: Stretch, end: number): Met {
  const h = end - state.t;
  const sliding = body.sliding(state.t + h / 2);
  const faceRate = stretch.face.rate(end);
  const free = endVelocity(state, body, stretch, h, -state.phase * sliding);
  if (state.phase * (free - faceRate) > 0) return slipOn(state, end, free, state.phase, null);
  const side = slipSide(body, stretch, end, state.x + (h / 2) * (state.v + faceRate));
  if (side === 0) return slipOn(state, end, faceRate, 0, "stop");
  // A turn: the force is −sgn v_r μk N r on either side of it, weighed by the shares of the step.
  const before = state.v - stretch.face.rate(state.t);
  const share = before / (before - (free - faceRate));
  const mean = -sliding * (state.phase * share + side * (1 - share));
  const reversed = endVelocity(state, body, stretch, h, mean);
  const isPast = side * (reversed - faceRate) > 0;
  return slipOn(state, end, isPast ? reversed : faceRate, side, side === state.phase ? null : "turn");
}

function slipOn(state: JudgedState, end: number, v: number, phase: Phase, met: Met): Met {
  moveTo(state, end, state.x + ((end - state.t) / 2) * (state.v + v), v);
  state.phase = phase;
  return met;
}

function moveTo(state: JudgedState, t: number, x: number, v: number): void {
  state.t = t;
  state.x = x;
  state.v = v;
}

/** ẋ at the end of a step of h with contact force f: midpoint rule, the displacement-proportional force projected onto its set. */
function endVelocity({ t, x, v }: JudgedState, body: JudgedBody, stretch: Stretch, h: number, f: number): number {
  const { inertia, stiffness, damping, proportional } = body;
  const { base } = stretch;
  const middle = t + h / 2;
  const given = inertia / h + damping / 2 + (stiffness * h) / 4;
  const known =
    (inertia / h) * v +
    forceOn(stretch, middle) +
    f -
    damping * (v / 2 - base.rate(middle)) -
    stiffness * (x + (h / 4) * v - base.at(middle));
  if (proportional === 0) return known / given;
  const solid = proportional * stiffness * Math.abs(x + (h / 2) * v - base.at(middle));
  const baseRate = base.rate(t + h);
  const forward = (known - solid) / given;
  if (forward > baseRate) return forward;
  const back = (known + solid) / given;
  return back < baseRate ? back : baseRate;
}

/**
 * What happens where one stretch of inputs meets the next: a jump of the counterface's velocity breaks a stick or turns a
 * slip at once, and a stuck body is looked at again with the new forces.
 */
export function meetCorner(state: JudgedState, body: JudgedBody, before: Stretch, after: Stretch, floor: number): Met {
  const was = state.phase;
  const jumped = Math.abs(after.face.rate(state.t) - before.face.rate(state.t)) > floor;
  const relative = state.v - after.face.rate(state.t);
  if (jumped && Math.abs(relative) > floor) {
    state.phase = relative > 0 ? 1 : -1;
    if (was === 0) return "break-away";
    return state.phase === was ? null : "turn";
  }
  if (was !== 0 && !jumped) return null;
  state.phase = slipSide(body, after, state.t, state.x);
  if (was === 0) return state.phase === 0 ? null : "break-away";
  if (state.phase === 0) return "stop";
  return state.phase === was ? null : "turn";
}
