import { termOf } from "../excitation/index.ts";
import type { CompiledTerm, Harmonic } from "../excitation/excitation-term.ts";
import { lawOf } from "../friction/index.ts";
import { solidOf } from "../solid/index.ts";
import { cosDegrees, sinDegrees } from "./degrees.ts";
import { driveHz } from "./drive-hz.ts";
import type { Problem } from "./problem.ts";
import type { Contact, Records, Scenario, Term } from "./scenario.ts";

/** Standard gravity, m/s². */
export const gravity = 9.80665;

/**
 * A checked scenario as the plain numbers a run reads: SI, angles in rad, W = −m g sin θ, N = faces × preload + weight
 * share. @param records points of the records the scenario names by digest; throws RangeError where one is not among them.
 */
export function compileProblem(scenario: Scenario, records?: Records): Problem {
  const { body, contact, incline, span } = scenario;
  const isLinear = scenario.motion === "linear";
  const { counterface } = contact;
  const base = scenario.base.map((term) => compileTerm(term, records));
  return {
    isLinear,
    inertia: body.inertia,
    stiffness: body.stiffness,
    cubic: body.cubic,
    viscous: body.viscous,
    solid: solidOf(scenario.solid.model).compile(scenario.solid, { ...body, driveHz: driveHz(scenario) }),
    law: lawOf(contact.law.model).compile(contact.law),
    model: contact.law.model,
    normal: normalForce(scenario),
    ripple: rippleOf(contact),
    radius: contact.radius,
    counterface: typeof counterface === "object" ? "belt" : counterface,
    beltVelocity: typeof counterface === "object" ? counterface.velocity : 0,
    // 0 − keeps a level body from weighing −0.
    weight: isLinear ? 0 - body.inertia * gravity * sinDegrees(incline) : 0,
    force: scenario.force.map((term) => compileTerm(term, records)),
    base,
    isRelative: base.some((term) => term.isAcceleration),
    initial: scenario.initial,
    seconds: span.seconds,
    untilRest: span.untilRest,
    maxEvents: span.maxEvents,
    maxWork: span.maxWork,
    settleBand: scenario.settleBand,
    limits: scenario.limits,
  };
}

/** N without ripple, N: faces × preload, and m g cos θ where the weight presses too. */
export function normalForce({ contact, body, incline }: Scenario): number {
  const { preload, faces, weight } = contact.normal;
  return faces * preload + (weight ? body.inertia * gravity * cosDegrees(incline) : 0);
}

function rippleOf({ normal: { ripple } }: Contact): Harmonic | null {
  if (ripple === null || ripple.amplitude === 0) return null;
  return { amplitude: ripple.amplitude, hz: ripple.hz, phase: (ripple.phase * Math.PI) / 180, origin: 0 };
}

function compileTerm(term: Term, records: Records | undefined): CompiledTerm {
  if ("digest" in term) return termOf(term.kind).compile(term, records?.get(term.digest));
  return termOf(term.kind).compile(term, "times" in term ? term : undefined);
}
