import { describe, expect, it } from "vitest";
import { betaQuantile, betaShare, logGamma } from "../../../solver/src/numerics/beta.ts";
import { exactInterval, wilsonInterval } from "../../../solver/src/numerics/binomial-interval.ts";
import { normalQuantile, normalShare } from "../../../solver/src/numerics/normal.ts";
import { deviationOf, percentileOf, rankCorrelation, ranksOf } from "../../../solver/src/numerics/ranks.ts";
import { randomFrom, shuffled } from "../../../solver/src/numerics/random.ts";
import { varianceShare } from "../../../solver/src/numerics/variance-share.ts";

/* Values of SciPy 1.17.1 and NumPy 2.4.6. */

const relative = (value: number, expected: number): number => Math.abs(value / expected - 1);

describe("the normal distribution", () => {
  it.each([
    [0, 0.5],
    [0.3, 0.3820885778110474],
    [1, 0.15865525393145707],
    [2.4999, 0.006211418374944587],
    [2.5, 0.006209665325776132],
    [3, 0.0013498980316300933],
    [6, 9.865876450376946e-10],
    [10, 7.61985302416047e-24],
    [37, 5.7255712225239266e-300],
  ])("has the share of scipy.stats.norm.sf beyond %d", (x, share) => {
    expect(relative(normalShare(-x), share)).toBeLessThan(2e-13);
    expect(normalShare(x)).toBeCloseTo(1 - share, 15);
  });

  it.each([
    [1e-300, -37.0470962993612],
    [1e-20, -9.262340089798409],
    [1e-5, -4.264890793922825],
    [0.025, -1.9599639845400545],
    [0.2, -0.8416212335729142],
    [0.4999, -0.0002506628300880075],
    [0.5, 0],
    [0.975, 1.959963984540054],
    [0.999999, 4.753424308817087],
  ])("has the quantile of scipy.special.ndtri at %d", (share, x) => {
    expect(Math.abs(normalQuantile(share) - x)).toBeLessThan(1e-13 * Math.abs(x) + 1e-15);
  });

  it("has no end", () => {
    expect([normalQuantile(0), normalQuantile(1)]).toEqual([-Infinity, Infinity]);
  });
});

describe("the beta distribution", () => {
  it.each([
    [0.3, 2, 5, 0.579825],
    [0.5, 0.5, 0.5, 0.5],
    [0.99, 300, 4, 0.6404789806604001],
    [0.307, 600, 1400, 0.7538233733176826],
    [1e-6, 1, 1e5, 0.09516262720594036],
  ])("has the share of scipy.special.betainc below %d for %d, %d", (x, a, b, share) => {
    expect(relative(betaShare(x, a, b), share)).toBeLessThan(1e-10);
  });

  it.each([
    [0.025, 3, 98, 0.006229971538306395],
    [0.975, 4, 97, 0.08517605297428002],
    [0.5, 30700, 69300, 0.3069987133287207],
  ])("has the quantile of scipy.special.betaincinv at %d for %d, %d", (share, a, b, x) => {
    expect(relative(betaQuantile(share, a, b), x)).toBeLessThan(1e-11);
  });

  it.each([
    [0.1, 2.252712651734206],
    [1.5, -0.12078223763524526],
    [7.3, 7.147892523022249],
    [600, 3235.8784057241605],
  ])("rests on ln Γ of scipy.special.gammaln at %d", (x, value) => {
    expect(Math.abs(logGamma(x) - value)).toBeLessThan(1e-14 * Math.max(1, value));
  });
});

describe("intervals of a probability", () => {
  it.each([
    [0, 100, 0, 0.03699349820698568, 0, 0.03621669264519054],
    [3, 100, 0.010254524024038925, 0.08451936429052762, 0.006229971538306227, 0.08517605297428028],
    [50, 100, 0.4038315303659956, 0.5961684696340044, 0.39832112950330095, 0.6016788704966991],
    [100, 100, 0.9630065017930143, 1, 0.9637833073548094, 1],
    [30700, 100000, 0.3041486582185244, 0.3098661692429327, 0.3041418295754083, 0.30986936819440936],
  ])("are those of scipy.stats.binomtest for %d of %d", (count, of, low, high, exactLow, exactHigh) => {
    const wilson = wilsonInterval(count, of, 0.95);
    const exact = exactInterval(count, of, 0.95);
    expect(wilson.low).toBeCloseTo(low, 12);
    expect(wilson.high).toBeCloseTo(high, 12);
    expect(exact.low).toBeCloseTo(exactLow, 11);
    expect(exact.high).toBeCloseTo(exactHigh, 11);
  });

  it("are everything where nothing was tried", () => {
    expect(wilsonInterval(0, 0, 0.95)).toEqual({ low: 0, high: 1 });
  });
});

describe("what a sample says", () => {
  const a = [3, 1, 4, 1, 5, 9, 2, 6, 5, 3];
  const b = [2, 7, 1, 8, 2, 8, 1, 8, 2, 8];

  it("are the ranks, rank correlation, deviation and percentiles of SciPy and NumPy", () => {
    expect([...ranksOf(a)]).toEqual([4.5, 1.5, 6, 1.5, 7.5, 10, 3, 9, 7.5, 4.5]);
    expect(rankCorrelation(a, b)).toBeCloseTo(0.13471506281091267, 14);
    expect(deviationOf(a)).toBeCloseTo(2.4698178070456938, 14);
    const sorted = [...a].sort((x, y) => x - y);
    expect([0.025, 0.25, 0.5, 0.9].map((share) => percentileOf(sorted, share))).toEqual([
      1, 2.25, 3.5, 6.299999999999999,
    ]);
  });

  it("is no correlation where nothing varies", () => {
    expect(rankCorrelation([1, 1, 1], [1, 2, 3])).toBeNull();
  });

  it("shares its variance out: y = 3 x₁ + x₂ + x₁ x₂ over the unit square about its middle", () => {
    // Var(x) = 1/12 each about 0: 9/12, 1/12 and 1/144 of 121/144
    const random = randomFrom(7);
    const columns = [0, 1].map(() => Float64Array.from({ length: 20_000 }, () => random() - 0.5));
    const y = columns[0].map((x, i) => 3 * x + columns[1][i] + x * columns[1][i]);
    const shares = columns.map((x) => varianceShare(ranksOf(x), y));
    [108 / 121, 12 / 121].forEach((expected, i) => {
      const share = shares[i];
      expect(share?.value).toBeCloseTo(expected, 2);
      expect(share?.low).toBeLessThan(expected);
      expect(share?.high).toBeGreaterThan(expected);
      expect((share?.high ?? 1) - (share?.low ?? 0)).toBeLessThan(0.05);
    });
    const unrelated = varianceShare(ranksOf(Float64Array.from(y, random)), y);
    expect(unrelated?.value).toBeLessThan(0.01);
    expect(
      varianceShare(
        ranksOf(columns[0]),
        y.map(() => 5),
      ),
    ).toBeNull();
  });
});

describe("random numbers", () => {
  it("are the same for the same seed", () => {
    const [one, again, other] = [3, 3, 4].map((seed) => Array.from({ length: 5 }, randomFrom(seed)));
    expect(again).toEqual(one);
    expect(other).not.toEqual(one);
    for (const value of one) expect(value >= 0 && value < 1).toBe(true);
  });

  it("shuffle without losing any, each order as likely", () => {
    const random = randomFrom(1);
    const counts = new Map<string, number>();
    for (let i = 0; i < 6000; i++) {
      const order = shuffled(3, random).join("");
      counts.set(order, (counts.get(order) ?? 0) + 1);
    }
    expect([...counts.keys()].sort()).toEqual(["012", "021", "102", "120", "201", "210"]);
    // six standard deviations of a count of 1000
    for (const count of counts.values())
      expect(Math.abs(count - 1000)).toBeLessThan(6 * Math.sqrt(6000 * (1 / 6) * (5 / 6)));
  });
});
