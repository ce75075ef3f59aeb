import { beforeEach, describe, expect, it, vi } from "vitest";
import type { Result } from "@restband/solver";
import { Pool } from "../../../web/src/compute/pool.ts";
import type { SolverJob, SolverWorker } from "../../../web/src/compute/solver-job.ts";

/** A worker that runs nothing by itself: the test says when a run ends, fails or the worker dies. */
class HandWorker implements SolverWorker {
  isTerminated = false;
  runs: {
    job: SolverJob;
    progress: (fraction: number) => void;
    done: (result: Result) => void;
    fail: (e: Error) => void;
  }[] = [];
  crash = (): void => undefined;
  run(job: SolverJob, progress: (fraction: number) => void): Promise<Result> {
    return new Promise((done, fail) => this.runs.push({ job, progress, done, fail }));
  }
  terminate(): void {
    this.isTerminated = true;
  }
  onCrash(tell: () => void): void {
    this.crash = tell;
  }
}

const job = (name: string): SolverJob => ({ scenario: { title: name } as SolverJob["scenario"], options: {} });
const result = (name: string): Result => ({ solverVersion: name }) as Result;

describe("the pool of workers", () => {
  let workers: HandWorker[];
  let pool: Pool;
  const first = Symbol("first client");
  const second = Symbol("second client");
  const titles = (index: number): string[] => workers[index].runs.map((run) => run.job.scenario.title);

  beforeEach(() => {
    vi.useFakeTimers();
    workers = [];
    pool = new Pool({
      size: 1,
      patience: 250,
      start: () => {
        workers.push(new HandWorker());
        return workers[workers.length - 1];
      },
    });
    return () => vi.useRealTimers();
  });

  it("starts no worker before the first job", () => expect(workers).toHaveLength(0));

  it("drops what has not begun when a newer job of the client comes", async () => {
    const a = pool.request(first, job("a"));
    const b = pool.request(first, job("b"));
    const c = pool.request(first, job("c"));
    await expect(b).resolves.toEqual({ kind: "dropped" });
    workers[0].runs[0].done(result("a"));
    await expect(a).resolves.toMatchObject({ kind: "result", result: { solverVersion: "a" } });
    expect(titles(0)).toEqual(["a", "c"]);
    workers[0].runs[1].done(result("c"));
    await expect(c).resolves.toMatchObject({ result: { solverVersion: "c" } });
  });

  it("ends an outdated run when its patience is over, and starts afresh", async () => {
    const a = pool.request(first, job("a"));
    void pool.request(first, job("b"));
    await vi.advanceTimersByTimeAsync(249);
    expect(workers[0].isTerminated).toBe(false);
    await vi.advanceTimersByTimeAsync(1);
    await expect(a).resolves.toEqual({ kind: "dropped" });
    expect(workers[0].isTerminated).toBe(true);
    expect(titles(1)).toEqual(["b"]);
  });

  it("lets a run without a newer one take as long as it needs", async () => {
    void pool.request(first, job("a"));
    await vi.advanceTimersByTimeAsync(60_000);
    expect(workers[0].isTerminated).toBe(false);
  });

  it("cancels by ending the worker; the next job gets a new one", async () => {
    const a = pool.request(first, job("a"));
    pool.cancel(first);
    await expect(a).resolves.toEqual({ kind: "cancelled" });
    expect(workers[0].isTerminated).toBe(true);
    const b = pool.request(first, job("b"));
    workers[1].runs[0].done(result("b"));
    await expect(b).resolves.toMatchObject({ kind: "result" });
  });

  it("keeps clients apart: one's newer job does not drop the other's", async () => {
    void pool.request(first, job("a"));
    const b = pool.request(second, job("b"));
    void pool.request(first, job("c"));
    workers[0].runs[0].done(result("a"));
    await vi.advanceTimersByTimeAsync(0);
    workers[0].runs[1].done(result("b"));
    await expect(b).resolves.toMatchObject({ kind: "result" });
    await vi.advanceTimersByTimeAsync(0);
    expect(titles(0)).toEqual(["a", "b", "c"]);
  });

  it("replaces a crashed worker and runs its job once more, then gives up with a sentence", async () => {
    const a = pool.request(first, job("a"));
    workers[0].crash();
    expect(titles(1)).toEqual(["a"]);
    workers[1].crash();
    const reply = await a;
    expect(reply.kind === "failed" && reply.message).toContain("broke off twice");
  });

  it("tells progress, and never that of a run it has ended", () => {
    const told: number[] = [];
    void pool.request(first, job("a"), (fraction) => told.push(fraction));
    workers[0].runs[0].progress(0.5);
    pool.cancel(first);
    workers[0].runs[0].progress(0.9);
    expect(told).toEqual([0.5]);
  });

  it("passes on why a run failed", async () => {
    const a = pool.request(first, job("a"));
    workers[0].runs[0].fail(new Error("no root"));
    await expect(a).resolves.toEqual({ kind: "failed", message: "The computation failed: no root" });
  });

  it("says so where no worker can be started", async () => {
    pool = new Pool({
      size: 1,
      patience: 250,
      start: () => {
        throw new Error("Worker is not defined");
      },
    });
    await expect(pool.request(first, job("a"))).resolves.toMatchObject({ kind: "failed" });
  });

  it("runs two clients at once on two workers", () => {
    pool = new Pool({
      size: 2,
      patience: 250,
      start: () => (workers.push(new HandWorker()), workers[workers.length - 1]),
    });
    void pool.request(first, job("a"));
    void pool.request(second, job("b"));
    expect([titles(0), titles(1)]).toEqual([["a"], ["b"]]);
  });
});
