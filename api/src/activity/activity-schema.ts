import { z } from "@restband/solver";

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
