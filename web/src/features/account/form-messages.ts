import { zodResolver } from "@hookform/resolvers/zod";
import type { z } from "@restband/solver";
import type { FieldValues, Resolver } from "react-hook-form";

/** What to say of a field of ours, whatever is wrong with it. */
export const nameMessage = "Enter your name, up to 80 characters.";
export const emailMessage = "Enter an e-mail address, as in name@firm.example.";
export const newPasswordMessage = "Enter a password of 12 to 256 characters.";

/** Pasted addresses bring spaces along. */
export const trimmed = (value: string): string => value.trim();

/**
 * Checks a form by the contract's own schema and says our sentences: `messages` has one for each field, whatever is
 * wrong with it.
 */
export function checkedBy<Input extends FieldValues, Output>(
  schema: z.ZodType<Output, Input>,
  messages: Record<string, string>,
): Resolver<Input, unknown, Output> {
  return zodResolver(schema, { error: (issue) => messages[String(issue.path?.[0])] });
}
