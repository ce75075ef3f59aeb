import { migrations } from "../../migrations/index.ts";
import type { ChainService } from "./chain/chain-service.ts";
import type { Database } from "./database/database.ts";

/** True once the database answers and has every migration this server was built with. */
export async function isReady(database: Database): Promise<boolean> {
  const rows = await database<{ name: string }>("knex_migrations").select("name");
  const done = new Set(rows.map((row) => row.name));
  return migrations.every(({ name }) => done.has(name));
}

/** Rows named at most; their number is told whatever it is. */
const MOST = 100;

/** Whether the server can do its work, and how the trails stand that it keeps: which row of which project is broken. */
export async function readinessOf(database: Database, chain: ChainService, { isDeep }: { isDeep: boolean }) {
  if (!(await isReady(database))) return { ready: false };
  const { checkedAt, rows, faults } = await chain.readAll({ isFresh: isDeep });
  const isWhole = faults.length === 0;
  return {
    ready: isWhole,
    chain: {
      isWhole,
      checkedAt: checkedAt.toISOString(),
      rows,
      faultCount: faults.length,
      faults: faults.slice(0, MOST),
      fingerprint: chain.fingerprint(),
      isGuarded: await chain.isGuarded(),
    },
  };
}
