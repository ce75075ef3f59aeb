import { restOf, restsByFriction } from "./free-rest.ts";
import type { TextbookCompanion } from "./textbook-companion.ts";

/** n half cycles of π/ω_d; a push at the start adds its first arc. */
export const timeToRest: TextbookCompanion = {
  key: "time-to-rest",
  label: "Time until it rests",
  formula: "n π/(ω √(1 − ζ^2))",
  source: "Free vibration with Coulomb friction, textbook knowledge, from memory",
  dimension: "time",
  conditions: restsByFriction,
  value: (kase) => restOf(kase).t,
  ofRun: ({ result }) => result.quantities.restTime ?? null,
  note: ({ problem }) => (problem.initial.velocity === 0 ? null : "The arc from the push at the start comes before."),
};
