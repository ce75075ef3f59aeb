import { z } from "@restband/solver";

export const emailSchema = z.email().max(254);
/** Length and the common-password list are judged by the service, which can say why. */
export const passwordSchema = z.string().min(1).max(256);
export const personNameSchema = z.string().trim().min(1).max(80);

/** What a person thinks in; which units these mean is a matter of the pages alone. */
export const unitsSchema = z.enum(["millimetre", "metre", "inch"]);

export const accountSchema = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  email: z.string(),
  isAdministrator: z.boolean(),
  units: unitsSchema,
});
export type Account = z.infer<typeof accountSchema>;

export const accountChangeSchema = z.strictObject({ units: unitsSchema });
export const signUpSchema = z.strictObject({ name: personNameSchema, email: emailSchema, password: passwordSchema });
export const signInSchema = z.strictObject({ email: emailSchema, password: passwordSchema });
/** A one-time link, from `npm run create-administrator`. */
export const claimSchema = z.strictObject({
  token: z.string().min(20).max(200),
  name: personNameSchema,
  password: passwordSchema,
});
/** `csrfToken` goes back in the header `X-CSRF-Token` of every unsafe request. */
export const sessionSchema = z.strictObject({ account: accountSchema.nullable(), csrfToken: z.string() });
export type Session = z.infer<typeof sessionSchema>;
