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
  scenarioCount: z.number().int(),
  createdAt: z.iso.datetime(),
  updatedAt: z.iso.datetime(),
});
export type Project = z.infer<typeof projectSchema>;
