import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  largest,
  sharesOf,
  valueOf,
  type Joint,
  type Leaf,
  type Network,
} from "../../../web/src/features/reckoning/chain/network.ts";

const leaf = (id: number, value: number): Leaf => ({
  id,
  name: `member ${id}`,
  value,
  measure: { dimension: "stiffness", motion: "linear" },
});
const join = (kind: Joint["join"], ratio: number, ...parts: Network[]): Joint => ({ join: kind, ratio, parts });

describe("a chain worked by hand", () => {
  it("adds compliances in series: 1 / (1/200 + 1/300 + 1/600) = 100", () => {
    const chain = join("series", 1, leaf(1, 200), leaf(2, 300), leaf(3, 600));
    expect(valueOf(chain)).toBeCloseTo(100, 12);
    // 100/200, 100/300, 100/600
    expect(sharesOf(chain).map(({ share }) => share)).toEqual([
      expect.closeTo(1 / 2, 12),
      expect.closeTo(1 / 3, 12),
      expect.closeTo(1 / 6, 12),
    ]);
    expect(largest(sharesOf(chain)).name).toBe("member 1");
  });

  it("adds stiffnesses side by side: 300 + 600, and in series with 900 half of that", () => {
    const pair = join("parallel", 1, leaf(1, 300), leaf(2, 600));
    expect(valueOf(pair)).toBe(900);
    const chain = join("series", 1, pair, leaf(3, 900));
    expect(valueOf(chain)).toBeCloseTo(450, 12);
    // the pair has half, of which 300/900 and 600/900
    expect(sharesOf(chain).map(({ share }) => share)).toEqual([
      expect.closeTo(1 / 6, 12),
      expect.closeTo(1 / 3, 12),
      expect.closeTo(1 / 2, 12),
    ]);
  });

  it("reflects a shaft of 4000 N·m/rad through a lead of 10 mm: (2π/0.01)² · 4000 = 1.579137e9 N/m", () => {
    const shaft = join("series", (2 * Math.PI) / 0.01, leaf(1, 4000));
    expect(valueOf(shaft) / 1.579137e9).toBeCloseTo(1, 6);
    expect(sharesOf(shaft)[0].seen).toBeCloseTo(valueOf(shaft), 3);
  });

  it("multiplies ratios that stand behind each other: gears of 3 behind a lead of 2π mm count 1000² · 3²", () => {
    const behind = join("series", 1000, join("series", 3, leaf(1, 2)));
    expect(valueOf(behind)).toBeCloseTo(18e6, 3);
    expect(sharesOf(behind)[0].seen).toBeCloseTo(18e6, 3);
  });

  it("sums 80 kg and a rotor of 2e-4 kg·m² behind a lead of 10 mm: 80 + 78.9568 kg", () => {
    const sum = join("parallel", 1, leaf(1, 80), join("parallel", (2 * Math.PI) / 0.01, leaf(2, 2e-4)));
    expect(valueOf(sum)).toBeCloseTo(158.9568, 4);
  });
});

const numbers = fc.double({ min: 1e-3, max: 1e3, noNaN: true });
/** Any tree of at most three levels. */
const { network } = fc.letrec<{ network: Network; joint: Joint; leaf: Leaf }>((tie) => ({
  network: fc.oneof({ maxDepth: 3 }, tie("leaf"), tie("joint")),
  leaf: numbers.map((value) => leaf(0, value)),
  joint: fc.record({
    join: fc.constantFrom("series" as const, "parallel" as const),
    ratio: fc.double({ min: 0.1, max: 10, noNaN: true }),
    parts: fc.array(tie("network"), { minLength: 1, maxLength: 4 }),
  }),
}));

/** The same tree with its nth leaf multiplied. */
function scaled(tree: Network, n: number, factor: number): Network {
  let count = 0;
  const visit = (part: Network): Network =>
    "parts" in part
      ? { ...part, parts: part.parts.map(visit) }
      : count++ === n
        ? { ...part, value: part.value * factor }
        : part;
  return visit(tree);
}

describe("any chain", () => {
  it("is softer in series than its softest part and stiffer side by side than its stiffest", () => {
    fc.assert(
      fc.property(fc.array(network, { minLength: 2, maxLength: 5 }), (parts) => {
        const values = parts.map(valueOf);
        expect(valueOf(join("series", 1, ...parts))).toBeLessThan(Math.min(...values));
        expect(valueOf(join("parallel", 1, ...parts))).toBeGreaterThan(Math.max(...values));
      }),
    );
  });

  it("parts the whole among its members", () => {
    fc.assert(
      fc.property(network, (tree) => {
        const total = sharesOf(tree).reduce((sum, { share }) => sum + share, 0);
        expect(total).toBeCloseTo(1, 10);
      }),
    );
  });

  it("rises with a member by that member's share", () => {
    fc.assert(
      fc.property(network, fc.nat(20), (tree, pick) => {
        const shares = sharesOf(tree);
        const n = pick % shares.length;
        const h = 1e-5;
        const slope = Math.log(valueOf(scaled(tree, n, 1 + h)) / valueOf(scaled(tree, n, 1 - h))) / (2 * h);
        expect(Math.abs(slope - shares[n].share)).toBeLessThan(1e-6);
      }),
    );
  });
});
