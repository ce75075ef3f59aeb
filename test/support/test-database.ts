import { randomBytes } from "node:crypto";
import { inject } from "vitest";
import { type Database, openDatabase } from "../../api/src/database/database.ts";
import { openSigningKey } from "../../api/src/chain/signing-key.ts";
import { grantToServer } from "../../api/src/database/grants.ts";
import { migrateUp } from "../../api/src/database/migrate.ts";
import { signHeads } from "../../api/src/chain/chain.ts";

/** What signs in tests; anybody may know it. */
export const testKey = openSigningKey("MC4CAQAwBQYDK2VwBCIEIHJlc3RiYW5kIHRlc3RzIHNpZ24gd2l0aCB0aGlzIDMy");

export interface TestDatabase {
  /** The account of the server, with its rights alone. */
  readonly url: string;
  /** The migrations account, to look at and change anything. */
  readonly database: Database;
  readonly migrationsUrl: string;
  drop(): Promise<void>;
}

/** A new, migrated database with accounts of its own, on the run's server. */
export async function createTestDatabase({ isMigrated = true } = {}): Promise<TestDatabase> {
  const name = `test_${randomBytes(6).toString("hex")}`;
  const account = `'${name}'@'127.0.0.1'`;
  const root = openDatabase(urlOf({ database: "mysql" }));
  await root.raw(`CREATE DATABASE ${name} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
  await root.raw(`CREATE USER ${account} IDENTIFIED BY 'only for tests'`);
  const migrationsUrl = urlOf({ database: name });
  const database = openDatabase(migrationsUrl, testKey);
  if (isMigrated) {
    await migrateUp(database);
    await signHeads(database);
    await grantToServer(database, account);
  }
  const drop = async () => {
    await database.destroy();
    await root.raw(`DROP DATABASE ${name}`);
    await root.raw(`DROP USER ${account}`);
    await root.destroy();
  };
  return { url: urlOf({ database: name, account: name, password: "only for tests" }), database, migrationsUrl, drop };
}

function urlOf({ database, account, password }: { database: string; account?: string; password?: string }): string {
  const url = new URL(inject("databaseRootUrl"));
  url.pathname = `/${database}`;
  if (account) url.username = account;
  if (password) url.password = password;
  return url.href;
}
