import type { Scenario } from "@restband/solver";
import type { SolverReply } from "../../../compute/solver-job.ts";
import type { Computed } from "../../../compute/use-run.ts";
import { slim } from "./slim.ts";

/** What a row shows of a run: the answer, or a sentence why there is none. */
export type Glance = { computed: Computed; failure: null } | { computed: null; failure: string };

/** A scenario of a list; `digest` is that of its content. */
export interface Wanted {
  readonly id: string;
  readonly digest: string;
}

interface GlanceBookSettings {
  readonly read: (projectId: string, ids: readonly string[]) => Promise<{ digest: string; content: Scenario }[]>;
  readonly run: (scenario: Scenario, client: symbol) => Promise<SolverReply>;
  /** Runs asked for side by side. */
  readonly lanes: number;
  /** Contents read at once. */
  readonly batch: number;
  /** Pause after a reading that failed, ms. */
  readonly pause: number;
}

/** Glances kept, by the digest of what they are of; above this a new project begins with none. */
const MOST = 5000;

/**
 * Reads and runs the scenarios of a list in the order they are wanted, and keeps what rows show of each by its digest: a
 * list of a thousand asks for contents and runs only where somebody looks.
 */
export class GlanceBook {
  private readonly settings: GlanceBookSettings;
  private readonly glances = new Map<string, Glance>();
  private readonly contents = new Map<string, Scenario>();
  private readonly underWay = new Set<string>();
  private readonly listeners = new Set<() => void>();
  private readonly free: symbol[];
  private projectId = "";
  private wanted: readonly Wanted[] = [];
  private reading: Promise<void> = Promise.resolve();
  private timer: ReturnType<typeof setTimeout> | undefined;
  private edition = 0;

  constructor(settings: GlanceBookSettings) {
    this.settings = settings;
    this.free = Array.from({ length: settings.lanes }, () => Symbol("glance"));
  }

  readonly get = (digest: string): Glance | undefined => this.glances.get(digest);

  /** Counts the changes: another number, another state. */
  readonly editionNow = (): number => this.edition;

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  /** What is wanted from now on, the first first; what was wanted before and has not begun is forgotten. */
  want(projectId: string, wanted: readonly Wanted[]): void {
    if (projectId !== this.projectId && this.glances.size > MOST) this.glances.clear();
    this.projectId = projectId;
    this.wanted = wanted;
    while (this.next()) {
      const client = this.free.pop();
      if (!client) return;
      void this.work(client);
    }
  }

  private async work(client: symbol): Promise<void> {
    for (let next = this.next(); next; next = this.next()) {
      this.underWay.add(next.digest);
      await this.lookAt(next, client).catch(() => this.rest());
      this.underWay.delete(next.digest);
    }
    this.free.push(client);
  }

  private isMissing = ({ digest }: Wanted): boolean => !this.glances.has(digest) && !this.underWay.has(digest);

  private next(): Wanted | undefined {
    return this.wanted.find(this.isMissing);
  }

  private async lookAt(wanted: Wanted, client: symbol): Promise<void> {
    const { projectId } = this;
    if (!this.contents.has(wanted.digest)) await this.readFrom(projectId, wanted);
    const content = this.contents.get(wanted.digest);
    if (!content) return this.keep(wanted, { computed: null, failure: "Changed or moved away meanwhile." });
    const glance = glanceOf(content, await this.settings.run(content, client));
    this.contents.delete(wanted.digest);
    if (glance) this.keep(wanted, glance);
  }

  /** Reads the contents of one and of those wanted next; one reading at a time, so that no two lanes read the same. */
  private readFrom(projectId: string, first: Wanted): Promise<void> {
    const reading = this.reading.then(async () => {
      if (this.contents.has(first.digest)) return;
      const others = this.wanted.filter((each) => this.isMissing(each) && !this.contents.has(each.digest));
      const ids = [first, ...others].slice(0, this.settings.batch).map(({ id }) => id);
      for (const { digest, content } of await this.settings.read(projectId, ids)) this.contents.set(digest, content);
    });
    this.reading = reading.catch(() => undefined);
    return reading;
  }

  private keep({ digest }: Wanted, glance: Glance): void {
    this.glances.set(digest, glance);
    this.timer ??= setTimeout(() => this.tell(), 100);
  }

  private tell(): void {
    this.timer = undefined;
    this.edition += 1;
    for (const listener of this.listeners) listener();
  }

  private rest(): Promise<void> {
    return new Promise((resolve) => setTimeout(resolve, this.settings.pause));
  }
}

/** Null for a run that was given up for want of anybody who wants it. */
function glanceOf(scenario: Scenario, reply: SolverReply): Glance | null {
  if (reply.kind === "result") return { computed: { scenario, result: slim(reply.result) }, failure: null };
  if (reply.kind === "refusal") return { computed: { scenario, refusal: reply.refusal }, failure: null };
  return reply.kind === "failed" ? { computed: null, failure: reply.message } : null;
}
