import { z } from "@restband/solver";

/** What to list of a trail: a page of it, newest first, of what fits all that is given. */
export const activityQuerySchema = z.strictObject({
  /** The acts older than this one. */
  before: z
    .string()
    .regex(/^[0-9]{1,15}$/)
    .optional(),
  /** What they are about: "scenario", "revision", "comment" and the like, the first word of the act. */
  about: z
    .string()
    .regex(/^[a-z]{1,20}$/)
    .optional(),
  /** Whose they are. */
  by: z.uuid().optional(),
  /** The scenario they were done to, its revisions and comments too. */
  scenarioId: z.uuid().optional(),
  /** Not before, and before. */
  from: z.iso.datetime().optional(),
  to: z.iso.datetime().optional(),
});
export type ActivityQuery = z.infer<typeof activityQuerySchema>;

/** One act of a project's trail. Times are the server's. */
export const activitySchema = z.strictObject({
  /** Rises with each act; the oldest of a page, given as `before`, asks for the page before it. */
  id: z.number().int(),
  at: z.iso.datetime(),
  by: z.strictObject({ accountId: z.uuid(), name: z.string() }),
  /** "scenario.saved" and the like. */
  act: z.string(),
  /** The scenario or member it was done to; `isThere` where it still is in this project. */
  subject: z.strictObject({ id: z.uuid(), name: z.string(), isThere: z.boolean() }).nullable(),
  detail: z.record(z.string(), z.union([z.string(), z.number()])),
});
export type ActivityEntry = z.infer<typeof activitySchema>;
