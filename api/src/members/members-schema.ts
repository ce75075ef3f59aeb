import { z } from "@restband/solver";
import { emailSchema } from "../accounts/accounts-schema.ts";

export const roles = ["owner", "editor", "reviewer", "reader"] as const;
export const roleSchema = z.enum(roles);
export type Role = z.infer<typeof roleSchema>;

export const memberSchema = z.strictObject({
  accountId: z.uuid(),
  name: z.string(),
  email: z.string(),
  role: roleSchema,
  since: z.iso.datetime(),
});
export type Member = z.infer<typeof memberSchema>;

export const memberAddSchema = z.strictObject({ email: emailSchema, role: roleSchema });
export const memberChangeSchema = z.strictObject({ role: roleSchema });
