import type { Result, Scenario } from "@restband/solver";
import { expect, it, vi } from "vitest";
import type { SolverReply } from "../../../web/src/compute/solver-job.ts";
import { GlanceBook } from "../../../web/src/features/project-home/glances/glance-book.ts";

const result = { events: [], samples: null } as unknown as Result;
const wanted = (count: number) => Array.from({ length: count }, (_, i) => ({ id: `id ${i}`, digest: `digest ${i}` }));

/** A book over made-up contents; `read` and `run` are told to it and counted. */
function open({ run = (): Promise<SolverReply> => Promise.resolve({ kind: "result", result }) } = {}) {
  const read = vi.fn((_: string, ids: readonly string[]) =>
    Promise.resolve(ids.map((id) => ({ digest: id.replace("id", "digest"), content: { title: id } as Scenario }))),
  );
  const runs: string[] = [];
  const counted = (scenario: Scenario): Promise<SolverReply> => {
    runs.push(scenario.title);
    return run();
  };
  return { read, runs, book: new GlanceBook({ read, run: counted, lanes: 2, batch: 20, pause: 1 }) };
}

it("reads contents in batches, runs each once, in the order wanted, and tells", async () => {
  const { book, read, runs } = open();
  const told = vi.fn();
  book.subscribe(told);
  book.want("p", wanted(45));
  await vi.waitFor(() => expect(book.get("digest 44")).toBeDefined());
  expect(read.mock.calls.map(([, ids]) => ids.length)).toEqual([20, 20, 5]);
  // Two run side by side: neighbours may swap.
  expect(runs.every((id, place) => Math.abs(Number(id.slice(3)) - place) <= 1)).toBe(true);
  await vi.waitFor(() => expect(told).toHaveBeenCalled());
  book.want("p", wanted(45));
  expect(runs).toHaveLength(45);
});

it("wanting nothing, again and again, ends", () => {
  const { book } = open();
  book.want("p", []);
  book.want("p", []);
  expect(book.get("digest 0")).toBeUndefined();
});

it("forgets what is no longer wanted and has not begun", async () => {
  const { book, runs } = open();
  book.want("p", wanted(40));
  book.want("p", wanted(40).slice(38));
  await vi.waitFor(() => expect(book.get("digest 39")).toBeDefined());
  expect(runs.length).toBeLessThan(6);
});

it("tries again after a reading that failed", async () => {
  const { book, read } = open();
  read.mockRejectedValueOnce(new Error("no server"));
  book.want("p", wanted(1));
  await vi.waitFor(() => expect(book.get("digest 0")?.computed).toBeDefined());
  expect(read).toHaveBeenCalledTimes(2);
});

it("says so of what is no longer there, and of a run that failed", async () => {
  const { book, read } = open({ run: () => Promise.resolve({ kind: "failed", message: "Broke off." }) });
  read.mockResolvedValueOnce([{ digest: "digest 0", content: { title: "id 0" } as Scenario }]);
  book.want("p", wanted(2));
  await vi.waitFor(() => expect(book.get("digest 0")).toEqual({ computed: null, failure: "Broke off." }));
  read.mockResolvedValueOnce([]);
  book.want("p", [{ id: "gone", digest: "gone" }]);
  await vi.waitFor(() => expect(book.get("gone")?.failure).toBe("Changed or moved away meanwhile."));
});
