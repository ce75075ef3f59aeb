import type { Result, Scenario } from "@restband/solver";
import { act, renderHook, waitFor } from "@testing-library/react";
import { beforeEach, describe, expect, it, vi } from "vitest";
import { recall, remember, runKey } from "../../../web/src/compute/run-cache.ts";
import type { SolverJob } from "../../../web/src/compute/solver-job.ts";
import { useRun } from "../../../web/src/compute/use-run.ts";
import { nextPlace, useScan, type ScanPoint } from "../../../web/src/compute/use-scan.ts";
import { creepFeed, variant } from "../support/scenarios.ts";

interface HandRun {
  job: SolverJob;
  progress: (fraction: number) => void;
  done: (result: Result) => void;
}
const worker = vi.hoisted(() => ({ runs: [] as unknown[], terminated: 0, crash: [] as (() => void)[] }));
vi.mock("../../../web/src/compute/start-worker.ts", () => ({
  startWorker: () => ({
    run: (job: SolverJob, progress: HandRun["progress"]) =>
      new Promise((done) => worker.runs.push({ job, progress, done })),
    terminate: () => (worker.terminated += 1),
    onCrash: () => undefined,
  }),
}));

const runs = (): HandRun[] => worker.runs as HandRun[];
// Every test runs bodies of its own mass, so that none finds another's result in the cache.
let mass = 1;
const damped = (viscous: number): Scenario => variant({ body: { ...creepFeed.body, inertia: mass, viscous } });
const result = (version: string): Result =>
  ({ solverVersion: version, samples: null, outcome: "stick-slip" }) as Result;
const finish = (index: number, version: string): Promise<void> =>
  act(async () => {
    runs()[index].done(result(version));
    await Promise.resolve();
  });
const versionOf = (hook: { current: ReturnType<typeof useRun> }): string | null =>
  hook.current.computed && "result" in hook.current.computed ? hook.current.computed.result.solverVersion : null;

beforeEach(() => {
  mass += 1;
  worker.runs.length = 0;
});

describe("a run of the page", () => {
  it("comes with the scenario it is of, and is stale as soon as another is asked for", async () => {
    const first = damped(1);
    const { result: hook, rerender } = renderHook(({ scenario }) => useRun(scenario), {
      initialProps: { scenario: first },
    });
    expect(hook.current).toMatchObject({ computed: null, isStale: false, progress: 0 });
    await finish(0, "a");
    expect(hook.current).toMatchObject({ computed: { scenario: first }, isStale: false, progress: null });
    rerender({ scenario: damped(2) });
    expect(hook.current.isStale).toBe(true);
    expect(hook.current.computed?.scenario).toBe(first);
    await finish(1, "b");
    expect(versionOf(hook)).toBe("b");
    expect(hook.current.isStale).toBe(false);
  });

  it("shows each run that ends while a value is dragged, and runs only the newest of what waits", async () => {
    const { result: hook, rerender } = renderHook(({ c }) => useRun(damped(c)), { initialProps: { c: 1 } });
    for (const c of [2, 3, 4]) rerender({ c });
    await finish(0, "1");
    expect(versionOf(hook)).toBe("1");
    expect(hook.current.isStale).toBe(true);
    expect(runs().map(({ job }) => job.scenario.body.viscous)).toEqual([1, 4]);
    await finish(1, "4");
    expect(versionOf(hook)).toBe("4");
    expect(hook.current.isStale).toBe(false);
  });

  it("tells its progress and can be cancelled; what was there stays, and it can be run again", async () => {
    const { result: hook, rerender } = renderHook(({ c }) => useRun(damped(c)), { initialProps: { c: 1 } });
    await finish(0, "1");
    rerender({ c: 2 });
    act(() => runs()[1].progress(0.4));
    expect(hook.current.progress).toBe(0.4);
    await act(async () => {
      hook.current.cancel();
      await Promise.resolve();
    });
    expect(hook.current).toMatchObject({
      progress: null,
      isStale: true,
      failure: "Cancelled. What is shown is the run before.",
    });
    expect(versionOf(hook)).toBe("1");
    act(() => hook.current.again());
    await finish(2, "2");
    expect(hook.current).toMatchObject({ failure: null, isStale: false });
  });

  it("runs nothing twice: a value put back shows its result at once", async () => {
    const { result: hook, rerender } = renderHook(({ c }) => useRun(damped(c)), { initialProps: { c: 1 } });
    await finish(0, "1");
    rerender({ c: 2 });
    await finish(1, "2");
    rerender({ c: 1 });
    expect(versionOf(hook)).toBe("1");
    expect(hook.current.isStale).toBe(false);
    expect(runs()).toHaveLength(2);
  });

  it("asks for nothing where there is no scenario", () => {
    renderHook(() => useRun(null));
    expect(runs()).toHaveLength(0);
  });
});

describe("the cache of runs", () => {
  const job = (scenario: Scenario): SolverJob => ({ scenario, options: {} });

  it("knows a run by what the solver reads", () => {
    const renamed = variant({ title: "Other", purpose: "test", origins: { "body.inertia": { kind: "assumed" } } });
    expect(runKey(job(renamed))).toBe(runKey(job(creepFeed)));
    expect(runKey(job(damped(1)))).not.toBe(runKey(job(damped(2))));
    expect(runKey({ scenario: creepFeed, options: { samples: 2 } })).not.toBe(runKey(job(creepFeed)));
  });

  it("keeps results only, and makes room by the oldest", () => {
    remember("failed", { kind: "failed", message: "" });
    expect(recall("failed")).toBeUndefined();
    const big = { t: new Float64Array(300_000) } as unknown as Result["samples"];
    for (const key of ["one", "two", "three"])
      remember(key, { kind: "result", result: { ...result(key), samples: big } });
    expect([recall("one"), recall("two"), recall("three")].map((reply) => reply !== undefined)).toEqual([
      false,
      true,
      true,
    ]);
  });
});

describe("a scan along a scale", () => {
  it("tells outcomes as they come, ends and middle first", async () => {
    const { result: hook } = renderHook(() => useScan((at) => damped(at), `scan of mass ${mass}`));
    expect(hook.current).toEqual([]);
    for (const index of [0, 1, 2]) {
      await waitFor(() => expect(runs()).toHaveLength(index + 1));
      await finish(index, "");
    }
    expect(
      runs()
        .map(({ job }) => job.scenario.body.viscous)
        .slice(0, 3),
    ).toEqual([0, 1, 0.5]);
    expect(hook.current).toEqual([
      { at: 0, outcome: "stick-slip" },
      { at: 0.5, outcome: "stick-slip" },
      { at: 1, outcome: "stick-slip" },
    ]);
  });

  it("looks at 33 places, then closes in on where the outcome changes", () => {
    const boundary = 0.6180339;
    let points: ScanPoint[] = [];
    for (let at = nextPlace(points); at !== null; at = nextPlace(points)) {
      const outcome = at < boundary ? "stick-slip" : "smooth-sliding";
      points = [...points, { at, outcome } as const].sort((a, b) => a.at - b.at);
    }
    expect(points).toHaveLength(33 + 6);
    const after = points.find(({ outcome }) => outcome === "smooth-sliding")?.at ?? 0;
    expect(after).toBeGreaterThan(boundary);
    expect(after - boundary).toBeLessThan(1 / 32 / 64);
  });
});
