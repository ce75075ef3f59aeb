import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { type Browser, type BrowserContext, chromium } from "playwright-core";
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
  /** Somebody else, who is in no project yet. */
  readonly other: Person;
  /** A browser of a person's that has been nowhere yet, not even in its cache. */
  visit(who?: Person): Promise<BrowserContext>;
  /** The most memory that any page of the browser has had so far, its workers included, MB; NaN where the system does not tell. */
  pageMemory(): Promise<number>;
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
  const other = await signUp(server, "Bo");
  const browser = await chromium.launch(launchOptions);
  return {
    person,
    other,
    async visit(who = person) {
      const context = await browser.newContext({
        baseURL: server.address,
        viewport: { width: 1440, height: 900 },
        locale: "en-GB",
      });
      // What turns these files into JavaScript names every inner function by a call that a page does not know.
      await context.addInitScript("globalThis.__name ??= (named) => named");
      const [name, value] = (who.cookie ?? "").split(/=(.*)/su);
      await context.addCookies([{ name, value, url: server.address }]);
      return context;
    },
    pageMemory: () => pageMemory(browser),
    async close() {
      await browser.close();
      await server.stop();
      await databaseServer.stop();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

/** From the kernel's own account of the processes that the browser says render pages. */
async function pageMemory(browser: Browser): Promise<number> {
  const session = await browser.newBrowserCDPSession();
  const { processInfo } = await session.send("SystemInfo.getProcessInfo");
  await session.detach();
  const peaks = processInfo.filter(({ type }) => type === "renderer").map(({ id }) => peakOf(id));
  return Math.max(...peaks);
}

function peakOf(process: number): number {
  try {
    const [, kB] = /VmHWM:\s+(\d+) kB/.exec(readFileSync(`/proc/${process}/status`, "utf8")) ?? [];
    return Number(kB) / 1000;
  } catch {
    return NaN;
  }
}
