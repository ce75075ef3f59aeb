import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { insertOneTimeLink } from "../../api/src/accounts/one-time-links-store.ts";
import type { Session } from "../../api/src/contract.ts";
import { emailOf, password, signUp } from "../support/people.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

let server: TestServer;
beforeAll(async () => (server = await startTestServer({ throttle: generous })));
afterAll(() => server.stop());

const generous = { account: { attempts: 1000, seconds: 60 }, origin: { attempts: 1000, seconds: 60 } };

describe("signing up", () => {
  it("makes an account that can sign in, and does not sign it in by itself", async () => {
    const browser = await server.browser().open();
    const answer = await browser.call("signUp", { body: { name: "Ada", email: emailOf("Ada"), password } });
    expect(answer.status).toBe(202);
    expect((await browser.get<Session>("readSession")).account).toBeNull();
    await browser.signIn(emailOf("Ada"), password);
    expect((await browser.get<Session>("readSession")).account).toMatchObject({ name: "Ada", isAdministrator: false });
  });

  it("answers alike for a known address, and changes nothing there", async () => {
    const first = await signUp(server, "Bo");
    const other = await server.browser().open();
    const body = { name: "Somebody else", email: "BO@Workshop.Example", password: "another good password" };
    const [known, unknown] = [
      await other.call("signUp", { body }),
      await other.call("signUp", { body: { ...body, email: emailOf("Nobody") } }),
    ];
    expect([known.status, known.body]).toEqual([unknown.status, unknown.body]);
    expect((await other.fail("signIn", { body: { email: first.email, password: body.password } })).status).toBe(401);
    expect((await first.get<Session>("readSession")).account?.name).toBe("Bo");
  });

  it("takes as long for a known address as for an unknown one", async () => {
    await signUp(server, "Cy");
    const browser = await server.browser().open();
    const time = async (email: string) => {
      const start = performance.now();
      await browser.get("signUp", { body: { name: "Cy", email, password } });
      return performance.now() - start;
    };
    const known = [await time(emailOf("Cy")), await time(emailOf("Cy")), await time(emailOf("Cy"))];
    const unknown = [await time(emailOf("Cy1")), await time(emailOf("Cy2")), await time(emailOf("Cy3"))];
    // Both wait for the same clock: without it they lie apart by what a committed row takes.
    for (const milliseconds of [...known, ...unknown]) expect(milliseconds).toBeGreaterThanOrEqual(249);
  });

  it("keeps the address as typed, finds it in any case, and stores the password as an argon2id hash only", async () => {
    const browser = await server.browser().open();
    await browser.get("signUp", { body: { name: "Di", email: "Di.Smith@Workshop.example", password } });
    await browser.signIn("di.smith@workshop.EXAMPLE", password);
    expect((await browser.get<Session>("readSession")).account?.email).toBe("Di.Smith@Workshop.example");
    const [row] = await server.database("accounts").where({ name: "Di" }).select<{ password_hash: string }[]>("*");
    expect(row.password_hash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
  });

  it.each([
    ["short", "eleven char"],
    ["common", "password1234"],
    ["made of the own address", "eve@workshop.example"],
  ])("refuses a %s password and says why at its field", async (_, bad) => {
    const browser = await server.browser().open();
    const failure = await browser.fail("signUp", { body: { name: "Eve", email: emailOf("Eve"), password: bad } });
    expect(failure).toMatchObject({ status: 422, code: "weak-password", fields: [{ path: "password" }] });
    expect(await server.database("accounts").where({ name: "Eve" }).first("id")).toBeUndefined();
  });
});

describe("a one-time link", () => {
  const newLink = (name: string) =>
    insertOneTimeLink(server.database, { email: emailOf(name), makesAdministrator: true });

  it("makes an administrator, signs in, and is good once", async () => {
    const token = await newLink("Flo");
    const browser = await server.browser().open();
    const session = await browser.get<Session>("claimAccount", { body: { token, name: "Flo", password } });
    expect(session.account).toMatchObject({ name: "Flo", email: emailOf("Flo"), isAdministrator: true });
    const again = await server.browser().open();
    const failure = await again.fail("claimAccount", { body: { token, name: "Mallory", password } });
    expect(failure).toMatchObject({ status: 410, code: "link-used" });
  });

  it("is good once even for two who use it at the same time", async () => {
    const token = await newLink("Gil");
    const browsers = await Promise.all([1, 2, 3, 4].map(() => server.browser().open()));
    const claim = { body: { token, name: "Gil", password } };
    const statuses = await Promise.all(browsers.map(async (b) => (await b.call("claimAccount", claim)).status));
    expect(statuses.sort()).toEqual([200, 410, 410, 410]);
  });

  it("is kept as a hash, and is worth nothing after its days", async () => {
    const token = await newLink("Hal");
    const links = await server.database("one_time_links").select<{ token_hash: Buffer }[]>("token_hash");
    expect(links.every(({ token_hash: hash }) => hash.length === 32)).toBe(true);
    expect(JSON.stringify(links)).not.toContain(token);
    await server.database("one_time_links").update({ expires_at: new Date(Date.now() - 1) });
    const browser = await server.browser().open();
    expect((await browser.fail("claimAccount", { body: { token, name: "Hal", password } })).status).toBe(410);
  });

  it("survives a password that is refused", async () => {
    const token = await newLink("Ida");
    const browser = await server.browser().open();
    const claim = (secret: string) => ({ body: { token, name: "Ida", password: secret } });
    expect((await browser.fail("claimAccount", claim("short"))).code).toBe("weak-password");
    expect((await browser.call("claimAccount", claim(password))).status).toBe(200);
  });

  it("renews the password of an account that is there already and ends its sessions", async () => {
    const before = await signUp(server, "Jon");
    const token = await newLink("Jon");
    const browser = await server.browser().open();
    await browser.get("claimAccount", { body: { token, name: "Jon", password: "some other words again" } });
    expect((await before.get<Session>("readSession")).account).toBeNull();
    await (await server.browser().open()).signIn(before.email, "some other words again");
    expect(
      (await (await server.browser().open()).fail("signIn", { body: { email: before.email, password } })).status,
    ).toBe(401);
  });
});
