import { failureSchema, routes, sessionSchema, type Route, type RouteName } from "@restband/api/contract";
import type { z } from "@restband/solver";
import { ApiFailure, unreachable } from "./api-failure.ts";
import { noteConnection } from "./connection.ts";

type RouteOf<Name extends RouteName> = (typeof routes)[Name];
type Part<R, Key extends string, As extends string> =
  R extends Record<Key, infer Schema extends z.ZodType> ? Record<As, z.input<Schema>> : unknown;

/** What a route asks for: `params` of its path, `body`, `query`, and `version` where it needs `If-Match`. */
export type Input<Name extends RouteName> = Part<RouteOf<Name>, "params", "params"> &
  Part<RouteOf<Name>, "body", "body"> &
  Part<RouteOf<Name>, "query", "query"> &
  (RouteOf<Name> extends { ifMatch: true } ? { version: number } : unknown) & { signal?: AbortSignal };

/** What a route answers; undefined where it has no body. */
export type Answer<Name extends RouteName> =
  RouteOf<Name> extends { response: infer Schema extends z.ZodType } ? z.output<Schema> : undefined;

interface AnyInput {
  params?: Record<string, string>;
  body?: unknown;
  query?: Record<string, string>;
  version?: number;
  signal?: AbortSignal;
}

// The session's own; every answer that holds a session renews it.
let csrfToken: string | null = null;

/**
 * Calls a route of the server by its name and returns its answer.
 * @throws {ApiFailure} whatever goes wrong: refused, not found, signed out, no server.
 */
export async function call<Name extends RouteName>(name: Name, input: Input<Name>): Promise<Answer<Name>> {
  const route: Route = routes[name];
  const given: AnyInput = input;
  try {
    return (await send(route, given)) as Answer<Name>;
  } catch (error) {
    // Another tab signed in anew: the token is stale, nothing was done yet, once more with the new one.
    if (!(error instanceof ApiFailure && error.code === "csrf-token")) throw error;
    csrfToken = null;
    return (await send(route, given)) as Answer<Name>;
  }
}

async function send(route: Route, input: AnyInput): Promise<unknown> {
  const isUnsafe = route.method !== "GET";
  if (isUnsafe && csrfToken === null) await send(routes.readSession, { signal: input.signal });
  const response = await reach(address(route, input), {
    method: route.method,
    headers: headers(input, isUnsafe),
    body: input.body === undefined ? undefined : JSON.stringify(input.body),
    signal: input.signal,
    credentials: "same-origin",
  });
  const answer = await read(response);
  if (!response.ok) throw failure(response.status, answer);
  const session = route.response === sessionSchema ? sessionSchema.safeParse(answer) : null;
  if (session?.success) csrfToken = session.data.csrfToken;
  return answer;
}

function address(route: Route, { params = {}, query }: AnyInput): string {
  const path = route.path.replace(/:(\w+)/gu, (_, key: string) => encodeURIComponent(params[key]));
  return `/api${path}${query ? `?${new URLSearchParams(query)}` : ""}`;
}

function headers({ body, version }: AnyInput, isUnsafe: boolean): Record<string, string> {
  return {
    Accept: "application/json",
    ...(body !== undefined && { "Content-Type": "application/json" }),
    ...(isUnsafe && { "X-CSRF-Token": csrfToken ?? "" }),
    ...(version !== undefined && { "If-Match": `"${version}"` }),
  };
}

async function reach(url: string, init: RequestInit): Promise<Response> {
  try {
    const response = await fetch(url, init);
    noteConnection(response.status < 502 || response.status > 504);
    return response;
  } catch (error) {
    if (init.signal?.aborted) throw error;
    noteConnection(false);
    throw unreachable();
  }
}

/** The body as JSON; undefined for none, or for what is no JSON: a proxy's page, an answer cut off. */
async function read(response: Response): Promise<unknown> {
  const text = await response.text();
  try {
    return text === "" ? undefined : JSON.parse(text);
  } catch {
    return undefined;
  }
}

function failure(status: number, answer: unknown): ApiFailure {
  const told = failureSchema.safeParse(answer);
  if (told.success) return new ApiFailure(status, told.data.error);
  const message =
    status >= 500 ? "The server has failed at this. Nothing was saved; try again." : "The server refuses this.";
  return new ApiFailure(status, { code: "unexplained", message });
}

/** Forgets the session's token: for tests, and when a session has ended. */
export function forgetToken(): void {
  csrfToken = null;
}
