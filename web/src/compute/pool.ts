import type { SolverJob, SolverReply, SolverWorker } from "./solver-job.ts";

/** Whoever asks for runs: of each client only the newest job counts. */
export type Client = symbol;

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
  readonly start: () => SolverWorker;
  readonly size: number;
  /** How long an outdated run may go on before its worker is replaced, ms: short runs finish and keep a dragged value alive. */
  readonly patience: number;
}

const ATTEMPTS = 2;

/** Workers started when first needed; per client the latest job wins, so nothing outdated ever waits in a queue. */
export class Pool {
  private readonly settings: PoolSettings;
  private readonly slots: readonly Slot[];
  private readonly waiting = new Map<Client, Task>();

  constructor(settings: PoolSettings) {
    this.settings = settings;
    this.slots = Array.from({ length: settings.size }, () => ({ worker: null, task: null }));
  }

  /** Asks for a run. A job of the same client that has not begun is dropped; one under way has `patience` left to finish. */
  request(
    client: Client,
    job: SolverJob,
    onProgress: (fraction: number) => void = () => undefined,
  ): Promise<SolverReply> {
    return new Promise((settle) => {
      this.leave(client);
      this.waiting.set(client, { client, job, onProgress, settle, attempts: 0 });
      this.pump();
    });
  }

  /** Ends what the client has under way and drops what it has waiting, at once. */
  cancel(client: Client): void {
    this.drop(client, { kind: "cancelled" });
    for (const slot of this.slots) if (slot.task?.client === client) this.end(slot, { kind: "cancelled" });
  }

  /** The client wants nothing of what it asked for: its waiting job is dropped, the one under way is given its patience. */
  leave(client: Client): void {
    this.drop(client, { kind: "dropped" });
    const slot = this.slots.find(({ task }) => task?.client === client);
    const task = slot?.task;
    if (slot && task)
      setTimeout(() => slot.task === task && this.end(slot, { kind: "dropped" }), this.settings.patience);
  }

  /** Begins what is waiting, in the order it came, as long as there are free workers. */
  private pump(): void {
    for (const [client, task] of this.waiting) {
      if (this.slots.some((slot) => slot.task?.client === client)) continue;
      const free = this.slots.filter((slot) => slot.task === null);
      const slot = free.find(({ worker }) => worker) ?? free[0];
      if (!slot) return;
      this.waiting.delete(client);
      this.begin(slot, task);
    }
  }

  private begin(slot: Slot, task: Task): void {
    slot.task = task;
    task.attempts += 1;
    const worker = (slot.worker ??= this.open(slot));
    if (!worker)
      return this.finish(slot, {
        kind: "failed",
        message: "This browser starts no workers; without them nothing is computed.",
      });
    const isMine = (): boolean => slot.task === task && slot.worker === worker;
    worker
      .run(task.job, (fraction) => isMine() && task.onProgress(fraction))
      .then(
        (outcome) => isMine() && this.finish(slot, replyOf(outcome)),
        (error: unknown) => isMine() && this.finish(slot, { kind: "failed", message: sentenceOf(error) }),
      );
  }

  private open(slot: Slot): SolverWorker | null {
    try {
      const worker = this.settings.start();
      worker.onCrash(() => slot.worker === worker && this.crash(slot));
      return worker;
    } catch {
      return null;
    }
  }

  private finish(slot: Slot, reply: SolverReply): void {
    const task = slot.task;
    slot.task = null;
    task?.settle(reply);
    this.pump();
  }

  /** A busy worker hears nothing: its run is ended by ending it. The next job gets a new one. */
  private end(slot: Slot, reply: SolverReply): void {
    slot.worker?.terminate();
    slot.worker = null;
    this.finish(slot, reply);
  }

  private crash(slot: Slot): void {
    const task = slot.task;
    slot.worker?.terminate();
    slot.worker = null;
    if (task && task.attempts < ATTEMPTS) this.begin(slot, task);
    else
      this.finish(slot, {
        kind: "failed",
        message: "The computation broke off twice. Change a value, or load the page again.",
      });
  }

  private drop(client: Client, reply: SolverReply): void {
    const task = this.waiting.get(client);
    this.waiting.delete(client);
    task?.settle(reply);
  }
}

function replyOf(outcome: Awaited<ReturnType<SolverWorker["run"]>>): SolverReply {
  return "error" in outcome ? { kind: "refusal", refusal: outcome.error } : { kind: "result", result: outcome };
}

const sentenceOf = (error: unknown): string =>
  `The computation failed: ${error instanceof Error ? error.message : String(error)}`;
