import { setTimeout as sleep } from "node:timers/promises";
import { type Database, seenEndsOf, signingKeyOf } from "../database/database.ts";
import type { ChainFault, Integrity } from "./chain-schema.ts";
import { addedTables, nowhere } from "./chained-tables.ts";
import { type Walk, walkChain } from "./walk.ts";

/** A walk over everything is done again once so many times its own duration has passed. */
const REST = 20;

/** What going through all chains has found. */
export interface WholeWalk {
  readonly checkedAt: Date;
  readonly rows: number;
  readonly faults: readonly ChainFault[];
}

export type ChainService = ReturnType<typeof createChainService>;

/** Tells whether what is only ever added to is as it was written. */
export function createChainService(database: Database) {
  const walkAll = sparing(() => walkEverything(database));
  const walks = new Map<string, Promise<Walk>>();
  let guarded: Promise<boolean> | null = null;

  function walkOnce(projectId: string): Promise<Walk> {
    const walk = walks.get(projectId) ?? walkChain(database, projectId).finally(() => walks.delete(projectId));
    walks.set(projectId, walk);
    return walk;
  }

  /** Tried once: rights of an account do not change under a running server. */
  const isGuarded = () => (guarded ??= refusesChanges(database).catch(forgetGuard));
  const forgetGuard = (error: unknown): never => {
    guarded = null;
    throw error;
  };

  return {
    isGuarded,
    fingerprint: () => signingKeyOf(database).fingerprint,

    /** The chains of all projects. Not older than twenty times what it takes; `isFresh`: as they are now. */
    readAll: ({ isFresh }: { isFresh: boolean }): Promise<WholeWalk> => walkAll(isFresh),

    /** The chain of one project, as it is now; who asks while somebody else does gets the same. */
    async read(projectId: string): Promise<Integrity> {
      const { rows, faults } = await walkOnce(projectId);
      return {
        isWhole: faults.length === 0,
        checkedAt: new Date().toISOString(),
        rows,
        faults: [...faults],
        fingerprint: signingKeyOf(database).fingerprint,
        isGuarded: await isGuarded(),
      };
    },
  };
}

async function walkEverything(database: Database): Promise<WholeWalk> {
  const checkedAt = new Date();
  const projects = await database("projects").select<{ id: string }[]>("id");
  const heads = await database("chains").select<{ project_id: string }[]>("project_id");
  const there = [...projects.map(({ id }) => id), ...heads.map(({ project_id: id }) => id)];
  const ids = new Set([...there, ...seenEndsOf(database).projects(), nowhere]);
  const walks: Walk[] = [];
  for (const id of ids) walks.push(await walkChain(database, id === nowhere ? null : id));
  return {
    checkedAt,
    rows: walks.reduce((sum, { rows }) => sum + rows, 0),
    faults: walks.flatMap(({ faults }) => faults),
  };
}

/**
 * Repeats work only after a rest in proportion to what it took, and never twice at the same time. Who wants it fresh waits at
 * least as long as it took: anybody may ask, and is to take half of the database's time at most.
 */
function sparing<T>(work: () => Promise<T>): (isFresh: boolean) => Promise<T> {
  let running: Promise<T> | null = null;
  let last: { value: T; ended: number; took: number } | null = null;
  const run = async () => {
    if (last) await sleep(last.ended + last.took - performance.now());
    const began = performance.now();
    const value = await work();
    const ended = performance.now();
    last = { value, ended, took: ended - began };
    return value;
  };
  return (isFresh) => {
    if (!isFresh && last && performance.now() < last.ended + REST * last.took) return Promise.resolve(last.value);
    return (running ??= run().finally(() => (running = null)));
  };
}

/** True where the database itself refuses to change what is only ever added to. */
async function refusesChanges(database: Database): Promise<boolean> {
  for (const table of addedTables) {
    for (const statement of ["UPDATE ?? SET project_id = project_id WHERE 1 = 0", "DELETE FROM ?? WHERE 1 = 0"]) {
      if (!(await isDenied(database, statement, table))) return false;
    }
  }
  return true;
}

const DENIED = 1142;

async function isDenied(database: Database, statement: string, table: string): Promise<boolean> {
  try {
    await database.raw(statement, [table]);
    return false;
  } catch (error) {
    if ((error as { errno?: number }).errno === DENIED) return true;
    throw error;
  }
}
