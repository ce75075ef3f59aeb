import type { EventKind, Outcome, Phase, Scenario } from "@restband/solver";
import { readBody, slipSide, type JudgedBody } from "./judge/body.ts";
import { readInputs, type Inputs, type Stretch } from "./judge/inputs.ts";
import { judgeOutcome } from "./judge/outcome.ts";
import { meetCorner, step, type JudgedState } from "./judge/step.ts";

export interface JudgedEvent {
  t: number;
  kind: Exclude<EventKind, "start" | "end">;
  x: number;
  v: number;
}

/** The whole run at every step (t, x, v, phase after the step), and its events without `start` and `end`. */
export interface JudgedRun {
  t: number[];
  x: number[];
  v: number[];
  phase: Phase[];
  events: JudgedEvent[];
  outcome: Outcome;
}

/**
 * A second opinion on a scenario: steps of fixed length over the whole span, friction as a set-valued force projected step by
 * step, written from the equation and the scenario format alone and sharing nothing with the solver. It runs on after a rest
 * (nothing moves there). Smooth motion converges with h², a motion with events with h.
 * Laws none and coulomb, no cubic spring, no chirp; throws on others.
 * @param h step, s; steps end at the corners of the inputs and at `at`, and are shortened to fit between them
 * @param at times (s) that must be ends of steps, rising
 */
export function judge(scenario: Scenario, h: number, at: readonly number[] = []): JudgedRun {
  const body = readBody(scenario);
  const inputs = readInputs(scenario);
  const run: JudgedRun = { t: [], x: [], v: [], phase: [], events: [], outcome: "smooth-sliding" };
  const { isAtRest, ...state } = start(scenario, body, inputs.stretchFrom(0));
  if (isAtRest && state.phase !== 0) note(run, state, "break-away");
  keep(run, state);
  for (const knot of knotsOf(scenario, inputs, at)) {
    cross(run, state, body, inputs, knot, h);
  }
  run.outcome = judgeOutcome(scenario, run, inputs, body);
  return run;
}

function start({ initial }: Scenario, body: JudgedBody, stretch: Stretch): JudgedState & { isAtRest: boolean } {
  const { displacement: x, velocity: v } = initial;
  const faceRate = stretch.face.rate(0);
  const isAtRest = Math.abs(v - faceRate) <= 1e-12 * Math.max(Math.abs(v), Math.abs(faceRate));
  const phase = isAtRest ? slipSide(body, stretch, 0, x) : v > faceRate ? 1 : -1;
  return { t: 0, x, v: isAtRest ? faceRate : v, phase, isAtRest };
}

function knotsOf({ span }: Scenario, { corners }: Inputs, at: readonly number[]): number[] {
  const knots = [...corners, ...at, span.seconds].filter((t) => t > 0 && t <= span.seconds);
  return [...new Set(knots)].sort((a, b) => a - b);
}

/** From the state to the knot in steps of about h, then over the corner that may lie there. */
function cross(run: JudgedRun, state: JudgedState, body: JudgedBody, inputs: Inputs, knot: number, h: number): void {
  const stretch = inputs.stretchFrom(state.t);
  const from = state.t;
  const count = Math.max(1, Math.ceil((knot - from) / h - 1e-6));
  for (let i = 1; i <= count; i++) {
    const met = step(state, body, stretch, i === count ? knot : from + ((knot - from) * i) / count);
    if (met) note(run, state, met);
    keep(run, state);
  }
  if (!inputs.corners.includes(knot)) return;
  const met = meetCorner(state, body, stretch, inputs.stretchFrom(knot), inputs.jumpFloor);
  if (met) note(run, state, met);
  run.phase[run.phase.length - 1] = state.phase;
}

function keep(run: JudgedRun, { t, x, v, phase }: JudgedState): void {
  run.t.push(t);
  run.x.push(x);
  run.v.push(v);
  run.phase.push(phase);
}

function note(run: JudgedRun, { t, x, v }: JudgedState, kind: JudgedEvent["kind"]): void {
  run.events.push({ t, kind, x, v });
}
