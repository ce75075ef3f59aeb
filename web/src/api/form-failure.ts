import type { FieldValues, Path, UseFormSetError } from "react-hook-form";
import { ApiFailure } from "./api-failure.ts";

/**
 * Puts each fault the server names at its field and returns the sentence that belongs to none of them, or null. What
 * was typed stays as it is.
 */
export function showFailure<Values extends FieldValues>(
  error: unknown,
  fields: readonly Path<Values>[],
  setError: UseFormSetError<Values>,
): string | null {
  if (!(error instanceof ApiFailure)) return "This page has failed at it. Nothing was sent; try again.";
  const known = error.fields.filter(({ path }) => (fields as readonly string[]).includes(path));
  known.forEach(({ path, message }, index) => {
    setError(path as Path<Values>, { message }, { shouldFocus: index === 0 });
  });
  return known.length > 0 && known.length === error.fields.length ? null : error.message;
}
