import { checkScenario, checkTerm, z, type Origin, type Scenario, type Term } from "@restband/solver";
import type { Draft, Sheet } from "../draft/draft.ts";
import { readPath, writePath } from "../path.ts";
import type { Base } from "./autosave.ts";

/** What is kept in the browser until the server has it: survives a crash, a lost connection, an expired session. */
export interface LocalDraft {
  readonly base: Base;
  readonly inForce: Scenario;
  readonly sheet: Sheet;
}

const switchedOff = z.array(
  z.object({
    place: z.enum(["force", "base"]),
    index: z.number().int(),
    // Checked by `checkTerm`.
    term: z.custom<Term>(),
    origins: z.record(z.string(), z.custom<Origin>()),
    units: z.record(z.string(), z.string()),
  }),
);

const storedSchema = z.object({
  version: z.number().int(),
  base: z.unknown(),
  inForce: z.unknown(),
  /** Numbers that were refused, by path. */
  refused: z.record(z.string(), z.number()),
  unread: z.record(z.string(), z.object({ text: z.string(), message: z.string() })),
  units: z.record(z.string(), z.string()),
  /** Terms that are switched off, now and in the version below. */
  off: switchedOff,
  baseOff: switchedOff,
});

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
  const stored: z.input<typeof storedSchema> = {
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

/** The draft left behind, or null where there is none or it cannot be read. */
export function readLocal(accountId: string, scenarioId: string): LocalDraft | null {
  try {
    const text = localStorage.getItem(keyOf(accountId, scenarioId));
    const stored = text === null ? null : storedSchema.parse(JSON.parse(text));
    return stored && restored(stored);
  } catch {
    return null;
  }
}

function restored(stored: z.output<typeof storedSchema>): LocalDraft | null {
  const { version, unread, units, off, baseOff } = stored;
  const content = checkScenario(stored.base).scenario;
  const valid = checkScenario(stored.inForce).scenario;
  if (!content || !valid || off.some(({ place, term }) => !checkTerm(place, term).term)) return null;
  const wanted = Object.entries(stored.refused).reduce(
    (scenario, [path, value]) =>
      typeof readPath(scenario, path) === "number" ? writePath(scenario, path, value) : scenario,
    valid,
  );
  return { base: { version, content, switchedOff: baseOff }, inForce: valid, sheet: { wanted, unread, units, off } };
}
