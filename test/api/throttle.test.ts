import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { setTimeout as sleep } from "node:timers/promises";
import { password, signUp } from "../support/people.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

const wrong = "not this one, sorry";

describe("wrong passwords of one account", () => {
  let server: TestServer;
  beforeAll(async () => {
    const throttle = { account: { attempts: 5, seconds: 3 }, origin: { attempts: 1000, seconds: 60 } };
    server = await startTestServer({ throttle });
  });
  afterAll(() => server.stop());

  it("are refused after a few, with the wait; the right one works after it", async () => {
    const { email } = await signUp(server, "Ada");
    const browser = await server.browser().open();
    for (let i = 0; i < 5; i += 1) {
      expect((await browser.fail("signIn", { body: { email, password: wrong } })).status).toBe(401);
    }
    const refused = await browser.fail("signIn", { body: { email, password } });
    expect(refused).toMatchObject({ status: 429, code: "too-many-attempts" });
    const wait = Number(refused.headers.get("Retry-After"));
    expect(wait).toBeGreaterThan(0);
    expect(wait).toBeLessThanOrEqual(3);
    await sleep(wait * 1000);
    await browser.signIn(email, password);
  });

  it("are counted when they come all at once", async () => {
    const { email } = await signUp(server, "Bo");
    const browser = await server.browser().open();
    const tries = Array.from({ length: 12 }, () => browser.call("signIn", { body: { email, password: wrong } }));
    const statuses = (await Promise.all(tries)).map(({ status }) => status);
    expect(statuses.filter((status) => status === 401)).toHaveLength(5);
    expect(statuses.filter((status) => status === 429)).toHaveLength(7);
  });

  it("are counted alike for an address without an account", async () => {
    const browser = await server.browser().open();
    const body = { email: "nobody@workshop.example", password: wrong };
    for (let i = 0; i < 5; i += 1) expect((await browser.fail("signIn", { body })).status).toBe(401);
    expect((await browser.fail("signIn", { body })).status).toBe(429);
  });

  it("are forgotten once the right one was given", async () => {
    const { email } = await signUp(server, "Cy");
    const browser = await server.browser().open();
    for (let round = 0; round < 3; round += 1) {
      for (let i = 0; i < 4; i += 1) await browser.fail("signIn", { body: { email, password: wrong } });
      await browser.signIn(email, password);
    }
  });

  it("leave other accounts alone, and no address in the table", async () => {
    const { email } = await signUp(server, "Di");
    const browser = await server.browser().open();
    for (let i = 0; i < 6; i += 1) await browser.fail("signIn", { body: { email, password: wrong } });
    await (await server.browser().open()).signIn((await signUp(server, "Ed")).email, password);
    const rows = JSON.stringify(await server.database("throttles").select("*"));
    expect(rows).not.toContain("workshop.example");
    expect(rows).not.toContain("127.0.0.1");
  });
});

describe("attempts from one address of origin", () => {
  it("are refused after a few over all accounts, also at signing up and at one-time links", async () => {
    const throttle = { account: { attempts: 1000, seconds: 60 }, origin: { attempts: 6, seconds: 60 } };
    const server = await startTestServer({ throttle });
    const browser = await server.browser().open();
    const token = "a token that nobody ever gave out";
    for (let i = 0; i < 3; i += 1) {
      expect((await browser.fail("signIn", { body: { email: `a${i}@b.example`, password: wrong } })).status).toBe(401);
      expect((await browser.fail("claimAccount", { body: { token, name: "Eve", password } })).status).toBe(410);
    }
    const { status } = await browser.fail("signUp", { body: { name: "Eve", email: "eve@b.example", password } });
    expect(status).toBe(429);
    expect((await browser.call("readSession")).status).toBe(200);
    await server.stop();
  });

  it("are told apart behind a trusted proxy, and not by a header that anybody can send", async () => {
    const throttle = { account: { attempts: 1000, seconds: 60 }, origin: { attempts: 2, seconds: 60 } };
    const statusesWith = async (trustProxy: number | false) => {
      const server = await startTestServer({ throttle, trustProxy });
      const browser = await server.browser().open();
      const statuses: number[] = [];
      for (const origin of ["198.51.100.1", "198.51.100.2", "198.51.100.3", "198.51.100.3"]) {
        const body = { email: "nobody@b.example", password: wrong };
        statuses.push((await browser.fail("signIn", { body, headers: { "X-Forwarded-For": origin } })).status);
      }
      await server.stop();
      return statuses;
    };
    expect(await statusesWith(1)).toEqual([401, 401, 401, 401]);
    expect(await statusesWith(false)).toEqual([401, 401, 429, 429]);
  });
});
