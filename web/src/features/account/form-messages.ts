import { zodResolver } from "@hookform/resolvers/zod";
import type { z } from "@restband/solver";
import type { FieldValues, Resolver } from "react-hook-form";

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
