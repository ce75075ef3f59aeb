import type { SwitchedOff } from "@restband/api/contract";
import type { Scenario } from "@restband/solver";
import type { Draft, Sheet } from "../draft/draft.ts";
import { readPath } from "../path.ts";
import type { Base } from "./autosave.ts";

/** What is kept in the browser until the server has it: survives a crash, a lost connection, an expired session. */
export interface LocalDraft {
  readonly base: Base;
  readonly inForce: Scenario;
  readonly sheet: Sheet;
}

/** The same as it is stored; `read-local.ts` checks it, since anything may lie there. */
export interface StoredDraft {
  version: number;
  base: unknown;
  inForce: unknown;
  /** Numbers that were refused, by path. */
  refused: Record<string, number>;
  unread: Record<string, { text: string; message: string }>;
  units: Record<string, string>;
  /** Terms that are switched off, now and in the version below. */
  off: SwitchedOff[];
  baseOff: SwitchedOff[];
}

const keyOf = (accountId: string, scenarioId: string): string => `restband-draft ${accountId} ${scenarioId}`;

/** Keeps a draft. Where the browser refuses to store, nothing is kept, and the page works on. */
export function keepLocally(accountId: string, scenarioId: string, draft: Draft, base: Base): void {
  const { inForce, sheet, faults } = draft;
  const refused = Object.fromEntries(
    faults.flatMap(({ path }) => {
      const value = readPath(sheet.wanted, path);
      return typeof value === "number" && !(path in sheet.unread) ? [[path, value]] : [];
    }),
  );
  const stored: StoredDraft = {
    version: base.version,
    base: base.content,
    inForce,
    refused,
    unread: { ...sheet.unread },
    units: { ...sheet.units },
    off: [...sheet.off],
    baseOff: [...base.switchedOff],
  };
  try {
    localStorage.setItem(keyOf(accountId, scenarioId), JSON.stringify(stored));
  } catch {
    // Storage is full or refused: the server's copy and this page are all there is.
  }
}

export function dropLocal(accountId: string, scenarioId: string): void {
  try {
    localStorage.removeItem(keyOf(accountId, scenarioId));
  } catch {
    // Storage is refused: there is nothing to drop.
  }
}

/** What lies in the browser, or null where there is nothing or it may not be read. */
export function localText(accountId: string, scenarioId: string): string | null {
  try {
    return localStorage.getItem(keyOf(accountId, scenarioId));
  } catch {
    return null;
  }
}
