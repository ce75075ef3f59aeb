import type { Scenario } from "@restband/solver";

/**
 * The scenario a new one starts from: a slide pushed by a feed drive. Its numbers are assumptions of ordinary size to be
 * replaced, none of them advice, and marked as assumed.
 *
 * @param taken titles already in the project; the new one gets the next free number
 */
export function newScenario(taken: readonly string[]): Scenario {
  return {
    format: "restband-scenario/1",
    title: freeTitle("New scenario", taken),
    purpose: "feed",
    motion: "linear",
    body: { inertia: 100, stiffness: 2e6, cubic: 0, viscous: 500 },
    solid: { model: "none" },
    contact: {
      law: { model: "coulomb", static: 0.15, kinetic: 0.12 },
      normal: { preload: 0, faces: 1, weight: true, ripple: null },
      radius: 1,
      counterface: "ground",
    },
    incline: 0,
    force: [],
    base: [{ kind: "ramp", rate: 0.002, start: 0, stop: "none" }],
    initial: { displacement: 0, velocity: 0 },
    span: { seconds: 2, untilRest: true, maxEvents: 200_000, maxWork: 2e7 },
    settleBand: null,
    limits: [{ quantity: "stickFraction", max: 0 }],
    origins: {
      "contact.law.static": { kind: "assumed" },
      "contact.law.kinetic": { kind: "assumed" },
    },
  };
}

/** A title that is not taken yet: itself, or with the next free number. */
export function freeTitle(stem: string, taken: readonly string[]): string {
  const names = new Set(taken);
  for (let n = 1; ; n++) {
    const title = n === 1 ? stem : `${stem} ${n}`;
    if (!names.has(title)) return title;
  }
}
