import { restOf, restsByFriction } from "./free-rest.ts";
import type { TextbookCompanion } from "./textbook-companion.ts";

/** Where the body stays, from the friction-free equilibrium, signed. */
export const restPosition: TextbookCompanion = {
  key: "rest-position",
  label: "Rests off the equilibrium by",
  formula: "x_n = B x_{n−1} − (1 + B) F_k/k",
  source: "Exact between turning points, textbook knowledge, from memory",
  dimension: "displacement",
  conditions: restsByFriction,
  value: (kase) => restOf(kase).offset,
  ofRun: ({ result }) => result.quantities.restOffset ?? null,
  note: ({ damping }) =>
    damping > 0 ? "B = exp(−π ζ/√(1 − ζ^2)); sides alternate." : "B = 1 without damping; sides alternate.",
};
