import type { CompiledTerm, Harmonic } from "./excitation-term.ts";

/** One array for all terms without a harmonic: callers compare arrays by identity. */
export const noHarmonics: readonly Harmonic[] = [];

/** A term that is 0 for ever. Kinds take it and say what differs. */
export const stillTerm: CompiledTerm = {
  nextCorner: () => Infinity,
  addPolynomial: () => {},
  harmonics: () => noHarmonics,
  isConstantFrom: () => true,
  hz: null,
  nature: "transient",
  endlessRate: 0,
  travels: [],
  isAcceleration: false,
};
