import { defineConfig } from "vitest/config";

/** One project per kind of test; `vitest run --project NAME` runs one of them. */
const project = (name: string, include: string[], more: object = {}) => ({
  extends: true as const,
  test: { name, include, environment: "node", ...more },
});

const minutes = (n: number) => n * 60_000;

export default defineConfig({
  test: {
    // all cores: vitest would keep one for itself, which it hardly uses
    maxWorkers: "100%",
    projects: [
      // generous: a shared machine may be ten times slower for a while, and no test asserts a time
      project("unit", ["test/solver/**/*.test.ts", "test/laws/**/*.test.ts"], { testTimeout: minutes(1) }),
      project("reference", ["test/reference/**/*.test.ts"], { testTimeout: minutes(1) }),
      {
        ...project("web", ["test/web/**/*.test.{ts,tsx}"], {
          environment: "jsdom",
          testTimeout: minutes(1),
          setupFiles: ["test/support/web.ts"],
        }),
        oxc: { jsx: { runtime: "automatic" as const } },
      },
      project("api", ["test/api/**/*.test.ts"], {
        // each file has a server and a database of its own: to load the code anew for each shows nothing more
        isolate: false,
        testTimeout: minutes(1),
        hookTimeout: minutes(1),
        globalSetup: ["test/support/database-setup.ts"],
      }),
      project("journeys", ["test/journeys/**/*.test.ts"], {
        globalSetup: ["test/support/build-setup.ts", "test/support/database-setup.ts"],
        testTimeout: minutes(3),
        hookTimeout: minutes(2),
        // one after another, after all others: each has a browser and a server beside it
        fileParallelism: false,
        sequence: { groupOrder: 1 },
      }),
    ],
  },
});
