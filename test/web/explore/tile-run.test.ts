import { checkSweepPlan, runTile, tileCount, type SweepPlan } from "@restband/solver";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { isRunningHere, noteRunning } from "../../../web/src/features/explore/kept/running-here.ts";
import { tileRunOf, type TileRun } from "../../../web/src/features/explore/kept/tile-run.ts";
import type { SweepCells } from "../../../web/src/features/explore/sweep/sweep-cells.ts";
import { sweepWork } from "../../../web/src/features/explore/sweep/stored-sweep.ts";
import { deadly, sweepServer, type ExplorationServer } from "../support/exploration-page.ts";
import { project, refuse } from "../support/fake-server.ts";
import { creepFeed } from "../support/scenarios.ts";

vi.mock("../../../web/src/compute/start-explore-worker.ts", async () =>
  (await import("../support/exploration-page.ts")).exploreInOneThread(),
);

const scenario = { ...creepFeed, span: { ...creepFeed.span, seconds: 0.05 } };
const plan = checkSweepPlan(
  {
    format: "restband-sweep/1",
    axes: [
      { path: "contact.law.kinetic", spacing: "linear", from: 0.05, to: 0.14, count: 12 },
      { path: "base[0].rate", spacing: "log", from: 0.001, to: 0.1, count: 12 },
    ],
    quantities: ["stickFraction"],
  },
  scenario,
).plan as SweepPlan;
const all = tileCount(plan);

let server: ExplorationServer;
let run: TileRun<SweepCells>;
beforeEach(() => {
  localStorage.clear();
  deadly.clear();
  vi.useFakeTimers({ toFake: ["setTimeout", "clearTimeout"] });
  server = sweepServer(scenario, plan);
  run = tileRunOf(project.id, server.read(), () => sweepWork(plan, scenario));
});
afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

const claims = (): number => server.requests.filter(({ path }) => path.endsWith("/claim")).length;
/** Lets what is under way come to its end; only a wait for a timer lasts. */
const settled = async (): Promise<void> => {
  for (let i = 0; i < 50; i++) await new Promise((resolve) => setImmediate(resolve));
};

describe("a sweep that is computed", () => {
  it("saves its tiles as they come, and is told as running until it is complete", async () => {
    expect(all).toBeGreaterThan(3);
    const ended = run.start(true);
    expect(isRunningHere(server.id)).toBe(true);
    await ended;
    await settled();
    expect([...server.tiles.keys()].sort((a, b) => a - b)).toEqual(Array.from({ length: all }, (_, i) => i));
    expect(run.isComplete).toBe(true);
    expect(isRunningHere(server.id)).toBe(false);
  });

  it("keeps what cannot be saved and tries it again, until the server is there", async () => {
    server.refusal = refuse(503, "database-gone", "The server cannot save just now.");
    await run.start(true);
    await settled();
    expect(run.isComplete).toBe(true);
    expect([run.unsavedCount, run.trouble]).toEqual([all, "The server cannot save just now."]);
    await vi.advanceTimersByTimeAsync(3000);
    expect(run.unsavedCount).toBe(all);
    server.refusal = null;
    await vi.advanceTimersByTimeAsync(3000);
    await settled();
    expect([run.unsavedCount, run.trouble, server.tiles.size]).toEqual([0, null, all]);
  });

  it("ends where the server knows it no more, and says so", async () => {
    server.refusal = refuse(404, "not-found", "There is nothing at this address.");
    await run.start(true);
    await settled();
    expect(run.state).toEqual({ kind: "failed", message: "There is nothing at this address." });
    expect(run.unsavedCount).toBe(0);
    expect(isRunningHere(server.id)).toBe(false);
  });

  it("leaves it to another page that computes it already, and goes on where that has stopped", async () => {
    server.runner = "Tomas Wik";
    await run.start(true);
    expect(run.state).toEqual({ kind: "elsewhere" });
    expect([server.tiles.size, run.store.done]).toEqual([0, 0]);
    server.runner = null;
    server.tiles.set(1, base64(runTile(scenario, plan, 1) as Float64Array));
    await run.start(true);
    await settled();
    expect(claims()).toBe(2);
    expect(run.isComplete).toBe(true);
    // what the other page had saved is read and not computed again
    const saved = server.requests.filter(({ method }) => method === "PUT").map(({ path }) => path.split("/").at(-1));
    expect(saved).toHaveLength(all - 1);
    expect(saved).not.toContain("1");
  });

  it("goes on where a part kills its worker each time, says which, and runs it again when resumed", async () => {
    deadly.set(2, 2);
    await run.start(true);
    await settled();
    expect([...run.failed.keys()]).toEqual([2]);
    expect(server.tiles.size).toBe(all - 1);
    await run.start(true);
    await settled();
    expect([run.failed.size, run.isComplete, server.tiles.size]).toEqual([0, true, all]);
  });

  it("runs a part whose worker dies once by another worker", async () => {
    deadly.set(2, 1);
    await run.start(true);
    expect([run.failed.size, run.isComplete]).toEqual([0, true]);
  });

  it("frees the workers when it is stopped: what is there stays, and a reload does not begin it", async () => {
    const ended = run.start(true);
    await run.fetch([]);
    run.stop();
    await ended;
    expect(run.state).toEqual({ kind: "waiting" });
    expect(isRunningHere(server.id)).toBe(false);
    expect(server.requests.some(({ path }) => path.endsWith("/release"))).toBe(true);
  });

  it("takes in what other machines have solved, and saves it; what is there stays", async () => {
    const tiles = Array.from({ length: all }, (_, tile) => runTile(scenario, plan, tile) as Float64Array);
    server.tiles.set(0, base64(tiles[0]));
    await run.fetch([0]);
    noteRunning(server.id);
    run.bringIn(tiles.map((rows, tile) => (tile === 0 ? rows.map(() => -1) : rows)));
    await settled();
    expect(run.isComplete).toBe(true);
    expect(run.store.rowsOf(0)).toEqual(tiles[0]);
    expect(server.requests.filter(({ method }) => method === "PUT")).toHaveLength(all - 1);
    expect(isRunningHere(server.id)).toBe(false);
  });
});

const base64 = (rows: Float64Array): string => Buffer.from(rows.buffer).toString("base64");
