import { z } from "@restband/solver";
import { addresses } from "../addresses.ts";
import { personSchema } from "../revisions/revisions-schema.ts";

/**
 * Something that waits for a person. `review-asked` waits until the revision is decided; the others until it was looked at.
 */
export const noticeSchema = z.strictObject({
  id: z.uuid(),
  kind: z.enum(["review-asked", "mentioned", "answered", "commented", "accepted", "returned", "withdrawn"]),
  at: z.iso.datetime(),
  by: personSchema,
  project: z.strictObject({ id: z.uuid(), name: z.string() }),
  revision: z.strictObject({ id: z.uuid(), number: z.number().int(), scenarioId: z.uuid(), title: z.string() }),
  commentId: z.uuid().nullable(),
});
export type Notice = z.infer<typeof noticeSchema>;

export const noticesContract = {
  /** What waits for the asking person in all their projects, newest first. */
  listNotices: { ...addresses.listNotices, status: 200, response: z.array(noticeSchema) },
  /** Puts away a notice of one's own; that of anybody else, or none, is left as it is and nothing is said of it. */
  closeNotice: {
    ...addresses.closeNotice,
    params: z.strictObject({ noticeId: z.uuid() }),
    status: 204,
  },
} as const;
