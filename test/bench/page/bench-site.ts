import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { type BrowserContext, chromium } from "playwright-core";
import { openDatabaseServer } from "../../../api/scripts/database-server.mjs";
import { openDatabase } from "../../../api/src/database/database.ts";
import { grantToServer } from "../../../api/src/database/grants.ts";
import { migrateUp } from "../../../api/src/database/migrate.ts";
import { launchOptions } from "../../support/chromium.ts";
import { signUp } from "../../support/people.ts";
import { startTestServer } from "../../support/test-server.ts";

type Person = Awaited<ReturnType<typeof signUp>>;

/** The built pages on a server and a database of their own, with somebody signed in to work there. */
export interface BenchSite {
  /** The person as a program: for what a bench needs to be there. */
  readonly person: Person;
  /** A browser of that person's that has been nowhere yet, not even in its cache. */
  visit(): Promise<BrowserContext>;
  close(): Promise<void>;
}

export async function openSite(webRoot: string): Promise<BenchSite> {
  const folder = mkdtempSync(join(tmpdir(), "restband-page-bench-"));
  const databaseServer = await openDatabaseServer(folder, { isThrowAway: true });
  const database = openDatabase(databaseServer.urls.migrations);
  await migrateUp(database);
  await grantToServer(database, databaseServer.grantTo);
  await database.destroy();
  const server = await startTestServer({ databaseUrl: databaseServer.urls.server, webRoot, logLevel: "silent" });
  const person = await signUp(server, "Ada");
  const browser = await chromium.launch(launchOptions);
  return {
    person,
    async visit() {
      const context = await browser.newContext({
        baseURL: server.address,
        viewport: { width: 1440, height: 900 },
        locale: "en-GB",
      });
      // What turns these files into JavaScript names every inner function by a call that a page does not know.
      await context.addInitScript("globalThis.__name ??= (named) => named");
      const [name, value] = (person.cookie ?? "").split(/=(.*)/su);
      await context.addCookies([{ name, value, url: server.address }]);
      return context;
    },
    async close() {
      await browser.close();
      await server.stop();
      await databaseServer.stop();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
