import { randomUUID } from "node:crypto";
import type { ServerResponse } from "node:http";
import { pino, type Logger } from "pino";
import { pinoHttp } from "pino-http";
import { isDatabaseError } from "../database/database-errors.ts";

/** The server's log: one JSON line an event, to the given stream (standard output unless told). */
export function createLog(level: string, stream?: { write(line: string): void }): Logger {
  const options = { level, base: null, serializers: { err: describeError } };
  return stream ? pino(options, stream) : pino(options);
}

/**
 * One line a request, with an id that the answer carries too. Headers, bodies, queries and cookies are left out
 * altogether, so that no password, token or address can slip in.
 */
export function requestLog(log: Logger) {
  return pinoHttp({
    logger: log,
    quietReqLogger: true,
    genReqId: (_request, response) => {
      const id = randomUUID();
      response.setHeader("X-Request-Id", id);
      return id;
    },
    customLogLevel: (_request, response, error) => (error || response.statusCode >= 500 ? "error" : "info"),
    serializers: {
      req: (request: { method: string; url: string }) => ({ method: request.method, path: pathOf(request.url) }),
      res: (response: { statusCode: number }) => ({ status: response.statusCode }),
    },
    customAttributeKeys: { reqId: "id", req: "request", res: "response", responseTime: "milliseconds" },
  });
}

/** The id under which a request is logged. */
export const requestIdOf = (response: ServerResponse): string => String(response.getHeader("X-Request-Id"));

/** Without the query, and without the token of a one-time link. */
function pathOf(url: string): string {
  return url.split("?")[0].replace(/^\/welcome\/.*/, "/welcome/…");
}

/** Messages of the database may hold what people typed: of those only the numbers and the place in the code are kept. */
function describeError(error: unknown) {
  if (!(error instanceof Error)) return { type: typeof error };
  const { code, errno } = error as NodeJS.ErrnoException;
  const stack = error.stack?.split("\n").filter((line) => line.startsWith("    at "));
  return { type: error.name, code, errno, ...(!isDatabaseError(error) && { message: error.message }), stack };
}
