import { restsByFriction } from "./free-rest.ts";
import { freeSwings } from "./free-swings.ts";
import type { TextbookCompanion } from "./textbook-companion.ts";

/** Half cycles until the first turning point within the rest band; ⌈(x_0 − x_s)/2x_k⌉ from a release at rest, undamped. */
export const halfCyclesToRest: TextbookCompanion = {
  key: "half-cycles-to-rest",
  label: "Half cycles until it rests",
  formula: "first n with x_n ≤ F_s/k",
  source: "Free vibration with Coulomb friction, textbook knowledge, from memory",
  dimension: "none",
  conditions: restsByFriction,
  value: (kase) => freeSwings(kase).length - (kase.problem.initial.velocity === 0 ? 1 : 0),
  ofRun: ({ result }) => result.quantities.halfCycles ?? null,
  note: ({ damping, staticForce, kineticForce }) =>
    damping === 0 && staticForce === kineticForce
      ? "Undamped and released at rest this is x_0 k/(2 F_k) − 1/2, rounded up."
      : null,
};
