import { checkScenario, checkTerm, z, type Origin, type Term } from "@restband/solver";
import { readPath, writePath } from "../path.ts";
import { localText, type LocalDraft, type StoredDraft } from "./local-draft.ts";

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

const storedSchema: z.ZodType<StoredDraft> = z.object({
  version: z.number().int(),
  base: z.unknown(),
  inForce: z.unknown(),
  refused: z.record(z.string(), z.number()),
  unread: z.record(z.string(), z.object({ text: z.string(), message: z.string() })),
  units: z.record(z.string(), z.string()),
  off: switchedOff,
  baseOff: switchedOff,
});

/** The draft left behind, or null where there is none or it cannot be read. */
export function readLocal(accountId: string, scenarioId: string): LocalDraft | null {
  try {
    const text = localText(accountId, scenarioId);
    return text === null ? null : restored(storedSchema.parse(JSON.parse(text)));
  } catch {
    return null;
  }
}

function restored(stored: StoredDraft): LocalDraft | null {
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
