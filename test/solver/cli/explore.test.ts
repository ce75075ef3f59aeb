import { execFile } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { promisify } from "node:util";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { solve } from "./run-solve.ts";

/** 2 kg on 800 N/m, released; x_b = μs N/k = 0.2 N/800. */
const scenario = {
  format: "restband-scenario/1",
  motion: "linear",
  body: { inertia: 2, stiffness: 800 },
  contact: { law: { model: "coulomb", static: 0.2, kinetic: 0.15 }, normal: { preload: 10 } },
  initial: { displacement: 0.02, velocity: 0 },
  span: { seconds: 20 },
  limits: [{ quantity: "restBand", max: 0.0025 }],
};
const plan = {
  format: "restband-sweep/1",
  axes: [
    { path: "body.stiffness", spacing: "linear", from: 400, to: 1200, count: 20 },
    { path: "contact.law.kinetic", spacing: "linear", from: 0.1, to: 0.3, count: 5 },
  ],
  links: {},
  quantities: ["restDisplacement", "halfCycles"],
};

let folder: string;
const file = (name: string) => join(folder, name);
const write = (name: string, content: unknown): string => {
  writeFileSync(file(name), typeof content === "string" ? content : JSON.stringify(content));
  return file(name);
};

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "restband-explore-"));
  write("scenario.json", scenario);
  write("plan.json", plan);
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe("solve sweep", { timeout: 120_000 }, () => {
  const args = (...more: string[]) => ["sweep", file("plan.json"), file("scenario.json"), ...more];

  it("answers every cell, refused ones with their reason", async () => {
    const { status, lines } = await solve(args());
    expect(status).toBe(0);
    const [header, ...cells] = lines as [Record<string, unknown>, ...unknown[][]];
    expect(header).toMatchObject({
      format: "restband-cells/1",
      fields: ["body.stiffness", "contact.law.kinetic"],
      quantities: ["restBand", "restDisplacement", "halfCycles"],
    });
    expect(cells.map(([index]) => index)).toEqual(Array.from({ length: 100 }, (_, i) => i));
    expect(cells[0].slice(0, 3)).toEqual([0, "came-to-rest", 0.005]);
    // the last row has kinetic friction 0.3, above the static 0.2
    expect(cells[99]).toEqual([
      99,
      null,
      null,
      null,
      null,
      expect.stringContaining("Static friction cannot be smaller"),
    ]);
  });

  it("is solved elsewhere, in parts, by the same lines as a cluster's array job", { timeout: 180_000 }, async () => {
    const cells = await solve(args("--cells"));
    write("sweep.cells", cells.out);
    const solveCells = "npm run --silent solve -- --lines";
    const command = `{ head -n 1 sweep.cells; parallel --will-cite --pipe --header 1 -k -N 30 -j 2 '${solveCells}' < sweep.cells; } > sweep.answers`;
    const inFolder = command.replaceAll("sweep.", `${folder}/sweep.`);
    await promisify(execFile)("sh", ["-c", inFolder], { cwd: new URL("../../..", import.meta.url) });
    expect(readFileSync(file("sweep.answers"), "utf8")).toBe((await solve(args())).out);
    const checked = await solve(args("--check", file("sweep.answers")));
    expect([checked.status, checked.out]).toEqual([0, "100 cells, all answered; 20 run again here, all agree.\n"]);
  });

  it("refuses answers that are not its own, not whole, or not right", async () => {
    const { out } = await solve(args());
    const [header, ...rest] = out.trimEnd().split("\n");
    const check = async (answers: string) => (await solve(args("--check", write("other.answers", answers)))).err;
    expect(await check([header, ...rest.slice(1)].join("\n"))).toMatch(/Cell 0 has no answer\./);
    expect(await check([header, ...rest, rest[3]].join("\n"))).toMatch(/line 102: Cell 3 is answered already/);
    const others = rest.map((line) => line.replace("came-to-rest", "stick-slip"));
    expect(await check([header, ...others].join("\n"))).toMatch(/comes out otherwise here: its outcome/);
    const otherPlan = write("other.json", { ...plan, quantities: [] });
    const foreign = await solve(["sweep", otherPlan, file("scenario.json"), "--check", write("own.answers", out)]);
    expect(foreign.status).toBe(1);
    expect(foreign.err).toMatch(/line 1: These answers are of another sweep/);
  });

  it("refuses a plan by its fields", async () => {
    const axes = [{ ...plan.axes[0], to: 1 }];
    const refused = await solve(["sweep", write("reversed.json", { ...plan, axes }), file("scenario.json")]);
    expect([refused.status, refused.out]).toEqual([1, ""]);
    expect(refused.err).toMatch(/reversed\.json: axes\[0\]\.to: The range is reversed/);
    const followed = write("followed.json", { ...plan, continuation: "up" });
    expect((await solve(["sweep", followed, file("scenario.json"), "--cells"])).err).toMatch(/cannot be solved apart/);
  });
});

describe("solve search and solve study", { timeout: 120_000 }, () => {
  it("tell the threshold of a limit", async () => {
    const question = { path: "body.stiffness", low: 100, high: 2000, target: { kind: "limit", limit: 0 } };
    const { status, lines } = await solve(["search", write("question.json", question), file("scenario.json")]);
    expect(status).toBe(0);
    expect(lines[0]).toMatchObject({ safeSide: "above", answer: { above: { value: 800 } } });
    const nothing = write("nothing.json", { ...question, target: { kind: "limit", limit: 3 } });
    expect((await solve(["search", nothing, file("scenario.json")])).err).toMatch(
      /target\.limit: The scenario has 1 limits/,
    );
  });

  it("tell what scatters", async () => {
    const inputs = [{ path: "contact.normal.preload", distribution: { kind: "uniform", low: 5, high: 15 } }];
    const study = { format: "restband-tolerance/1", inputs, seed: 3, runs: 200 };
    const { status, lines } = await solve(["study", write("study.json", study), file("scenario.json")]);
    expect(status).toBe(0);
    expect(lines[0]).toMatchObject({ runs: 200, refused: [], limits: [{ kept: { count: 100, of: 200 } }] });
  });

  it("ask for two files", async () => {
    const { status, err } = await solve(["study", file("scenario.json")]);
    expect(status).toBe(2);
    expect(err).toMatch(/Give two files after study/);
  });
});
