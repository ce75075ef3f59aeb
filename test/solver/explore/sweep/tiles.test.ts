import {
  mostTileCells,
  quantityNames,
  rowLength,
  tileCells,
  tileCount,
  tileOrder,
  type Continuation,
  type SweepPlan,
} from "@restband/solver";
import { describe, expect, it } from "vitest";

const planOf = (counts: number[], continuation: Continuation = "none"): SweepPlan => ({
  format: "restband-sweep/1",
  axes: counts.map((count, i) => ({ path: `axis${i}`, spacing: "linear", from: 0, to: 1, count })),
  links: {},
  quantities: [],
  continuation,
});
const tilesOf = (plan: SweepPlan) => Array.from({ length: tileCount(plan) }, (_, tile) => tileCells(plan, tile));

describe("the tiles of a sweep", () => {
  it.each<[number[], Continuation]>([
    [[2], "none"],
    [[7], "none"],
    [[250_000], "none"],
    [[1, 1], "none"],
    [[2, 2], "none"],
    [[10, 10], "none"],
    [[100, 100], "none"],
    [[500, 500], "none"],
    [[25_000, 10], "none"],
    [[3, 40_000], "none"],
    [[4096, 30], "both"],
    [[17, 5], "down"],
    [[9], "up"],
  ])("%j, continuation %s: hold every cell once, at most 4,096 each", (counts, continuation) => {
    const tiles = tilesOf(planOf(counts, continuation));
    const all = tiles.flatMap((cells) => [...cells]).sort((a, b) => a - b);
    const total = counts.reduce((product, count) => product * count, 1) * (continuation === "both" ? 2 : 1);
    expect(all).toHaveLength(total);
    expect(all.every((cell, i) => cell === i)).toBe(true);
    expect(Math.max(...tiles.map((cells) => cells.length))).toBeLessThanOrEqual(mostTileCells);
    expect(Math.min(...tiles.map((cells) => cells.length))).toBeGreaterThan(0);
  });

  it("fit a megabyte as base64 with as many quantities as a plan may have", () => {
    for (const sizes of [[500, 500], [250_000], [2000, 100]])
      for (const continuation of sizes[0] > 2500 ? (["none"] as const) : (["none", "up"] as const)) {
        const plan = { ...planOf(sizes, continuation), quantities: quantityNames.slice(0, 29) };
        const cells = Math.max(...tilesOf(plan).map((tile) => tile.length));
        expect(Math.ceil((cells * rowLength(plan) * 8) / 3) * 4).toBeLessThan(1e6);
      }
  });

  it("follow a line down from its last value", () => {
    expect([...tileCells(planOf([4], "both"), 1)]).toEqual([7, 6, 5, 4]);
    expect([...tileCells(planOf([3, 2], "down"), 0)]).toEqual([2, 1, 0]);
  });

  it("come with the boundary first: blocks in which the coarse look differs", () => {
    const plan = planOf([80, 80]);
    const coarse = tileCells(plan, 0);
    const rows = new Float64Array(coarse.length * rowLength(plan));
    // one outcome left of column 35, another from there on
    coarse.forEach((cell, i) => (rows[i * rowLength(plan)] = cell % 80 < 35 ? 1 : 4));
    const order = tileOrder(plan, rows);
    expect([...order].sort((a, b) => a - b)).toEqual(order.map((_, i) => i));
    expect(order[0]).toBe(0);
    const columns = order.slice(1).map((tile) => [...tileCells(plan, tile)].map((cell) => cell % 80));
    const holdsBoundary = columns.map((each) => Math.min(...each) < 35 && Math.max(...each) >= 34);
    const firstOther = holdsBoundary.indexOf(false);
    expect(firstOther).toBeGreaterThan(0);
    // every block across the boundary stands among the first
    expect(columns.slice(16).every((each) => Math.max(...each) < 34 || Math.min(...each) >= 35)).toBe(true);
    expect(tileOrder(plan, null)).toEqual(order.map((_, i) => i));
  });
});
