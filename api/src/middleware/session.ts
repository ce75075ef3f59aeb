import type { Request, RequestHandler } from "express";
import expressSession from "express-session";
import type { Logger } from "pino";
import type { Config } from "../config.ts";
import type { Database } from "../database/database.ts";
import { DatabaseSessions } from "./database-sessions.ts";

declare module "express-session" {
  interface SessionData {
    /** Who is signed in; absent before. */
    accountId?: string;
    /** Milliseconds since 1970. */
    signedInAt?: number;
    seenAt?: number;
    csrfToken?: string;
    /** True once the store has it. */
    isStored?: boolean;
  }
}

/** The browser's session: opaque random id (192 bits) in a cookie that scripts cannot read, everything else in the database. */
export function session(database: Database, config: Config, log: Logger): RequestHandler[] {
  const store = new DatabaseSessions(database, (error) => log.warn({ err: error }, "sessions not cleaned up"));
  const load = expressSession({
    name: "restband",
    secret: config.sessionSecret,
    store,
    resave: false,
    saveUninitialized: false,
    cookie: { httpOnly: true, sameSite: "lax", secure: "auto", maxAge: config.session.idleSeconds * 1000 },
  });
  return [load, ageSession(config.session)];
}

/** Ends a session that has lasted too long; marks one in use as seen, at most once a minute, which pushes its end out. */
function ageSession({ idleSeconds, absoluteSeconds }: Config["session"]): RequestHandler {
  const seenEvery = Math.min(60, idleSeconds / 10) * 1000;
  return async (request, _response, next) => {
    const { signedInAt = 0, seenAt = 0, accountId } = request.session;
    const now = Date.now();
    if (accountId && now - signedInAt > absoluteSeconds * 1000) await renew(request);
    else if (accountId && now - seenAt > seenEvery) request.session.seenAt = now;
    next();
  };
}

/** Signs an account in under a new session id, and returns once the database has it. */
export async function openSession(request: Request, accountId: string): Promise<void> {
  await renew(request);
  Object.assign(request.session, { accountId, signedInAt: Date.now(), seenAt: Date.now() });
  await saveSession(request);
}

/** Ends the session for good: its cookie is worth nothing from now on. */
export const closeSession = (request: Request): Promise<void> => settled((done) => request.session.destroy(done));

/** Returns once the database has the session. */
export const saveSession = (request: Request): Promise<void> => settled((done) => request.session.save(done));

const renew = (request: Request): Promise<void> => settled((done) => request.session.regenerate(done));

function settled(begin: (done: (error?: Error) => void) => void): Promise<void> {
  return new Promise((resolve, reject) => begin((error) => (error ? reject(error) : resolve())));
}
