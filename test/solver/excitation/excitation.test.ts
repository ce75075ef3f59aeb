import { describe, expect, it } from "vitest";
import type { CompiledTerm } from "../../../solver/src/excitation/excitation-term.ts";
import { compileTerm, cornersOf, readAbout } from "./evaluate.ts";
import { formulas } from "./formulas.ts";

const instants = Array.from({ length: 401 }, (_, i) => -0.2 + i * 0.0061);
const named = formulas.map((formula) => ({ name: JSON.stringify(formula.term).slice(0, 70), ...formula }));

describe.each(named)("$name", ({ term, value, jumps = [], hasSmoothSpeed }) => {
  const compiled = compileTerm(term);
  const scale = Math.max(...instants.map((t) => Math.abs(value(t))));

  it("equals the formula of the format at many instants", () => {
    for (const t of instants)
      expect(Math.abs(readAbout(compiled, t).value - value(t))).toBeLessThanOrEqual(1e-12 * scale);
  });

  it("holds what is read about an instant up to the next corner", () => {
    for (const t of instants) {
      const reach = Math.min(compiled.nextCorner(t) - t, 0.3);
      for (const share of [0.25, 0.5, 0.999]) {
        const read = readAbout(compiled, t, share * reach).value;
        expect(Math.abs(read - value(t + share * reach))).toBeLessThanOrEqual(1e-11 * scale);
      }
    }
  });

  it("is continuous at its corners, but where the format makes it jump", () => {
    for (const corner of cornersOf(compiled, -1, 3)) {
      const before = leftOf(compiled, corner);
      const after = readAbout(compiled, corner);
      const isJump = jumps.some((jump) => Math.abs(jump - corner) < 1e-12);
      if (isJump) continue;
      expect(Math.abs(after.value - before.value)).toBeLessThanOrEqual(1e-12 * scale);
      if (hasSmoothSpeed) expect(Math.abs(after.speed - before.speed)).toBeLessThanOrEqual(1e-12);
    }
  });

  it("takes the new value exactly at each jump", () => {
    for (const jump of jumps) {
      const expected = value(jump);
      expect(Math.abs(readAbout(compiled, jump).value - expected)).toBeLessThanOrEqual(1e-12 * scale);
      expect(cornersOf(compiled, -1, 3)).toContain(jump);
    }
  });

  it("says truly from when on it never changes", () => {
    for (const t of instants.filter((each) => compiled.isConstantFrom(each))) {
      const still = readAbout(compiled, t).value;
      for (const later of [0.01, 1, 50]) expect(readAbout(compiled, t + later).value).toBe(still);
    }
  });

  it("answers alike whatever was asked before", () => {
    const fresh = compileTerm(term);
    for (const t of [...instants].reverse()) {
      expect(readAbout(compiled, t)).toEqual(readAbout(fresh, t));
      expect(compiled.nextCorner(t)).toBe(fresh.nextCorner(t));
      expect(compiled.nextCorner(t)).toBeGreaterThan(t);
      expect(compiled.harmonics(t)).toBe(compiled.harmonics(t));
    }
  });
});

/** Value and speed just before a corner, read about an instant in the piece that ends there. */
function leftOf(compiled: CompiledTerm, corner: number) {
  const earlier = cornersOf(compiled, -1, corner).at(-2) ?? -1;
  const t = (earlier + corner) / 2;
  return readAbout(compiled, t, corner - t);
}
