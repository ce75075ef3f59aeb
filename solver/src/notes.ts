import { inputsOf, isPeriodic } from "./quantities/drive.ts";
import { quantityOf } from "./quantities/index.ts";
import type { Reading } from "./quantities/reading.ts";
import type { Note, Outcome } from "./result.ts";
import type { Problem } from "./scenario/problem.ts";
import type { Limit } from "./scenario/scenario.ts";

/** What a reader of the result must know beside its numbers, as plain sentences. */
export function notesOf(reading: Reading, outcome: Outcome | null): Note[] {
  return [
    contactLost(reading),
    dependsOnStart(reading, outcome),
    nextBreakAway(reading, outcome),
    solidSteadyOnly(reading, outcome),
    ...reading.problem.limits.map(oneSided),
  ].filter((note) => note !== null);
}

function contactLost({ problem, motion }: Reading): Note | null {
  const t = firstWithoutContact(problem);
  if (problem.model === "none" || t > motion.end) return null;
  const message = "The pressing force falls to zero: the contact is lost and friction is absent until it returns.";
  return { code: "contact-lost", message, t };
}

/** The first t with N + A cos(2π f t + φ) ≤ 0, Infinity where the contact never goes. */
function firstWithoutContact({ normal, ripple }: Problem): number {
  if (ripple === null) return normal > 0 ? Infinity : 0;
  const { amplitude, hz, phase } = ripple;
  if (Math.abs(amplitude) < normal) return Infinity;
  // In turns: with the sign of A taken into the phase, contact is missing within `half` of half a turn.
  const half = 0.5 - Math.acos(-normal / Math.abs(amplitude)) / (2 * Math.PI);
  const turns = phase / (2 * Math.PI) + (amplitude < 0 ? 0.5 : 0);
  const start = turns - Math.floor(turns);
  if (Math.abs(start - 0.5) <= half) return 0;
  return ((start < 0.5 ? 0.5 : 1.5) - half - start) / hz;
}

/**
 * How near, relative, an input must be to 1/(2n) of the natural frequency to count as being there. Measured on motions
 * without stops: 0.1 % off, two starts are still told apart after 400 cycles; 1 % off, most of it is forgotten by then.
 */
const nearness = 1e-3;

function dependsOnStart({ problem }: Reading, outcome: Outcome | null): Note | null {
  const hasStopped = outcome === "never-moved" || outcome === "came-to-rest" || outcome === "too-short";
  if (hasStopped || !isPeriodic(problem) || !isUndamped(problem)) return null;
  if (problem.law.constant === 0 || problem.normal === 0) {
    const message = "Nothing damps the motion: how it goes on depends on how it starts.";
    return { code: "steady-state-depends-on-start", message };
  }
  const natural = Math.sqrt(problem.stiffness / problem.inertia) / (2 * Math.PI);
  if (!inputsOf(problem).some(({ hz }) => hz !== null && isEvenFraction(hz, natural))) return null;
  const message =
    "Without damping and driven at an even fraction (1/2, 1/4, …) of the natural frequency, many steady motions are " +
    "possible: which one comes about depends on how the run starts.";
  return { code: "steady-state-depends-on-start", message };
}

function isUndamped({ viscous, solid, law, cubic }: Problem): boolean {
  return viscous === 0 && solid.viscous === 0 && solid.proportional === 0 && law.constant !== null && cubic === 0;
}

function isEvenFraction(hz: number, natural: number): boolean {
  const n = Math.round(natural / hz / 2);
  return n >= 1 && Math.abs(2 * n * hz - natural) <= nearness * natural;
}

function nextBreakAway({ motion }: Reading, outcome: Outcome | null): Note | null {
  if (outcome !== "too-short") return null;
  const message = "The body is stuck when the run ends and breaks away later: follow it for longer.";
  return { code: "next-break-away", message, t: motion.nextBreakAway };
}

function solidSteadyOnly({ problem, window }: Reading, outcome: Outcome | null): Note | null {
  const isSteady = window.kind === "periodic" && outcome !== "not-settled" && outcome !== "growing";
  if (problem.solid.viscous === 0 || isSteady) return null;
  const message =
    "Solid damping is taken as a damper with the same loss per cycle at one frequency. That holds for a steady " +
    "swing at this frequency; this run is not steady.";
  return { code: "solid-steady-only", message };
}

function oneSided({ quantity, min, max }: Limit): Note | null {
  const { signed, label } = quantityOf(quantity);
  if (!signed || (min !== undefined && max !== undefined)) return null;
  const [given, missing] = min === undefined ? ["an upper", "a lower"] : ["a lower", "an upper"];
  const message = `${label} can be of either sign and has only ${given} limit. Add ${missing} one if both sides matter.`;
  return { code: "one-sided-limit", message };
}
