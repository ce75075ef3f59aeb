import { originKinds, z, type Origin, type Scenario, type Term } from "@restband/solver";

/** Checked by the solver's own `checkScenario` in the service, which names every faulty field. */
const draftContent = z.record(z.string(), z.unknown());

/** What a member of a term is called. */
const member = z.string().regex(/^[\w.[\]]{1,80}$/);

const termOrigin: z.ZodType<Origin> = z.strictObject({
  kind: z.enum(originKinds),
  source: z.string().optional(),
  entered: z.string().optional(),
  low: z.number().optional(),
  high: z.number().optional(),
  distribution: z.string().optional(),
  measurement: z.string().optional(),
});

/**
 * A term of force or base that is switched off: the format has no word for that, so it is kept beside the scenario, with
 * what belongs to its members. The solver's `checkTerm` checks the term in the service.
 */
export const switchedOffSchema = z.strictObject({
  place: z.enum(["force", "base"]),
  /** Where it stands among all terms of its place, from 0, those in force counted too. */
  index: z.number().int().min(0).max(999),
  term: z.custom<Term>((value) => typeof value === "object" && value !== null && !Array.isArray(value)),
  origins: z.record(member, termOrigin),
  /** The units its members were last typed in. */
  units: z.record(member, z.string().max(40)),
});
export type SwitchedOff = z.infer<typeof switchedOffSchema>;

const switchedOffs = z.array(switchedOffSchema).max(100);

/** `switchedOff` left out: none for a new scenario, those there are for one that is saved. */
export const scenarioDraftSchema = z.strictObject({ content: draftContent, switchedOff: switchedOffs.optional() });

/** Scenarios made in one request: all of them, or none. */
export const mostCases = 500;
export const casesDraftSchema = z.strictObject({ contents: z.array(draftContent).min(1).max(mostCases) });

/** The copy's title; all else is as in the original. */
export const duplicateSchema = z.strictObject({ title: z.string().max(200) });

export const moveSchema = z.strictObject({ toProjectId: z.uuid() });

/** Ids of up to so many scenarios, with commas between them. */
export const mostContents = 20;
export const scenarioIdsSchema = z.strictObject({
  ids: z
    .string()
    .transform((text) => text.split(","))
    .pipe(z.array(z.uuid()).min(1).max(mostContents)),
});

const savedBy = z.strictObject({ accountId: z.uuid(), name: z.string() });

/** A checked scenario in canonical form. */
const canonicalContent = z.custom<Scenario>((value) => typeof value === "object" && value !== null);

export const scenarioSchema = z.strictObject({
  id: z.uuid(),
  projectId: z.uuid(),
  /** Counts saves from 1; goes back as `If-Match: "<version>"`. */
  version: z.number().int(),
  content: canonicalContent,
  /** SHA-256 of the canonical text, lower-case hex. */
  digest: z.string(),
  switchedOff: switchedOffs,
  createdAt: z.iso.datetime(),
  updatedAt: z.iso.datetime(),
  updatedBy: savedBy,
  /** When it was put away, null for one in use. */
  archivedAt: z.iso.datetime().nullable(),
});
export type StoredScenario = z.infer<typeof scenarioSchema>;

/** What a list tells of a scenario: all but its content. */
export const scenarioSummarySchema = scenarioSchema
  .pick({ id: true, version: true, digest: true, updatedAt: true, updatedBy: true, archivedAt: true })
  .extend({ title: z.string(), purpose: z.string() });
export type ScenarioSummary = z.infer<typeof scenarioSummarySchema>;

/** The content of one of several scenarios asked for together. */
export const contentSchema = scenarioSchema.pick({ id: true, digest: true, content: true });
