import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import type { Result } from "@restband/solver";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { plainScenario } from "../scenario/plain-scenario.ts";
import { solve } from "./run-solve.ts";

/**
 * 2 kg on 800 N/m with friction forces 4 and 8 N, let go at 23.5 mm: the friction band is 5 and 10 mm wide, each half
 * cycle loses 2 · 5 mm, and it stops at the second turn, at 3.5 mm, after one period of 2π/20 s.
 */
const ringDown = plainScenario({ initial: { displacement: 0.0235 }, span: { seconds: 10 } });

let folder: string;
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "solve-"));
});
afterAll(() => rmSync(folder, { recursive: true }));

const fileOf = (text: string) => {
  const file = join(folder, "scenario.json");
  writeFileSync(file, text);
  return file;
};

describe("solve FILE", { timeout: 60_000 }, () => {
  it("prints one result with samples", async () => {
    const { status, lines, err } = await solve([fileOf(JSON.stringify(ringDown))]);
    expect([status, err, lines.length]).toEqual([0, "", 1]);
    const result = lines[0] as Result;
    expect(result.format).toBe("restband-result/1");
    expect(result.ended).toBe("rest");
    expect(result.quantities.restTime).toBeCloseTo(Math.PI / 10, 12);
    expect(result.quantities.restDisplacement).toBeCloseTo(0.0035, 12);
    expect(result.samples?.t.length).toBeGreaterThanOrEqual(2001);
  });

  it("prints less where asked", async () => {
    const options = ["--no-samples", "--no-events", "--quantities", "restTime,halfCycles", "--at", "0,0.1"];
    const { status, lines } = await solve([fileOf(JSON.stringify(ringDown)), ...options]);
    const result = lines[0] as Result;
    expect(status).toBe(0);
    expect([result.samples, result.events]).toEqual([null, []]);
    expect(Object.keys(result.quantities)).toEqual(["restTime", "halfCycles"]);
    expect(result.at?.t).toEqual([0, 0.1]);
    // x = xk + (x0 − xk) cos ωt on the first swing.
    expect(result.at?.x[1]).toBeCloseTo(0.005 + 0.0185 * Math.cos(2), 12);
  });

  it("takes a number of samples", async () => {
    const { lines } = await solve([fileOf(JSON.stringify(ringDown)), "--samples", "11"]);
    expect((lines[0] as Result).samples?.t.length).toBeLessThan(20);
  });

  it("names every faulty field of a refused scenario on standard error", async () => {
    const refused = plainScenario({ body: { inertia: 0, stiffness: -1 } });
    const { status, out, err } = await solve([fileOf(JSON.stringify(refused))]);
    expect([status, out]).toEqual([1, ""]);
    expect(err).toContain("body.inertia: Mass must be more than 0; it is 0.");
    expect(err).toContain("body.stiffness: ");
  });

  it("refuses a method that cannot compute it, and what is no JSON", async () => {
    const stiffening = { ...ringDown, body: { inertia: 1, stiffness: 100, cubic: 1e6 } };
    const refused = await solve([fileOf(JSON.stringify(stiffening)), "--method", "exact"]);
    expect(refused).toMatchObject({ status: 1, out: "" });
    expect(refused.err).toContain("body.cubic");
    const noJson = await solve([fileOf("{")]);
    expect(noJson).toMatchObject({ status: 1, out: "" });
    expect(noJson.err).toMatch(/^This is no JSON/);
  });

  it("writes a Python file that recomputes the result, or says why there is none", async () => {
    const { status, out } = await solve(["python", fileOf(JSON.stringify(ringDown))]);
    expect(status).toBe(0);
    expect(out).toMatch(/^#!\/usr\/bin\/env python3\n/u);
    expect(out).toContain('"restDisplacement": 0.003');
    const cutOff = { ...ringDown, span: { seconds: 10, maxEvents: 1 } };
    const refused = await solve(["python", fileOf(JSON.stringify(cutOff))]);
    expect([refused.status, refused.out]).toEqual([1, ""]);
    expect(refused.err).toContain("cut off");
  });

  it("explains bad usage", async () => {
    for (const args of [[], ["--lines", "x.json"], ["--colour"], [join(folder, "none.json")]]) {
      const { status, out, err } = await solve(args);
      expect([status, out]).toEqual([2, ""]);
      expect(err).toContain("npm run --silent solve -- FILE");
    }
  });
});

describe("solve --lines", { timeout: 60_000 }, () => {
  it("answers line by line, a bad line in its place", async () => {
    const input = [
      `\uFEFF${JSON.stringify(ringDown)}`,
      `${JSON.stringify(plainScenario({ body: { inertia: -1, stiffness: 1 }, colour: 1 }))}\r`,
      "{not json",
      "",
      JSON.stringify({ ...ringDown, title: "two\u2028lines", at: [0.1, 0] }),
      JSON.stringify({ ...ringDown, at: [11, -1, "x"] }),
      JSON.stringify({ ...ringDown, at: Array(10_001).fill(0) }),
      JSON.stringify(ringDown),
    ].join("\n");
    const { status, lines, err } = await solve(["--lines"], input);
    expect(status).toBe(1);
    expect(lines).toHaveLength(8);
    expect(lines[0]).toMatchObject({ ended: "rest", samples: null });
    expect(lines[1]).toMatchObject({
      error: { path: "body.inertia", faults: [{ path: "body.inertia" }, { path: "colour" }] },
    });
    expect(lines[2]).toMatchObject({ error: { path: "", faults: [{ path: "" }] } });
    expect(lines[3]).toMatchObject({ error: { path: "" } });
    expect(lines[4]).toMatchObject({ at: { t: [0.1, 0] } });
    expect(lines[5]).toMatchObject({ error: { faults: [{ path: "at[0]" }, { path: "at[1]" }, { path: "at[2]" }] } });
    expect(lines[6]).toMatchObject({ error: { path: "at" } });
    expect(lines[7]).toEqual(lines[0]);
    expect(err).toContain("line 2: body.inertia: ");
  });

  it("answers thousands of lines in order, with status 0", async () => {
    const input = Array.from({ length: 3000 }, (_, i) =>
      JSON.stringify({ ...ringDown, initial: { displacement: i * 1e-6 } }),
    );
    const { status, lines, err } = await solve(
      ["--lines", "--no-events", "--quantities", "peakDisplacement"],
      input.join("\n"),
    );
    expect([status, err, lines.length]).toEqual([0, "", 3000]);
    lines.forEach((line, i) => expect((line as Result).quantities.peakDisplacement).toBeCloseTo(i * 1e-6, 15));
  });

  it("needs no line at all", async () => {
    expect(await solve(["--lines"])).toMatchObject({ status: 0, out: "", err: "" });
  });
});

describe("solve --lines with cells", { timeout: 60_000 }, () => {
  const header = {
    format: "restband-cells/1",
    base: ringDown,
    fields: ["initial.displacement", "contact.law.kinetic"],
    quantities: ["restTime", "restDisplacement"],
    links: { "contact.law.static": { of: "contact.law.kinetic", factor: 2 } },
  };

  it("answers a cell a line, refused ones with the reason last", async () => {
    const cells = [[7, 0.0235, 0.1], [8, 0.009, 0.1], [9, 0.1, -1], [10, 0.1], ["x"]];
    const input = [header, ...cells].map((line) => JSON.stringify(line)).join("\n");
    const { status, lines } = await solve(["--lines"], input);
    expect(status).toBe(0);
    const [first, second, refused, short, garbled] = lines as unknown[][];
    expect(first.slice(0, 2)).toEqual([7, "came-to-rest"]);
    expect(first[2]).toBeCloseTo(Math.PI / 10, 12);
    expect(first[3]).toBeCloseTo(0.0035, 12);
    // Held by μs N = 8 N, linked: 800 N/m · 9 mm is less.
    expect(second).toEqual([8, "never-moved", 0, 0.009]);
    expect(refused).toEqual([9, null, null, null, expect.stringContaining("must be 0 or more")]);
    expect(short.slice(0, 4)).toEqual([10, null, null, null]);
    expect(garbled.at(-1)).toBe("A cell is [index, initial.displacement, contact.law.kinetic], all numbers.");
  });

  it("refuses a header by its fields", async () => {
    const wrong = { ...header, fields: ["body.mass"], quantities: ["speed"], links: { "body.inertia": { of: "x" } } };
    const { status, lines } = await solve(["--lines"], JSON.stringify(wrong));
    expect(status).toBe(1);
    expect(lines[0]).toMatchObject({
      error: { faults: [{ path: "fields[0]" }, { path: "quantities[0]" }, { path: "links.body.inertia" }] },
    });
    const faultyBase = { ...header, base: { ...ringDown, motion: "circular" } };
    const refused = await solve(["--lines"], JSON.stringify(faultyBase));
    expect(refused.lines[0]).toMatchObject({ error: { path: "base.motion" } });
  });
});
