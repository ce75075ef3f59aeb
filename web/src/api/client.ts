import { addresses, type Address, type RouteName } from "@restband/api/addresses";
import type { routes } from "@restband/api/contract";
import type { z } from "@restband/solver";
import { failureOf, tokenIn } from "./answer.ts";
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

// Keys of requests that got no answer: sent again, they are the same request, which the server does once.
const unanswered = new Map<string, string>();

/**
 * Calls a route of the server by its name and returns its answer.
 * @throws {ApiFailure} whatever goes wrong: refused, not found, signed out, no server, an answer that cannot be read.
 */
export async function call<Name extends RouteName>(name: Name, input: Input<Name>): Promise<Answer<Name>> {
  const given: AnyInput = input;
  try {
    return (await sendOnce(addresses[name], given)) as Answer<Name>;
  } catch (error) {
    // Another tab signed in anew: the token is stale, nothing was done yet, once more with the new one.
    if (!(error instanceof ApiFailure && error.code === "csrf-token")) throw error;
    csrfToken = null;
    return (await sendOnce(addresses[name], given)) as Answer<Name>;
  }
}

/** Sends a request; what adds something has a key, the same one again where its answer was lost. Passwords are kept nowhere. */
async function sendOnce(route: Address, input: AnyInput): Promise<unknown> {
  if (route.method !== "POST" || "password" in Object(input.body)) return send(route, input);
  const request = JSON.stringify([urlOf(route, input), input.version, input.body]);
  const key = unanswered.get(request) ?? newKey();
  unanswered.set(request, key);
  try {
    const answer = await send(route, input, key);
    unanswered.delete(request);
    return answer;
  } catch (error) {
    if (error instanceof ApiFailure && !error.isUnreachable && error.code !== "under-way") unanswered.delete(request);
    throw error;
  }
}

/** 128 random bits; also where the page is not served over a secure connection. */
const newKey = (): string =>
  Array.from(crypto.getRandomValues(new Uint8Array(16)), (byte) => byte.toString(16).padStart(2, "0")).join("");

async function send(route: Address, input: AnyInput, key?: string): Promise<unknown> {
  const isUnsafe = route.method !== "GET";
  if (isUnsafe && csrfToken === null) await send(addresses.readSession, { signal: input.signal });
  const response = await reach(urlOf(route, input), {
    method: route.method,
    headers: { ...headers(input, isUnsafe), ...(key && { "Idempotency-Key": key }) },
    body: input.body === undefined ? undefined : JSON.stringify(input.body),
    signal: input.signal,
    credentials: "same-origin",
  });
  const answer = await read(response);
  const failure = failureOf(response.status, answer);
  if (failure) throw failure;
  csrfToken = tokenIn(answer) ?? csrfToken;
  return answer;
}

function urlOf({ path }: Address, { params = {}, query }: AnyInput): string {
  const filled = path.replace(/:(\w+)/gu, (_, key: string) => encodeURIComponent(params[key]));
  const asked = new URLSearchParams(query).toString();
  return `/api${filled}${asked && `?${asked}`}`;
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

/** Forgets the session's token and what it has asked: for tests, and when a session has ended. */
export function forgetToken(): void {
  csrfToken = null;
  unanswered.clear();
}
