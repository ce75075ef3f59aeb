import { mkdir, mkdtemp, rm, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { startTestServer, type TestServer } from "../support/test-server.ts";

let server: TestServer;
let webRoot: string;
beforeAll(async () => {
  webRoot = await mkdtemp(join(tmpdir(), "pages-"));
  await mkdir(join(webRoot, "assets"));
  await writeFile(join(webRoot, "index.html"), "<!doctype html><title>Restband</title>");
  await writeFile(join(webRoot, "assets/app-1a2b3c.js"), "console.log(1);".repeat(200));
  await writeFile(join(webRoot, ".inputs"), "not for everybody");
  server = await startTestServer({ webRoot });
});
afterAll(async () => {
  await server.stop();
  await rm(webRoot, { recursive: true });
});

const get = (path: string) => server.browser().send<string>("GET", path, { headers: { "Accept-Encoding": "gzip" } });

describe("the pages", () => {
  it.each(["/", "/projects", "/projects/1/scenarios/2", "/welcome/abc", "/no/such/page"])(
    "are the one page at %s, asked for anew each time",
    async (path) => {
      const answer = await get(path);
      expect(answer.status).toBe(200);
      expect(answer.body).toContain("<title>Restband</title>");
      expect(answer.headers.get("Cache-Control")).toBe("no-cache");
    },
  );

  it("keep built assets for ever, compressed, and miss them with 404", async () => {
    const asset = await get("/assets/app-1a2b3c.js");
    expect(asset.headers.get("Cache-Control")).toBe("public, max-age=31536000, immutable");
    expect(asset.headers.get("Content-Type")).toContain("javascript");
    expect(asset.headers.get("Content-Encoding")).toBe("gzip");
    expect((await get("/assets/app-000000.js")).status).toBe(404);
  });

  it("give out no file beside the built ones", async () => {
    for (const path of ["/.inputs", "/../package.json", "/%2e%2e/package.json", "/assets/..%2f..%2fpackage.json"]) {
      expect(JSON.stringify((await get(path)).body)).not.toMatch(/not for everybody|"workspaces"/);
    }
  });
});

describe("the headers", () => {
  it.each(["/", "/assets/app-1a2b3c.js", "/api/session", "/api/nothing", "/health"])(
    "of %s guard the page",
    async (path) => {
      const { headers } = await get(path);
      const policy = Object.fromEntries(
        headers
          .get("Content-Security-Policy")!
          .split(";")
          .map((directive) => {
            const [name, ...values] = directive.trim().split(" ");
            return [name, values.join(" ")];
          }),
      );
      expect(policy).toMatchObject({
        "default-src": "'none'",
        "script-src": "'self'",
        "worker-src": "'self'",
        "style-src": "'self' 'unsafe-inline'",
        "img-src": "'self' data: blob:",
        "base-uri": "'none'",
        "frame-ancestors": "'none'",
      });
      expect(JSON.stringify(policy)).not.toContain("unsafe-eval");
      expect(headers.get("X-Content-Type-Options")).toBe("nosniff");
      expect(headers.get("X-Frame-Options")).toBe("DENY");
      expect(headers.get("Referrer-Policy")).toBe("no-referrer");
      expect(headers.get("Permissions-Policy")).toContain("camera=()");
      expect(headers.get("X-Powered-By")).toBeNull();
    },
  );

  it("let nobody keep what the server says of a person", async () => {
    expect((await get("/api/session")).headers.get("Cache-Control")).toBe("no-store");
  });
});

it("tells that it lives and that it can work", async () => {
  expect(await get("/health")).toMatchObject({ status: 200, body: { alive: true } });
  expect(await get("/ready")).toMatchObject({ status: 200, body: { ready: true } });
  await server.database("knex_migrations").orderBy("id", "desc").limit(1).delete();
  expect(await get("/ready")).toMatchObject({ status: 503, body: { ready: false } });
});
