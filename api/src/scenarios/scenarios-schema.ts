import { z, type Scenario } from "@restband/solver";

/** Checked by the solver's own `checkScenario` in the service, which names every faulty field. */
export const scenarioDraftSchema = z.strictObject({ content: z.record(z.string(), z.unknown()) });

export const scenarioSchema = z.strictObject({
  id: z.uuid(),
  projectId: z.uuid(),
  /** Counts saves from 1; goes back as `If-Match: "<version>"`. */
  version: z.number().int(),
  /** A checked scenario in canonical form. */
  content: z.custom<Scenario>((value) => typeof value === "object" && value !== null),
  /** SHA-256 of the canonical text, lower-case hex. */
  digest: z.string(),
  createdAt: z.iso.datetime(),
  updatedAt: z.iso.datetime(),
  updatedBy: z.strictObject({ accountId: z.uuid(), name: z.string() }),
});
export type StoredScenario = z.infer<typeof scenarioSchema>;
