import { ApiFailure } from "../../api/api-failure.ts";

/** The server's sentence at one field of a form; undefined where it has none. */
export function faultAt(error: Error | null, path: string): string | undefined {
  return error instanceof ApiFailure ? error.fields.find((field) => field.path === path)?.message : undefined;
}

/** What belongs to none of the form's own fields; null where all of it stands at them. */
export function otherFault(error: Error | null, paths: readonly string[]): string | null {
  if (!error) return null;
  const fields = error instanceof ApiFailure ? error.fields : [];
  const others = fields.filter(({ path }) => !paths.includes(path));
  if (fields.length > 0 && others.length === 0) return null;
  return [error.message, ...others.map(({ message }) => message)].join(" ");
}
