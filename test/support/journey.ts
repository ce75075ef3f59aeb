import { join } from "node:path";
import { type Browser, type BrowserContextOptions, chromium, type Page } from "playwright-core";
import { onTestFailed } from "vitest";
import { launchOptions } from "./chromium.ts";
import { createTestDatabase, type TestDatabase } from "./test-database.ts";
import { startTestServer, type TestServer } from "./test-server.ts";

const root = join(import.meta.dirname, "../..");
const webRoot = join(root, "web/dist");

export const desk = { width: 1440, height: 900 };
export const phone = { width: 390, height: 844 };

/** A server with the built pages and a real browser on it. */
export class Journey {
  server: TestServer;
  /** What any page has complained of on its console: errors, refused by the content policy or not caught. */
  readonly complaints: string[] = [];
  readonly #database: TestDatabase;
  readonly #browser: Browser;

  private constructor(database: TestDatabase, server: TestServer, browser: Browser) {
    this.#database = database;
    this.server = server;
    this.#browser = browser;
  }

  static async open(): Promise<Journey> {
    const database = await createTestDatabase();
    const server = await startTestServer({ databaseUrl: database.url, webRoot });
    return new Journey(database, server, await chromium.launch(launchOptions));
  }

  /** Somebody at a browser of their own, that has been nowhere yet. */
  async visit(options: BrowserContextOptions = {}): Promise<Page> {
    const context = await this.#browser.newContext({
      baseURL: this.server.address,
      viewport: desk,
      locale: "en-GB",
      timezoneId: "UTC",
      reducedMotion: "reduce",
      ...options,
    });
    context.setDefaultTimeout(15_000);
    const page = await context.newPage();
    page.on("pageerror", (error) => this.complaints.push(error.message));
    page.on("console", (message) => {
      if (message.type() === "error") this.complaints.push(`${message.text()} ${message.location().url}`);
    });
    onTestFailed(() => takePicture(page));
    return page;
  }

  /** Somebody at a phone: narrow, touched with a finger. */
  visitByPhone(options: BrowserContextOptions = {}): Promise<Page> {
    return this.visit({ viewport: phone, hasTouch: true, isMobile: true, ...options });
  }

  /** Takes out the complaints that a journey has brought about on purpose. */
  takeComplaints(pattern: RegExp): string[] {
    const taken = this.complaints.filter((complaint) => pattern.test(complaint));
    this.complaints.splice(0, Infinity, ...this.complaints.filter((complaint) => !pattern.test(complaint)));
    return taken;
  }

  /** Changes something in the database behind the server's back, with every right there is. */
  async alter(change: (database: TestDatabase["database"]) => PromiseLike<unknown>): Promise<void> {
    await change(this.#database.database);
  }

  /** The server is gone: every connection breaks. */
  async stopServer(): Promise<void> {
    await this.server.stop();
  }

  /** It is back at its old address, with all that it had stored. */
  async startServer(): Promise<void> {
    const port = Number(new URL(this.server.address).port);
    this.server = await startTestServer({ databaseUrl: this.#database.url, webRoot, port });
  }

  async close(): Promise<void> {
    await this.#browser.close();
    await this.server.stop();
    await this.#database.drop();
  }
}

/** A journey that fails leaves what its visitors saw in `.local/`. */
async function takePicture(page: Page): Promise<void> {
  const path = join(root, `.local/failed-journey-${Date.now()}.png`);
  await page.screenshot({ path, fullPage: true });
  console.error(`${page.url()} as it was: ${path}`);
}
