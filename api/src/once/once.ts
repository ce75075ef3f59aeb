import type { IncomingMessage } from "node:http";
import type { Request } from "express";
import type { Database } from "../database/database.ts";
import { isRolledBack } from "../database/database-errors.ts";
import { badRequest, Refusal } from "../errors.ts";
import { sha256Of } from "../sha256.ts";
import { deleteKey, findKey, insertKey, type Keyed, updateKey } from "./once-store.ts";

/** Longer answers are not kept: a repeated request then learns only that it was done. */
const LONGEST_ANSWER = 1_000_000;

/** What a route does, and what it answers, as text; null for nothing. */
export type Act = () => Promise<string | null>;

/**
 * Does what a request asks for once, however often it is sent with the same `Idempotency-Key`: for 24 hours the first answer
 * is given again. What was refused has done nothing and may be tried again. A request without a key is done each time.
 */
export type Once = (request: Request, accountId: string, status: number, act: Act) => Promise<string | null>;

export function createOnce(database: Database): Once {
  return async (request, accountId, status, act) => {
    const key = keyOf(request);
    if (key === null) return act();
    const keyed = { accountId, key };
    const asked = digestOf(request);
    if (!(await insertKey(database, keyed, asked))) return firstAnswer(database, keyed, asked);
    const answer = await actOrForget(database, keyed, act);
    const isKept = answer === null || answer.length <= LONGEST_ANSWER;
    await updateKey(database, keyed, { status, answer: isKept ? answer : null });
    return answer;
  };
}

/** @throws Refusal 422 for another request under the same key, 409 where its answer is not to be had */
async function firstAnswer(database: Database, keyed: Keyed, asked: Buffer): Promise<string> {
  const known = await findKey(database, keyed);
  if (known && !known.requestDigest.equals(asked)) throw otherRequest();
  if (!known || known.status === null) throw underWay();
  if (known.answer === null) throw doneAlready();
  return known.answer;
}

async function actOrForget(database: Database, keyed: Keyed, act: Act): Promise<string | null> {
  try {
    return await act();
  } catch (error) {
    // Of anything else nobody can say whether it was done: the key stays, rather refused than done twice.
    if (error instanceof Refusal || isRolledBack(error)) await deleteKey(database, keyed);
    throw error;
  }
}

function keyOf(request: Request): string | null {
  const key = request.get("Idempotency-Key");
  if (key === undefined) return null;
  if (/^[\w-]{16,100}$/.test(key)) return key;
  throw badRequest([{ path: "Idempotency-Key", message: "16 to 100 letters, digits, hyphens or underscores." }]);
}

const bodies = new WeakMap<IncomingMessage, Buffer>();

/** Notes what a body is, byte for byte, for the request that has a key; run by whoever reads the body. */
export function noteBody(request: IncomingMessage, _response: unknown, bytes: Buffer): void {
  if (request.headers["idempotency-key"] !== undefined) bodies.set(request, sha256Of(bytes));
}

function digestOf(request: Request): Buffer {
  const { method, originalUrl, headers } = request;
  const body = bodies.get(request)?.toString("hex") ?? "";
  return sha256Of([method, originalUrl, headers["if-match"] ?? "", body].join("\n"));
}

function otherRequest(): Refusal {
  const message = "This Idempotency-Key belongs to another request. A new request has a new key.";
  return new Refusal(422, "key-reused", message, { fields: [{ path: "Idempotency-Key", message }] });
}

function underWay(): Refusal {
  const message =
    "The same request is under way, or the server stopped in the midst of it. Look whether it was done before it is sent anew.";
  return new Refusal(409, "under-way", message, { retryAfterSeconds: 1 });
}

const doneAlready = () => new Refusal(409, "done-already", "This was done already. Reload the page to see it.");
