import { csrfSync } from "csrf-sync";
import type { Request, RequestHandler } from "express";
import { Refusal } from "../errors.ts";

const tokens = csrfSync({ size: 32 });

/** The session's token, made at first need; the page sends it back in `X-CSRF-Token`. */
export const csrfTokenOf = (request: Request): string => tokens.generateToken(request);

/** Lets a request that changes something through only from our own pages and with the session's token. */
export const csrf: RequestHandler = (request, _response, next) => {
  if (["GET", "HEAD", "OPTIONS"].includes(request.method)) return next();
  if (!isSameOrigin(request)) {
    throw new Refusal(403, "cross-origin", "Changes are taken only from Restband's own pages.");
  }
  if (!tokens.isRequestValid(request)) {
    throw new Refusal(
      403,
      "csrf-token",
      "The session has changed since this page was opened. Read it again and repeat.",
    );
  }
  next();
};

/** Browsers always send one of the two headers; a script sends `Origin` itself. */
function isSameOrigin(request: Request): boolean {
  const site = request.get("Sec-Fetch-Site");
  const origin = request.get("Origin");
  if (site === undefined && origin === undefined) return false;
  if (site !== undefined && site !== "same-origin") return false;
  return origin === undefined || hostOf(origin) === request.host;
}

function hostOf(origin: string): string | null {
  return URL.canParse(origin) ? new URL(origin).host : null;
}
