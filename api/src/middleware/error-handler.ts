import type { ErrorRequestHandler, RequestHandler, Response } from "express";
import type { Logger } from "pino";
import type { Failure } from "../contract.ts";
import { isDatabaseGone } from "../database/database-errors.ts";
import { databaseGone, notFound, Refusal } from "../errors.ts";
import { requestIdOf } from "./request-log.ts";

/** For every address under `/api` that is no route. */
export const noSuchRoute: RequestHandler = () => {
  throw notFound();
};

/** The one place where failures become answers: `{error: {code, message, fields}}`. */
export function errorHandler(log: Logger): ErrorRequestHandler {
  return (error: unknown, _request, response, next) => {
    const refusal = refusalOf(error);
    if (!refusal || refusal.status >= 500) log.error({ err: error, id: requestIdOf(response) }, "request failed");
    // The answer is on its way already: only the connection is left to be closed.
    if (response.headersSent) return next(error);
    answer(response, refusal ?? unexpected(requestIdOf(response)));
  };
}

function answer(response: Response, { status, retryAfterSeconds, code, message, fields, current }: Refusal): void {
  if (retryAfterSeconds !== undefined) response.set("Retry-After", String(retryAfterSeconds));
  const error: Failure = { code, message, fields: [...fields], ...(current && { current }) };
  response.status(status).json({ error });
}

function refusalOf(error: unknown): Refusal | null {
  if (error instanceof Refusal) return error;
  if (isDatabaseGone(error)) return databaseGone();
  return malformed(error);
}

/** What express and its body parser throw about a request that is not even well formed. */
function malformed(error: unknown): Refusal | null {
  const { type, status, limit = 0 } = Object(error) as { type?: string; status?: number; limit?: number };
  if (type === "entity.parse.failed") return new Refusal(400, "not-json", "The body is no JSON.");
  if (type === "entity.too.large") {
    return new Refusal(413, "too-large", `The body is larger than ${Math.round(limit / 2 ** 20)} MB.`);
  }
  const isTheirs = status !== undefined && status >= 400 && status < 500;
  return isTheirs ? new Refusal(status, "bad-request", "The request is not well formed.") : null;
}

function unexpected(id: string): Refusal {
  return new Refusal(500, "internal", `Something failed here that should not. It is logged under ${id}.`);
}
