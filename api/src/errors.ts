import type { Failure } from "./contract.ts";

export type FieldFault = Failure["fields"][number];

/** A failure the person can act on: everything the error handler needs to answer it. Anything else thrown is a 500. */
export class Refusal extends Error {
  readonly status: number;
  readonly code: string;
  readonly fields: readonly FieldFault[];
  readonly current: Failure["current"];
  readonly retryAfterSeconds: number | undefined;

  constructor(
    status: number,
    code: string,
    message: string,
    more: { fields?: readonly FieldFault[]; current?: Failure["current"]; retryAfterSeconds?: number } = {},
  ) {
    super(message);
    this.name = "Refusal";
    this.status = status;
    this.code = code;
    this.fields = more.fields ?? [];
    this.current = more.current;
    this.retryAfterSeconds = more.retryAfterSeconds;
  }
}

export const notSignedIn = () => new Refusal(401, "not-signed-in", "Sign in to go on.");

/** Said alike of what does not exist and of what the asking person may not know of. */
export const notFound = () => new Refusal(404, "not-found", "There is nothing at this address.");

export const notAllowed = (message: string) => new Refusal(403, "not-allowed", message);

/** What is archived is read as before, but not changed. */
export const archived = (what: "project" | "scenario") =>
  new Refusal(409, "archived", `The ${what} is archived: nothing in it changes until it is restored.`);

/** One or more fields of the request are not as the contract says. */
export const badRequest = (fields: readonly FieldFault[]) =>
  new Refusal(400, "bad-request", `${countOf(fields)} to put right.`, { fields });

/** The request is well formed, its content is refused. */
export const refusedContent = (code: string, fields: readonly FieldFault[]) =>
  new Refusal(422, code, `${countOf(fields)} to put right.`, { fields });

function countOf(fields: readonly FieldFault[]): string {
  return fields.length === 1 ? "1 field" : `${fields.length} fields`;
}

/** The database does not answer; `Retry-After` says when to try again. */
export const databaseGone = () =>
  new Refusal(503, "database-gone", "The database does not answer just now. What you typed stays; it is tried again.", {
    retryAfterSeconds: 2,
  });
