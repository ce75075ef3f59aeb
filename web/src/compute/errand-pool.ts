import {
  BrokenOff,
  CalledOff,
  type AnswerTo,
  type Errand,
  type ErrandAnswers,
  type ErrandWorker,
  type TellDone,
} from "./errand.ts";

interface Task {
  readonly errand: Errand;
  readonly signal: AbortSignal;
  readonly tell: TellDone;
  readonly resolve: (answer: ErrandAnswers[Errand["kind"]]) => void;
  readonly reject: (reason: Error) => void;
  attempts: number;
}

interface Slot {
  worker: ErrandWorker | null;
  task: Task | null;
}

interface ErrandPoolSettings {
  readonly start: () => ErrandWorker;
  readonly size: number;
}

const ATTEMPTS = 2;

/**
 * Workers that share out many small errands, in the order they come. An errand whose worker dies is done again by another;
 * one that is called off ends its worker at once, since a busy worker hears nothing.
 */
export class ErrandPool {
  private readonly settings: ErrandPoolSettings;
  private readonly slots: readonly Slot[];
  private waiting: Task[] = [];

  constructor(settings: ErrandPoolSettings) {
    this.settings = settings;
    this.slots = Array.from({ length: settings.size }, () => ({ worker: null, task: null }));
  }

  /** How many errands are done at a time. */
  get size(): number {
    return this.slots.length;
  }

  /**
   * Does an errand as soon as a worker is free.
   * @throws CalledOff once the signal is aborted, BrokenOff where two workers died of it, or what the solver threw
   */
  send<E extends Errand>(errand: E, signal: AbortSignal, tell: TellDone = () => undefined): Promise<AnswerTo<E>> {
    let leave = (): void => undefined;
    const answer = new Promise<AnswerTo<E>>((resolve, reject) => {
      const task: Task = { errand, signal, tell, resolve: resolve as Task["resolve"], reject, attempts: 0 };
      if (signal.aborted) return reject(new CalledOff());
      const callOff = (): void => this.callOff(task);
      signal.addEventListener("abort", callOff, { once: true });
      leave = () => signal.removeEventListener("abort", callOff);
      this.waiting.push(task);
      this.pump();
    });
    // A signal may outlive thousands of errands: none of them is held by it any longer than it lasts.
    return answer.finally(() => leave());
  }

  private callOff(task: Task): void {
    this.waiting = this.waiting.filter((each) => each !== task);
    const slot = this.slots.find((each) => each.task === task);
    if (slot) this.free(slot);
    task.reject(new CalledOff());
    this.pump();
  }

  /** Ends the worker of a slot; the next errand gets a new one. */
  private free(slot: Slot): void {
    slot.worker?.terminate();
    slot.worker = null;
    slot.task = null;
  }

  private pump(): void {
    // One signal may call off many at once: those after the first are not begun in between.
    this.waiting = this.waiting.filter(({ signal }) => !signal.aborted);
    while (this.waiting.length > 0) {
      const free = this.slots.filter(({ task }) => task === null);
      const slot = free.find(({ worker }) => worker) ?? free[0];
      const task = slot && this.waiting.shift();
      if (!task) return;
      this.begin(slot, task);
    }
  }

  private begin(slot: Slot, task: Task): void {
    slot.task = task;
    task.attempts += 1;
    const worker = slot.worker ?? this.open(slot);
    if (!worker) {
      slot.task = null;
      return task.reject(new Error("This browser starts no workers; without them nothing is computed."));
    }
    const settle = (act: () => void): void => {
      if (slot.task !== task || slot.worker !== worker) return;
      slot.task = null;
      act();
      this.pump();
    };
    const tell: TellDone = (done) => slot.task === task && task.tell(done);
    worker.do(task.errand, tell).then(
      (answer) => settle(() => task.resolve(answer)),
      (error: unknown) => settle(() => task.reject(error instanceof Error ? error : new Error(String(error)))),
    );
  }

  private open(slot: Slot): ErrandWorker | null {
    try {
      const worker = (slot.worker = this.settings.start());
      worker.onCrash(() => slot.worker === worker && this.crash(slot));
      return worker;
    } catch {
      return null;
    }
  }

  private crash(slot: Slot): void {
    const task = slot.task;
    this.free(slot);
    if (task && task.attempts < ATTEMPTS) this.waiting.unshift(task);
    else task?.reject(new BrokenOff());
    this.pump();
  }
}
