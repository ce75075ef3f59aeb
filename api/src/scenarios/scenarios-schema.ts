import { z, type Scenario } from "@restband/solver";

/** Checked by the solver's own `checkScenario` in the service, which names every faulty field. */
const draftContent = z.record(z.string(), z.unknown());

export const scenarioDraftSchema = z.strictObject({ content: draftContent });

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
  createdAt: z.iso.datetime(),
  updatedAt: z.iso.datetime(),
  updatedBy: savedBy,
});
export type StoredScenario = z.infer<typeof scenarioSchema>;

/** What a list tells of a scenario: all but its content. */
export const scenarioSummarySchema = scenarioSchema
  .pick({ id: true, version: true, digest: true, updatedAt: true, updatedBy: true })
  .extend({
    title: z.string(),
    purpose: z.string(),
    /** When it was put away, null for one in use. */
    archivedAt: z.iso.datetime().nullable(),
  });
export type ScenarioSummary = z.infer<typeof scenarioSummarySchema>;

/** The content of one of several scenarios asked for together. */
export const contentSchema = scenarioSchema.pick({ id: true, digest: true, content: true });
