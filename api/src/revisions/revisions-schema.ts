import { z, type Result, type Scenario } from "@restband/solver";
import { addresses } from "../addresses.ts";

/** Somebody as a list names them. */
export const personSchema = z.strictObject({ accountId: z.uuid(), name: z.string() });

/** The units a revision is read in for good: the choice of who froze it. */
export const displayUnitsSchema = z.enum(["millimetre", "metre", "inch"]);

/** A revision keeps so many events, the first ones; how many there were it always keeps. */
export const mostKeptEvents = 2000;

const event = z.strictObject({
  t: z.number(),
  kind: z.enum(["start", "break-away", "stop", "turn", "end"]),
  x: z.number(),
  v: z.number(),
  f: z.number(),
});

const limitVerdict = z.strictObject({
  quantity: z.string().max(60),
  min: z.number().optional(),
  max: z.number().optional(),
  value: z.number().nullable(),
  kept: z.boolean().nullable(),
  margin: z.number().nullable(),
  reason: z.string().max(500).optional(),
});

const note = z.strictObject({
  code: z.enum([
    "contact-lost",
    "steady-state-depends-on-start",
    "next-break-away",
    "solid-steady-only",
    "one-sided-limit",
  ]),
  message: z.string().max(500),
  t: z.number().optional(),
});

const energy = z.strictObject({
  workForce: z.number(),
  workBase: z.number(),
  workWeight: z.number(),
  workCounterface: z.number(),
  heatContact: z.number(),
  heatViscous: z.number(),
  heatSolid: z.number(),
  changeKinetic: z.number(),
  changeStored: z.number(),
  residual: z.number(),
});

/** A `restband-result/1` without samples, with its first events: what is sent to freeze, and what a revision keeps. */
export const keptResultSchema = z.strictObject({
  format: z.literal("restband-result/1"),
  method: z.enum(["exact", "adaptive"]),
  solverVersion: z.string().max(40),
  ended: z.enum(["rest", "time", "max-events", "max-work", "cancelled"]),
  outcome: z
    .enum([
      "never-moved",
      "came-to-rest",
      "too-short",
      "growing",
      "stick-slip",
      "settles",
      "not-settled",
      "smooth-sliding",
    ])
    .nullable(),
  notes: z.array(note).max(100),
  events: z.array(event).max(mostKeptEvents),
  /** Of the whole run, `start` and `end` counted. */
  eventCount: z.number().int().min(0),
  limits: z.array(limitVerdict).max(100),
  quantities: z.record(z.string().max(60), z.number().nullable()),
  energy,
});
export type KeptResult = z.infer<typeof keptResultSchema>;

/** What is kept of a run that was computed with its events and its ledger. */
export function keptResultOf({ samples: _samples, at: _at, energy, ...result }: Result): KeptResult {
  if (!energy) throw new Error("A result is kept with its energy ledger.");
  return { ...result, energy, events: result.events.slice(0, mostKeptEvents), eventCount: result.events.length };
}

/** A kept result as the solver's own comparisons take it. */
export function resultOf({ eventCount: _count, ...kept }: KeptResult): Result {
  return { ...kept, samples: null };
}

/** A run drawn small, as the solver's `traceOf` has it. */
export const traceSchema = z.strictObject({
  t: z.array(z.number()),
  x: z.array(z.number()),
  v: z.array(z.number()),
  f: z.array(z.number()),
  phase: z.array(z.number()),
});
export type Trace = z.infer<typeof traceSchema>;

const mostTraceText = 65_536;

/**
 * The scenario's canonical text is the server's copy of the version named by `If-Match`; the rest is the page's. `trace` is
 * kept only where the server's own run takes too long.
 */
export const freezeSchema = z.strictObject({
  digest: z.string().regex(/^[0-9a-f]{64}$/),
  units: displayUnitsSchema,
  result: keptResultSchema,
  trace: traceSchema.refine((trace) => JSON.stringify(trace).length <= mostTraceText, "At most 64 kB."),
});
export type Freeze = z.infer<typeof freezeSchema>;

/**
 * `open`: frozen, nobody asked. `in-review`: somebody asked. `superseded`: was accepted, and a later one is accepted now.
 */
export const revisionStateSchema = z.enum([
  "open",
  "in-review",
  "accepted",
  "returned",
  "self-checked",
  "superseded",
  "withdrawn",
]);
export type RevisionState = z.infer<typeof revisionStateSchema>;

/** What lists tell of a revision. */
export const revisionSummarySchema = z.strictObject({
  id: z.uuid(),
  projectId: z.uuid(),
  scenarioId: z.uuid(),
  /** Counts the revisions of a scenario from 1. */
  number: z.number().int(),
  title: z.string(),
  /** SHA-256 of the canonical text, lower-case hex. */
  digest: z.string(),
  frozenAt: z.iso.datetime(),
  frozenBy: personSchema,
  state: revisionStateSchema,
  /** The last decision on it, or null. */
  decided: z.strictObject({ by: personSchema, at: z.iso.datetime() }).nullable(),
  outcome: keptResultSchema.shape.outcome,
  limits: z.strictObject({ kept: z.number().int(), of: z.number().int() }),
  solverVersion: z.string(),
  /** False: the server's own run was not done in 20 s; the result is that of who froze it. */
  isRecomputed: z.boolean(),
  asked: z.array(personSchema),
  /** Comments not settled. */
  openComments: z.number().int(),
});
export type RevisionSummary = z.infer<typeof revisionSummarySchema>;

const frozenContent = z.custom<Scenario>((value) => typeof value === "object" && value !== null);

export const revisionSchema = revisionSummarySchema.extend({
  content: frozenContent,
  /** The canonical text, byte for byte: what the digest is of. */
  text: z.string(),
  /** The version of the working copy it was frozen from. */
  scenarioVersion: z.number().int(),
  units: displayUnitsSchema,
  result: keptResultSchema,
  trace: traceSchema,
  /** True where inputs moved by 1e-12 move the run as much as server and page were apart. */
  isSensitive: z.boolean(),
  /** Paths of the values of which nobody has said where they come from. */
  withoutOrigin: z.array(z.string()),
  /** Whose own it is: who froze it or saved a change in it since the last accepted revision. None of them decides on it. */
  authors: z.array(personSchema),
  /** What does not fit: of the text and its digest, of the row and its hash or signature. Empty for a revision as it was frozen. */
  faults: z.array(z.string()),
});
export type Revision = z.infer<typeof revisionSchema>;

const deviation = z.strictObject({
  what: z.string().max(60),
  event: z.number().int().optional(),
  values: z.tuple([z.number(), z.number()]),
  absolute: z.number(),
  relative: z.number(),
});

/**
 * What a replay came to. `same-method`: as frozen. `other-method`: exact and adaptive against each other. `tolerances`: where
 * only the adaptive method applies, with a wider and a narrower tolerance. `script`: the file for Python, its figures
 * brought back by hand.
 */
export const replayDraftSchema = z.strictObject({
  way: z.enum(["same-method", "other-method", "tolerances", "script"]),
  solverVersion: z.string().max(40),
  verdict: z.enum(["agrees", "differs", "sensitive"]),
  /** The share of the run's peak that a value may be apart. */
  allowed: z.number().min(0).max(1e-6),
  differences: z.array(z.string().max(500)).max(50),
  /** The largest of each quantity and of each column of the events, relative to the run's peak in that unit. */
  deviations: z.array(deviation).max(100),
  /** Of `tolerances`: how far each was from the frozen run at most. */
  convergence: z.array(z.strictObject({ tolerance: z.number().positive(), relative: z.number().min(0) })).max(8),
});
export type ReplayDraft = z.infer<typeof replayDraftSchema>;

export const replaySchema = replayDraftSchema.extend({
  id: z.uuid(),
  revisionId: z.uuid(),
  by: personSchema,
  at: z.iso.datetime(),
});
export type Replay = z.infer<typeof replaySchema>;

const projectParams = z.strictObject({ projectId: z.uuid() });
export const revisionParams = z.strictObject({ projectId: z.uuid(), revisionId: z.uuid() });

export const revisionsContract = {
  /** Newest first; of one scenario, or of the whole project. */
  listRevisions: {
    ...addresses.listRevisions,
    params: projectParams,
    query: z.strictObject({ scenarioId: z.uuid().optional() }),
    status: 200,
    response: z.array(revisionSummarySchema),
  },
  /** 422 `result-disagrees` where the server's own run says something else; its fields name what. */
  freezeScenario: {
    ...addresses.freezeScenario,
    params: z.strictObject({ projectId: z.uuid(), scenarioId: z.uuid() }),
    body: freezeSchema,
    isOnce: true,
    ifMatch: true,
    status: 201,
    response: revisionSchema,
  },
  readRevision: {
    ...addresses.readRevision,
    params: revisionParams,
    status: 200,
    response: revisionSchema,
  },
  /** Newest first. */
  listReplays: {
    ...addresses.listReplays,
    params: revisionParams,
    status: 200,
    response: z.array(replaySchema),
  },
  keepReplay: {
    ...addresses.keepReplay,
    params: revisionParams,
    body: replayDraftSchema,
    isOnce: true,
    status: 201,
    response: replaySchema,
  },
} as const;
