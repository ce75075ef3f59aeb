import { createHash } from "node:crypto";
import type { Request, RequestHandler } from "express";
import { RateLimiterMySQL, RateLimiterRes } from "rate-limiter-flexible";
import type { Allowance, Config } from "../config.ts";
import { type Database, databaseNameOf } from "../database/database.ts";
import { Refusal } from "../errors.ts";

export type Throttle = ReturnType<typeof createThrottle>;

/**
 * Counts attempts in the database, so that several server processes count together. Keys are digests: the table holds
 * neither mail addresses nor addresses of origin.
 */
export function createThrottle(database: Database, config: Config) {
  const limiter = (name: string, { attempts, seconds }: Allowance) =>
    new RateLimiterMySQL({
      storeClient: database,
      storeType: "knex",
      dbName: databaseNameOf(config.databaseUrl),
      tableName: "throttles",
      tableCreated: true,
      keyPrefix: name,
      points: attempts,
      duration: seconds,
    });
  const byAccount = limiter("account", config.throttle.account);
  const byOrigin = limiter("origin", config.throttle.origin);

  return {
    /** Counts an attempt from the request's address of origin; too many are refused with the wait. */
    countOrigin: (async (request, _response, next) => {
      await count(byOrigin, originOf(request));
      next();
    }) satisfies RequestHandler,

    /** Counts an attempt to sign in to an account, before anything is compared, so that parallel tries count as well. */
    countAccount: (email: string) => count(byAccount, email),

    /** A right password clears what was counted against the account and takes back what its origin was charged. */
    async forgive(email: string, request: Request): Promise<void> {
      await byAccount.delete(keyOf(email));
      await byOrigin.reward(keyOf(originOf(request)), 1);
    },
  };
}

async function count(limiter: RateLimiterMySQL, value: string): Promise<void> {
  try {
    await limiter.consume(keyOf(value));
  } catch (reason) {
    if (!(reason instanceof RateLimiterRes)) throw reason;
    throw tooMany(Math.ceil(reason.msBeforeNext / 1000));
  }
}

function tooMany(seconds: number): Refusal {
  const wait = seconds < 60 ? `${seconds} s` : `${Math.ceil(seconds / 60)} min`;
  return new Refusal(
    429,
    "too-many-attempts",
    `Too many attempts. Wait ${wait}; the right password works again then.`,
    {
      retryAfterSeconds: seconds,
    },
  );
}

function keyOf(value: string): string {
  return createHash("sha256").update(value).digest("hex");
}

/** The address itself, of IPv6 its first half: one customer commonly holds all of the rest. */
function originOf(request: Request): string {
  const address = request.ip ?? "unknown";
  return address.includes(":") && !address.includes(".") ? address.split(":").slice(0, 4).join(":") : address;
}
