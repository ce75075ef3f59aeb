import type { SolverJob, SolverReply, SolverWorker } from "./solver-job.ts";

/** Whoever asks for runs: of each client only the newest job counts. */
export type Client = symbol;

export interface Pool {
  /** Asks for a run. A job of the same client that has not begun is dropped; one under way has `patience` left to finish. */
  request(client: Client, job: SolverJob, onProgress?: (fraction: number) => void): Promise<SolverReply>;
  /** Ends what the client has under way and drops what it has waiting, at once. */
  cancel(client: Client): void;
  /** The client is gone: its waiting job is dropped, the one under way is given the same patience. */
  leave(client: Client): void;
}

interface Task {
  readonly client: Client;
  readonly job: SolverJob;
  readonly onProgress: (fraction: number) => void;
  readonly settle: (reply: SolverReply) => void;
  attempts: number;
}

interface Slot {
  worker: SolverWorker | null;
  task: Task | null;
}

interface PoolSettings {
  start: () => SolverWorker;
  size: number;
  /** How long an outdated run may go on before its worker is replaced, ms: short runs finish and keep a dragged value alive. */
  patience: number;
}

const ATTEMPTS = 2;

/** Workers started when first needed; per client the latest job wins, so nothing outdated ever waits in a queue. */
export function createPool({ start, size, patience }: PoolSettings): Pool {
  const slots: Slot[] = Array.from({ length: size }, () => ({ worker: null, task: null }));
  const waiting = new Map<Client, Task>();

  function pump(): void {
    for (const [client, task] of waiting) {
      if (slots.some((slot) => slot.task?.client === client)) continue;
      const free = slots.find((slot) => slot.task === null && slot.worker) ?? slots.find((slot) => slot.task === null);
      if (!free) return;
      waiting.delete(client);
      begin(free, task);
    }
  }

  function begin(slot: Slot, task: Task): void {
    slot.task = task;
    task.attempts += 1;
    const worker = (slot.worker ??= open(slot));
    const isMine = (): boolean => slot.task === task && slot.worker === worker;
    worker
      .run(task.job, (fraction) => isMine() && task.onProgress(fraction))
      .then(
        (outcome) => isMine() && finish(slot, replyOf(outcome)),
        (error: unknown) => isMine() && finish(slot, { kind: "failed", message: sentenceOf(error) }),
      );
  }

  function open(slot: Slot): SolverWorker {
    const worker = start();
    worker.onCrash(() => slot.worker === worker && crash(slot));
    return worker;
  }

  function finish(slot: Slot, reply: SolverReply): void {
    const task = slot.task;
    slot.task = null;
    task?.settle(reply);
    pump();
  }

  function replace(slot: Slot): void {
    slot.worker?.terminate();
    slot.worker = null;
  }

  function crash(slot: Slot): void {
    const task = slot.task;
    replace(slot);
    if (!task) return;
    if (task.attempts < ATTEMPTS) return begin(slot, task);
    finish(slot, {
      kind: "failed",
      message: "The computation broke off twice. Change a value, or load the page again.",
    });
  }

  function outdate(client: Client): void {
    const slot = slots.find((candidate) => candidate.task?.client === client);
    const task = slot?.task;
    if (!slot || !task) return;
    setTimeout(() => slot.task === task && end(slot, { kind: "dropped" }), patience);
  }

  function end(slot: Slot, reply: SolverReply): void {
    replace(slot);
    finish(slot, reply);
  }

  function drop(client: Client, reply: SolverReply): void {
    const task = waiting.get(client);
    waiting.delete(client);
    task?.settle(reply);
  }

  return {
    request(client, job, onProgress = () => undefined) {
      return new Promise((settle) => {
        drop(client, { kind: "dropped" });
        outdate(client);
        waiting.set(client, { client, job, onProgress, settle, attempts: 0 });
        pump();
      });
    },
    cancel(client) {
      drop(client, { kind: "cancelled" });
      for (const slot of slots) if (slot.task?.client === client) end(slot, { kind: "cancelled" });
    },
    leave(client) {
      drop(client, { kind: "dropped" });
      outdate(client);
    },
  };
}

function replyOf(outcome: Awaited<ReturnType<SolverWorker["run"]>>): SolverReply {
  return "error" in outcome ? { kind: "refusal", refusal: outcome.error } : { kind: "result", result: outcome };
}

const sentenceOf = (error: unknown): string =>
  `The computation failed: ${error instanceof Error ? error.message : String(error)}`;
