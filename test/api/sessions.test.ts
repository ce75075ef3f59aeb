import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { Session } from "../../api/src/contract.ts";
import type { Browser } from "../support/browser.ts";
import { password, signUp } from "../support/people.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

const generous = { account: { attempts: 1000, seconds: 60 }, origin: { attempts: 1000, seconds: 60 } };

let server: TestServer;
beforeAll(async () => (server = await startTestServer({ throttle: generous })));
afterAll(() => server.stop());

const whoIs = async (browser: Browser) => (await browser.get<Session>("readSession")).account?.name ?? null;

/** A browser that was handed somebody's cookie. */
function withCookie(cookie: string | undefined, at: TestServer = server): Browser {
  return Object.assign(at.browser(), { cookie });
}

describe("the cookie", () => {
  it("cannot be read by scripts, is not sent along from other sites, and holds 192 random bits", async () => {
    const answer = await server.browser().call("readSession");
    const cookie = answer.headers.getSetCookie()[0];
    expect(cookie).toMatch(/; Path=\/; .*HttpOnly; SameSite=Lax/);
    expect(cookie).not.toContain("Secure");
    const id = decodeURIComponent(cookie).match(/^restband=s:([^.]+)\./)![1];
    expect(Buffer.from(id, "base64url")).toHaveLength(24);
  });

  it("is secure where a trusted proxy says the person came by https", async () => {
    const proxied = await startTestServer({ trustProxy: 1 });
    const answer = await proxied.browser().send("GET", "/api/session", { headers: { "X-Forwarded-Proto": "https" } });
    expect(answer.headers.getSetCookie()[0]).toContain("; Secure");
    await proxied.stop();
  });

  it("is not believed when it was changed or made up", async () => {
    const ada = await signUp(server, "Ada");
    expect(await whoIs(withCookie(`${ada.cookie!.slice(0, -2)}xx`))).toBeNull();
    expect(await whoIs(withCookie("restband=s%3Amade-up.signature"))).toBeNull();
    expect(await whoIs(ada)).toBe("Ada");
  });

  it("stands in the database as a hash only", async () => {
    const bo = await signUp(server, "Bo");
    const id = decodeURIComponent(bo.cookie!).match(/s:([^.]+)\./)![1];
    const rows = JSON.stringify(await server.database("sessions").select("*"));
    expect(rows).not.toContain(id);
  });
});

describe("signing in", () => {
  it("gives a new id, and leaves the one from before signed out", async () => {
    const cy = await signUp(server, "Cy");
    const browser = await server.browser().open();
    const planted = browser.cookie;
    await browser.signIn(cy.email, password);
    expect(browser.cookie).not.toBe(planted);
    expect(await whoIs(browser)).toBe("Cy");
    expect(await whoIs(withCookie(planted))).toBeNull();
  });

  it("gives a new token as well", async () => {
    const browser = await server.browser().open();
    const before = browser.csrfToken;
    await browser.signIn((await signUp(server, "Di")).email, password);
    expect(browser.csrfToken).not.toBe(before);
  });

  it("says the same of a wrong password and of an unknown address", async () => {
    const { email } = await signUp(server, "Ed");
    const browser = await server.browser().open();
    const wrong = await browser.call("signIn", { body: { email, password: "not this one, sorry" } });
    const unknown = await browser.call("signIn", { body: { email: "nobody@workshop.example", password } });
    expect(wrong.status).toBe(401);
    expect([unknown.status, unknown.body]).toEqual([wrong.status, wrong.body]);
  });

  it("does as much work for an unknown address as for a wrong password", async () => {
    const { email } = await signUp(server, "Fi");
    const browser = await server.browser().open();
    // Processor time of this process, in which the server runs: unlike the clock it does not depend on the machine's load.
    const work = async (address: string) => {
      const start = process.cpuUsage();
      await browser.call("signIn", { body: { email: address, password: "not this one, sorry" } });
      const { user, system } = process.cpuUsage(start);
      return user + system;
    };
    const spent = { known: 0, unknown: 0 };
    for (let i = 0; i < 20; i += 1) {
      spent.known += await work(email);
      spent.unknown += await work("nobody@workshop.example");
    }
    // Without the hash that belongs to nobody it is about a third.
    expect(spent.unknown / spent.known).toBeGreaterThan(0.75);
    expect(spent.unknown / spent.known).toBeLessThan(1.33);
  });
});

describe("a session", () => {
  it("is worth nothing after signing out, even to who kept the cookie", async () => {
    const gil = await signUp(server, "Gil");
    const kept = gil.cookie;
    expect((await gil.call("signOut")).status).toBe(204);
    expect(await whoIs(withCookie(kept))).toBeNull();
  });

  it("stays ended where a request from before still saves it", async () => {
    const hal = await signUp(server, "Hal");
    const kept = hal.cookie;
    // Old enough to be marked as seen, and so to be saved, by each of these.
    await server.database.raw("UPDATE sessions SET sess = JSON_SET(sess, '$.seenAt', 0)");
    const readers = Array.from({ length: 20 }, () => withCookie(kept).call("listProjects"));
    await Promise.all([...readers, hal.call("signOut")]);
    expect(await whoIs(withCookie(kept))).toBeNull();
  });

  it("does not outlive an account that is gone", async () => {
    const ida = await signUp(server, "Ida");
    await server.database("accounts").where({ name: "Ida" }).delete();
    expect((await ida.fail("listProjects")).status).toBe(401);
    expect(await whoIs(ida)).toBeNull();
  });

  it("ends when it is left alone, goes on while it is used, and ends for good after its longest time", async () => {
    const brief = await startTestServer({ session: { idleSeconds: 2, absoluteSeconds: 5 } });
    const [used, idle] = [await signUp(brief, "Jo"), await signUp(brief, "Ko")];
    const began = Date.now();
    const pause = () => new Promise((resolve) => setTimeout(resolve, 600));
    while (Date.now() - began < 3500) {
      await pause();
      expect(await whoIs(used)).toBe("Jo");
    }
    expect(await whoIs(idle)).toBeNull();
    while (Date.now() - began < 6000) {
      await pause();
      await whoIs(used);
    }
    expect(await whoIs(used)).toBeNull();
    await brief.stop();
  });

  it("lasts 12 hours idle and 7 days in all unless told otherwise", async () => {
    const { defaultLimits } = await import("../../api/src/config.ts");
    expect(defaultLimits.session).toEqual({ idleSeconds: 43_200, absoluteSeconds: 604_800 });
  });

  it("is shared by all server processes on one database", async () => {
    const leo = await signUp(server, "Leo");
    const url = new URL(server.address);
    expect(url.hostname).toBe("127.0.0.1");
    const other = await startTestServer({ databaseUrl: server.databaseUrl });
    expect(await whoIs(withCookie(leo.cookie, other))).toBe("Leo");
    await other.stop();
  });
});
