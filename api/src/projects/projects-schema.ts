import { z } from "@restband/solver";
import { roleSchema } from "../members/members-schema.ts";

export const projectDraftSchema = z.strictObject({
  name: z.string().trim().min(1).max(120),
  description: z.string().trim().max(2000),
});

export const projectSchema = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  description: z.string(),
  /** The asking person's own role. */
  role: roleSchema,
  /** Of those in use: archived ones do not count. */
  scenarioCount: z.number().int(),
  createdAt: z.iso.datetime(),
  updatedAt: z.iso.datetime(),
  /** When it was archived, null for a project in use. An archived one is read as before; nothing in it changes. */
  archivedAt: z.iso.datetime().nullable(),
});
export type Project = z.infer<typeof projectSchema>;
