import type { StoredScenario } from "@restband/api/contract";
import { isSameWork, type Work } from "./work.ts";

/** How it stands with keeping what was typed. */
export type Saving =
  /** All of it is on the server; `at` null where nothing has been changed since the page was opened. */
  | { kind: "saved"; at: Date | null }
  | { kind: "saving" }
  /** No server answers; it is tried again. */
  | { kind: "unreachable"; since: Date }
  /** Somebody else saved meanwhile; nothing is sent until it is decided field by field. */
  | { kind: "conflict"; current: StoredScenario }
  /** The session has ended; it goes on once somebody is signed in again. */
  | { kind: "signed-out" }
  | { kind: "refused"; message: string };

/** What the server said to a save. */
export type SaveReply =
  | { kind: "saved"; stored: StoredScenario }
  | { kind: "conflict"; current: StoredScenario }
  | { kind: "unreachable" }
  | { kind: "signed-out" }
  | { kind: "refused"; message: string };

/** The version a draft was made from, and what it held. */
export interface Base extends Work {
  readonly version: number;
}

interface AutosaveSettings {
  readonly base: Base;
  readonly save: (work: Work, version: number) => Promise<SaveReply>;
  readonly tell: (saving: Saving) => void;
  /** All that is wanted is on the server now. */
  readonly onKept: (base: Base) => void;
}

/** ms of quiet before a change is sent, and between attempts while no server answers. */
const QUIET = 800;
const RETRY = 3000;

/** Keeps a draft on the server: after a moment of quiet, one save at a time, the newest last, each over the version before. */
export class Autosave {
  /** What the server is known to have. */
  base: Base;
  private readonly settings: AutosaveSettings;
  private wanted: Work;
  private timer: ReturnType<typeof setTimeout> | undefined;
  private isSending = false;
  private isClosed = false;
  /** A conflict waits for its decision. */
  private isHalted = false;
  private lostSince: Date | null = null;
  private keptAt: Date | null = null;

  constructor(settings: AutosaveSettings) {
    this.settings = settings;
    this.base = settings.base;
    this.wanted = settings.base;
  }

  /** The newest state to be kept; anything older that was not sent yet is forgotten. */
  want(work: Work): void {
    this.wanted = work;
    if (this.isSending || this.isHalted) return;
    if (this.isKept()) return this.settle();
    if (!this.lostSince) this.settings.tell({ kind: "saving" });
    this.schedule(QUIET);
  }

  /** The page is there: what waits is sent in its time, and tried again. */
  open(): void {
    this.isClosed = false;
  }

  /** The page is left: what waits is sent at once and once only. What then fails is in the browser's own copy. */
  close(): void {
    if (!this.isKept()) void this.send();
    this.isClosed = true;
  }

  /** A conflict is decided: `current` is the base from now on, and `work` what is wanted. */
  decide(current: StoredScenario, work: Work): void {
    this.base = current;
    this.isHalted = false;
    this.wanted = work;
    this.next();
  }

  /** A newer version of the server's is taken over as it is. */
  adopt(stored: StoredScenario): void {
    this.base = stored;
    this.wanted = stored;
    this.settle();
  }

  /** Nothing of one's own is on its way or waiting to be sent. */
  get isIdle(): boolean {
    return !this.isSending && !this.isHalted && this.isKept();
  }

  private isKept(): boolean {
    return isSameWork(this.wanted, this.base);
  }

  private schedule(delay: number): void {
    clearTimeout(this.timer);
    if (this.isClosed) return;
    this.timer = setTimeout(() => void this.send(), delay);
  }

  private async send(): Promise<void> {
    clearTimeout(this.timer);
    if (this.isSending || this.isHalted) return;
    this.isSending = true;
    if (!this.lostSince) this.settings.tell({ kind: "saving" });
    const sent = this.wanted;
    const reply = await this.settings.save(sent, this.base.version);
    this.isSending = false;
    this.take(reply, sent);
  }

  private take(reply: SaveReply, sent: Work): void {
    if (reply.kind === "unreachable") return this.lost();
    this.lostSince = null;
    if (reply.kind === "saved") return this.kept(reply.stored);
    // The answer to an earlier try was lost on the way: it was saved after all.
    if (reply.kind === "conflict" && isSameWork(reply.current, sent)) return this.kept(reply.current);
    this.isHalted = reply.kind === "conflict";
    this.settings.tell(reply);
    if (reply.kind === "refused" && this.wanted !== sent) this.schedule(0);
  }

  private kept(stored: StoredScenario): void {
    this.base = stored;
    this.keptAt = new Date();
    this.next();
  }

  private lost(): void {
    this.lostSince ??= new Date();
    this.settings.tell({ kind: "unreachable", since: this.lostSince });
    this.schedule(RETRY);
  }

  private next(): void {
    if (this.isKept()) this.settle();
    else this.schedule(0);
  }

  /** Nothing is left to be sent. */
  private settle(): void {
    clearTimeout(this.timer);
    this.lostSince = null;
    this.settings.tell({ kind: "saved", at: this.keptAt });
    this.settings.onKept(this.base);
  }
}
