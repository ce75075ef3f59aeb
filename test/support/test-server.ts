import { createServer } from "node:http";
import type { AddressInfo } from "node:net";
import { createApp } from "../../api/src/app.ts";
import { openSeenEnds } from "../../api/src/chain/seen-ends.ts";
import { type Config, defaultLimits } from "../../api/src/config.ts";
import { type Database, openDatabase } from "../../api/src/database/database.ts";
import { createLog } from "../../api/src/middleware/request-log.ts";
import { Browser } from "./browser.ts";
import { createTestDatabase, testKey } from "./test-database.ts";

export interface TestServer {
  readonly address: string;
  readonly databaseUrl: string;
  /** With the rights of the migrations account. */
  readonly database: Database;
  /** Everything the server has logged so far. */
  readonly log: string[];
  /** A new browser that has been nowhere yet. */
  browser(): Browser;
  stop(): Promise<void>;
}

/** The server on a free port (or the one asked for), with a database of its own unless the settings name one. */
export async function startTestServer(settings: Partial<Config> = {}): Promise<TestServer> {
  const own = settings.databaseUrl ? null : await createTestDatabase();
  const config: Config = {
    port: 0,
    host: "127.0.0.1",
    databaseUrl: own?.url ?? "",
    sessionSecret: "a secret that signs the cookies of tests",
    signingKey: testKey,
    seenEndsFile: null,
    webRoot: null,
    trustProxy: false,
    logLevel: "info",
    ...defaultLimits,
    ...settings,
  };
  const log: string[] = [];
  const database = openDatabase(config.databaseUrl, config.signingKey, openSeenEnds(config.seenEndsFile));
  const server = createServer(createApp(config, database, createLog("info", { write: (line) => void log.push(line) })));
  await new Promise<void>((resolve) => server.listen(config.port, config.host, resolve));
  const address = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  const stop = async () => {
    server.closeAllConnections();
    await new Promise((resolve) => server.close(resolve));
    await database.destroy();
    await own?.drop();
  };
  return {
    address,
    databaseUrl: config.databaseUrl,
    database: own?.database ?? database,
    log,
    browser: () => new Browser(address),
    stop,
  };
}
