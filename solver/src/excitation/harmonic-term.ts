import type { CompiledTerm } from "./excitation-term.ts";
import { stillTerm } from "./still-term.ts";

/** A cos(2π f t + φ) for all t, φ in degrees. */
export function harmonicTerm(amplitude: number, hz: number, phase: number): CompiledTerm {
  const harmonics = [{ amplitude, hz, phase: (phase * Math.PI) / 180, origin: 0 }];
  return {
    ...stillTerm,
    harmonics: () => harmonics,
    isConstantFrom: () => amplitude === 0,
    hz,
    nature: "harmonic",
  };
}
