import { rm } from "node:fs/promises";
import { join } from "node:path";
import type { TestProject } from "vitest/node";
import { openDatabaseServer } from "../../api/scripts/database-server.mjs";

declare module "vitest" {
  interface ProvidedContext {
    /** `mysql://root:…@host:port` of a server on which tests may do as they like. */
    databaseRootUrl: string;
  }
}

/**
 * Gives all tests of a run one database server: the one named by `RESTBAND_TEST_DATABASE_URL` (`npm test` starts it and
 * several projects share it), else one of this run's own, removed at its end.
 */
export async function setup({ provide }: TestProject): Promise<(() => Promise<void>) | undefined> {
  const { RESTBAND_TEST_DATABASE_URL: url } = process.env;
  if (url) {
    provide("databaseRootUrl", url);
    return undefined;
  }
  const folder = join(import.meta.dirname, "../../.local", `test-${process.pid}-${Date.now()}`);
  const server = await openDatabaseServer(folder, { isThrowAway: true });
  provide("databaseRootUrl", server.urls.root);
  return async () => {
    await server.stop();
    await rm(folder, { recursive: true });
  };
}
