import { createServer, type Server } from "node:http";
import type { AddressInfo } from "node:net";
import { createApp } from "./app.ts";
import { openSeenEnds } from "./chain/seen-ends.ts";
import { readConfig } from "./config.ts";
import { openDatabase } from "./database/database.ts";
import { createLog } from "./middleware/request-log.ts";
import { isReady } from "./readiness.ts";

const GRACE_MILLISECONDS = 5000;

const config = readConfig(process.env);
const log = createLog(config.logLevel);
const database = openDatabase(config.databaseUrl, config.signingKey, openSeenEnds(config.seenEndsFile));

if (!(await isReady(database))) throw new Error("The database lacks migrations: npm start carries them out.");
const server = await listen(createServer(createApp(config, database, log)));
tellStarter({ listening: (server.address() as AddressInfo).port });

process.once("SIGTERM", () => void stop());
process.once("SIGINT", () => void stop());
// The starter is gone: nobody else would ever stop this process.
process.once("disconnect", () => void stop());

function listen(created: Server): Promise<Server> {
  return new Promise((resolve, reject) => {
    created.once("error", reject);
    created.listen(config.port, config.host, () => resolve(created));
  });
}

/** Takes no new connections, lets the open requests finish, then closes the database. */
async function stop(): Promise<void> {
  const closed = new Promise((resolve) => server.close(resolve));
  server.closeIdleConnections();
  const late = setTimeout(() => server.closeAllConnections(), GRACE_MILLISECONDS);
  await closed;
  clearTimeout(late);
  await database.destroy();
  if (process.connected) process.disconnect();
}

/** The process that started this one learns the port; without one nobody is told. */
function tellStarter(message: { listening: number }): void {
  log.info(message, "listening");
  process.send?.(message);
}
