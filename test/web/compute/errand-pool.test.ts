import { beforeEach, describe, expect, it, vi } from "vitest";
import type { RunReply } from "@restband/solver";
import { BrokenOff, CalledOff, type Errand, type ErrandWorker } from "../../../web/src/compute/errand.ts";
import { ErrandPool } from "../../../web/src/compute/errand-pool.ts";
import { goThrough } from "../../../web/src/compute/go-through.ts";
import { runTiles } from "../../../web/src/compute/run-tiles.ts";

/** A worker that does nothing by itself: the test says what becomes of each errand. */
class HandWorker implements ErrandWorker {
  isTerminated = false;
  errands: {
    errand: Errand;
    done: (answer: never) => void;
    fail: (error: Error) => void;
    tell: (n: number) => void;
  }[] = [];
  crash = (): void => undefined;
  do(errand: Errand, tell: (done: number) => void): Promise<never> {
    return new Promise((done, fail) => this.errands.push({ errand, done, fail, tell }));
  }
  terminate(): void {
    this.isTerminated = true;
  }
  onCrash(tell: () => void): void {
    this.crash = tell;
  }
}

const runs = (name: string): Errand & { kind: "runs" } => ({
  kind: "runs",
  runs: [{ scenario: { title: name } as never, quantities: [] }],
});
const replies = (name: string): never => [{ reason: name }] as readonly RunReply[] as never;
const live = new AbortController().signal;

let workers: HandWorker[];
const poolOf = (size: number): ErrandPool => {
  workers = [];
  return new ErrandPool({
    size,
    start: () => {
      workers.push(new HandWorker());
      return workers[workers.length - 1];
    },
  });
};
const settle = (): Promise<void> => new Promise((resolve) => setTimeout(resolve));

describe("the pool of errands", () => {
  it("starts a worker when it is needed and does errands in the order they come", async () => {
    const pool = poolOf(1);
    expect(workers).toHaveLength(0);
    const [a, b] = [pool.send(runs("a"), live), pool.send(runs("b"), live)];
    expect(workers[0].errands).toHaveLength(1);
    workers[0].errands[0].done(replies("A"));
    expect(await a).toEqual([{ reason: "A" }]);
    workers[0].errands[1].done(replies("B"));
    expect(await b).toEqual([{ reason: "B" }]);
    expect(workers).toHaveLength(1);
  });

  it("does an errand again where its worker dies, by another worker, and gives up where that dies too", async () => {
    const pool = poolOf(1);
    const a = pool.send(runs("a"), live);
    workers[0].crash();
    expect(workers).toHaveLength(2);
    expect(workers[0].isTerminated).toBe(true);
    workers[1].errands[0].done(replies("A"));
    expect(await a).toEqual([{ reason: "A" }]);
    const b = pool.send(runs("b"), live);
    workers[1].crash();
    workers[2].crash();
    await expect(b).rejects.toBeInstanceOf(BrokenOff);
    const c = pool.send(runs("c"), live);
    workers[3].errands[0].done(replies("C"));
    expect(await c).toEqual([{ reason: "C" }]);
  });

  it("leaves nothing with a signal that outlives its errands", async () => {
    const pool = poolOf(1);
    const { signal } = new AbortController();
    const [added, removed] = [vi.spyOn(signal, "addEventListener"), vi.spyOn(signal, "removeEventListener")];
    const a = pool.send(runs("a"), signal);
    workers[0].errands[0].done(replies("A"));
    await a;
    expect(removed.mock.calls[0][1]).toBe(added.mock.calls[0][1]);
  });

  it("ends the worker of what is called off at once, and forgets what waits", async () => {
    const pool = poolOf(1);
    const controller = new AbortController();
    const [a, b] = [pool.send(runs("a"), controller.signal), pool.send(runs("b"), controller.signal)];
    const c = pool.send(runs("c"), live);
    controller.abort();
    await expect(a).rejects.toBeInstanceOf(CalledOff);
    await expect(b).rejects.toBeInstanceOf(CalledOff);
    expect(workers[0].isTerminated).toBe(true);
    expect(workers[1].errands.map(({ errand }) => errand)).toEqual([runs("c")]);
    workers[1].errands[0].done(replies("C"));
    expect(await c).toEqual([{ reason: "C" }]);
    await expect(pool.send(runs("d"), controller.signal)).rejects.toBeInstanceOf(CalledOff);
  });
});

it("says so where the browser starts no workers", async () => {
  const pool = new ErrandPool({
    size: 1,
    start: () => {
      throw new Error("no workers");
    },
  });
  await expect(pool.send(runs("a"), live)).rejects.toThrow("This browser starts no workers");
  await expect(pool.send(runs("b"), live)).rejects.toThrow("This browser starts no workers");
});

describe("going through an exploration", () => {
  it("shares the runs out and gives the replies back in the order asked, told how far it is", async () => {
    const pool = poolOf(2);
    const names = ["a", "b", "c"];
    const told: number[] = [];
    function* exploring(): Generator<
      { runs: { scenario: never; quantities: [] }[]; done: number; total: number },
      string,
      readonly RunReply[]
    > {
      const answers = yield {
        runs: names.map((title) => ({ scenario: { title } as never, quantities: [] })),
        done: 0,
        total: 3,
      };
      return answers.map((each) => ("reason" in each ? each.reason : "")).join("");
    }
    const going = goThrough(exploring(), { pool, signal: live, tell: ({ done }) => told.push(done) });
    await settle();
    expect(workers.map(({ errands }) => errands.length)).toEqual([1, 1]);
    workers[1].errands[0].done([{ reason: "C" }] as never);
    workers[0].errands[0].done([{ reason: "A" }, { reason: "B" }] as never);
    expect(await going).toBe("ABC");
    expect(told).toEqual([0]);
  });
});

describe("running tiles", () => {
  let done: [number, number][];
  let failed: [number, string][];
  beforeEach(() => {
    done = [];
    failed = [];
  });
  const run = (pool: ErrandPool, there: number[], signal = live) =>
    runTiles({
      errandOf: (tile) => ({ kind: "tile", scenario: {} as never, plan: {} as never, tile }),
      order: () => [0, 3, 1, 2],
      hasTile: (tile) => there.includes(tile),
      pool,
      signal,
      onTile: (tile, rows) => done.push([tile, rows[0]]),
      onRows: () => undefined,
      onFailed: (tile, reason) => failed.push([tile, reason]),
    });
  const tiles = (worker: number): number[] =>
    workers[worker].errands.map(({ errand }) => (errand.kind === "tile" ? errand.tile : -1));
  const answer = async (worker: number, value: number): Promise<void> => {
    workers[worker].errands.at(-1)?.done(Float64Array.of(value) as never);
    await settle();
  };

  it("runs the first alone, then the others in their order, and leaves out those that are there", async () => {
    const pool = poolOf(2);
    const running = run(pool, [1]);
    await settle();
    expect(workers).toHaveLength(1);
    await answer(0, 10);
    expect([tiles(0).at(-1), tiles(1).at(-1)].sort()).toEqual([2, 3]);
    await answer(0, 11);
    await answer(1, 12);
    await running;
    expect(done.map(([tile]) => tile).sort()).toEqual([0, 2, 3]);
  });

  it("tells a tile that two workers died of, and goes on with the rest", async () => {
    const pool = poolOf(1);
    const running = run(pool, [0]);
    await settle();
    workers[0].crash();
    workers[1].crash();
    await settle();
    expect(failed).toEqual([[3, "The computation broke off twice."]]);
    await answer(2, 1);
    await answer(2, 2);
    await running;
    expect(done.map(([tile]) => tile)).toEqual([1, 2]);
  });

  it("ends when it is called off", async () => {
    const pool = poolOf(2);
    const controller = new AbortController();
    const running = run(pool, [0], controller.signal);
    await settle();
    controller.abort();
    await expect(running).rejects.toBeInstanceOf(CalledOff);
    expect(workers.every(({ isTerminated }) => isTerminated)).toBe(true);
  });
});
