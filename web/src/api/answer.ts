import type { Failure } from "@restband/api/contract";
import { ApiFailure } from "./api-failure.ts";

/*
 * What the page reads of answers before it knows what they are. By hand, since the contract's schemas would have to be
 * loaded before the first call; the server holds every answer against them before it sends it.
 */

/** Statuses of success that come without a body. */
const EMPTY = [202, 204];

/** Why an answer is a failure: refused, or no answer of ours at all; null for one that can be taken. */
export function failureOf(status: number, answer: unknown): ApiFailure | null {
  if (status >= 200 && status < 300)
    return answer !== undefined || EMPTY.includes(status)
      ? null
      : new ApiFailure(status, {
          code: "unexplained",
          message: "What came is no answer of Restband's, or was cut off. Try again.",
        });
  const told = isObject(answer) ? refusalIn(answer.error) : null;
  if (told) return new ApiFailure(status, told);
  const message =
    status >= 500 ? "The server has failed at this. Nothing was saved; try again." : "The server refuses this.";
  return new ApiFailure(status, { code: "unexplained", message });
}

/** The token of a session, where the answer is one. */
export const tokenIn = (answer: unknown): string | null =>
  isObject(answer) && "account" in answer && typeof answer.csrfToken === "string" ? answer.csrfToken : null;

function refusalIn(error: unknown): Failure | null {
  if (!isObject(error)) return null;
  const { code, message, fields, current } = error;
  if (typeof code !== "string" || typeof message !== "string" || !Array.isArray(fields)) return null;
  if (!fields.every(isField) || !(current === undefined || isVersion(current))) return null;
  return { code, message, fields, current };
}

const isField = (field: unknown): field is Failure["fields"][number] =>
  isObject(field) && typeof field.path === "string" && typeof field.message === "string";

/** The version now stored, sent with a save that came too late. */
const isVersion = (value: unknown): value is NonNullable<Failure["current"]> =>
  isObject(value) && typeof value.version === "number" && isObject(value.content) && isObject(value.updatedBy);

const isObject = (value: unknown): value is Record<string, unknown> =>
  typeof value === "object" && value !== null && !Array.isArray(value);
