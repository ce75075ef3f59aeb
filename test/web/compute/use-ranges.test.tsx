import { simulate, type Refusal, type Result, type Scenario } from "@restband/solver";
import { act, renderHook, waitFor } from "@testing-library/react";
import { beforeEach, describe, expect, it, vi } from "vitest";
import type { SolverJob } from "../../../web/src/compute/solver-job.ts";
import { useRanges } from "../../../web/src/compute/use-ranges.ts";
import type { Computed } from "../../../web/src/compute/use-run.ts";
import { creepFeed, solved, variant } from "../support/scenarios.ts";

/** Workers that answer when the test lets them: `open` lets every run through, at once. */
const worker = vi.hoisted(() => ({ jobs: [] as unknown[], isOpen: true, terminated: 0 }));
vi.mock("../../../web/src/compute/start-worker.ts", () => ({
  startWorker: () => ({
    run(job: SolverJob): Promise<Result | Refusal> {
      worker.jobs.push(job);
      return worker.isOpen ? Promise.resolve(simulate(job.scenario, job.options)) : new Promise(() => undefined);
    },
    terminate: () => (worker.terminated += 1),
    onCrash: () => undefined,
  }),
}));

// Every test goes through ranges of its own, so that none finds another's report.
let mass = 100;
const withRange = (change: Partial<Scenario> = {}): Computed =>
  solved(
    variant({
      body: { ...creepFeed.body, inertia: mass },
      limits: [{ quantity: "restBand", max: 1 }],
      origins: { "contact.law.static": { kind: "assumed", low: 0.14, high: 0.16 } },
      ...change,
    }),
    0,
  );
const open = (computed: Computed) =>
  renderHook((props: { computed: Computed; isStale: boolean }) => useRanges(props.computed, props.isStale), {
    initialProps: { computed, isStale: false },
  });
/** As many macrotasks as the longest chain of runs takes. */
const pass = (ms: number): Promise<unknown> => act(() => vi.advanceTimersByTimeAsync(ms));

beforeEach(() => {
  mass += 1;
  worker.jobs.length = 0;
  worker.isOpen = true;
  vi.useFakeTimers({ shouldAdvanceTime: true });
  return () => vi.useRealTimers();
});

describe("the ranges of the page", () => {
  it("are gone through once the scenario has been left alone, and asked for limits only", async () => {
    const { result: hook } = open(withRange());
    expect(hook.current.state).toEqual({ kind: "waiting" });
    await pass(500);
    expect(worker.jobs).toHaveLength(0);
    await pass(200);
    await waitFor(() => expect(hook.current.state.kind).toBe("done"));
    expect(hook.current.state).toMatchObject({ report: { verdicts: [{ kind: "kept" }] } });
    expect((worker.jobs[0] as SolverJob).options).toMatchObject({ samples: 0, quantities: [], events: false });
  });

  it("are not begun without limits or without ranges", async () => {
    expect(open(withRange({ limits: [] })).result.current.state).toEqual({ kind: "none" });
    expect(open(withRange({ origins: {} })).result.current.state).toEqual({ kind: "none" });
    await pass(1000);
    expect(worker.jobs).toHaveLength(0);
  });

  it("are ended by an edit, and forgotten", async () => {
    worker.isOpen = false;
    const computed = withRange();
    const { result: hook, rerender } = open(computed);
    await pass(700);
    expect(worker.jobs).toHaveLength(1);
    const before = worker.terminated;
    rerender({ computed, isStale: true });
    await pass(100);
    expect(worker.terminated).toBe(before + 1);
    expect(hook.current.state).toEqual({ kind: "waiting" });
  });

  it("can be cancelled, and begun again by hand", async () => {
    worker.isOpen = false;
    const { result: hook } = open(withRange());
    await pass(700);
    act(() => hook.current.cancel());
    await waitFor(() => expect(hook.current.state).toEqual({ kind: "cancelled" }));
    worker.isOpen = true;
    act(() => hook.current.begin());
    await waitFor(() => expect(hook.current.state.kind).toBe("done"));
  });

  it("wait to be asked where they would take long", async () => {
    let now = 0;
    // Three runs of 2 s each tell that more than thirty take over half a minute.
    vi.spyOn(performance, "now").mockImplementation(() => (now += 2000));
    const { result: hook } = open(withRange());
    await pass(700);
    await waitFor(() => expect(hook.current.state.kind).toBe("long"));
    expect(worker.jobs).toHaveLength(3);
    vi.mocked(performance.now).mockRestore();
    act(() => hook.current.begin());
    await waitFor(() => expect(hook.current.state.kind).toBe("done"));
  });

  it("are known at once where they were gone through before", async () => {
    const computed = withRange();
    const first = open(computed);
    await pass(700);
    await waitFor(() => expect(first.result.current.state.kind).toBe("done"));
    const runs = worker.jobs.length;
    expect(open(computed).result.current.state.kind).toBe("done");
    await pass(700);
    expect(worker.jobs).toHaveLength(runs);
  });
});
