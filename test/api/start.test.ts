import { type ChildProcess, spawn } from "node:child_process";
import { mkdtemp, readFile, rm } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { setTimeout as sleep } from "node:timers/promises";
import { afterAll, beforeAll, expect, it, vi } from "vitest";
import type { Project, Session } from "../../api/src/contract.ts";
import { Browser } from "../support/browser.ts";

const root = join(import.meta.dirname, "../..");

let local: string;
const children: ChildProcess[] = [];
// The first start may have to build the pages.
vi.setConfig({ testTimeout: 180_000 });

beforeAll(async () => (local = await mkdtemp(join(tmpdir(), "start-"))));
afterAll(async () => {
  for (const child of children) child.kill("SIGKILL");
  // Only where a test failed half-way: the database would go on without its folder.
  const pid = await databasePid().catch(() => null);
  if (pid && isAlive(pid)) process.kill(pid, "SIGKILL");
  await rm(local, { recursive: true });
});

/** One of the commands, with a folder of its own for what it keeps, and free ports. */
function command(script: string, ...args: string[]) {
  const child = spawn(process.execPath, [join(root, "api/scripts", script), ...args], {
    cwd: root,
    env: { ...process.env, RESTBAND_LOCAL: local, RESTBAND_DATABASE_URL: undefined },
  });
  children.push(child);
  const said = { text: "" };
  for (const stream of [child.stdout, child.stderr])
    stream.on("data", (text: Buffer) => (said.text += text.toString()));
  const code = new Promise<number | null>((resolve) => child.once("exit", resolve));
  const says = async (text: string) => {
    while (!said.text.includes(text)) {
      if (child.exitCode !== null) throw new Error(`Ended with ${child.exitCode}:\n${said.text}`);
      await sleep(20);
    }
    return said.text;
  };
  return { child, said, code, says };
}

const running = async () =>
  JSON.parse(await readFile(join(local, "running.json"), "utf8")) as { pid: number; address: string };
const databasePid = async () => Number(await readFile(join(local, "mariadb/pid"), "utf8"));

function isAlive(pid: number): boolean {
  try {
    return process.kill(pid, 0);
  } catch {
    return false;
  }
}

it("starts on a folder where nothing is, serves the demo, survives its database, stops cleanly and keeps all", async () => {
  const first = command("start.mjs");
  const said = await first.says("Ctrl-C");
  const address = /Restband is at (http:\S+)/.exec(said)![1];
  const password = /with the password (\S+):/.exec(said)![1];
  expect(said).toContain("ines.duarte@okarin.example");

  const ines = await new Browser(address).signIn("ines.duarte@okarin.example", password);
  expect(await ines.get<Project[]>("listProjects")).toHaveLength(3);
  const page = await ines.send<string>("GET", "/");
  expect(page.body).toContain("<title>");
  const pid = await databasePid();

  // A second start of the same folder names the first.
  const second = command("start.mjs");
  expect(await second.code).toBe(1);
  expect(second.said.text).toContain(`runs from this folder already at ${address}`);

  // A link for an administrator, made beside the running server and used there.
  const link = command("create-administrator.mjs", "head@okarin.example");
  expect(await link.code).toBe(0);
  const token = new RegExp(`${address}/welcome/(\\S+)`).exec(link.said.text)![1];
  const head = await new Browser(address).open();
  const claim = { token, name: "Head of the shop", password: "seven unrelated words" };
  expect((await head.get<Session>("claimAccount", { body: claim })).account).toMatchObject({ isAdministrator: true });

  // The database is killed: the server says so, and the starter brings it back.
  process.kill(pid, "SIGKILL");
  while ((await ines.call("listProjects")).status === 200) await sleep(5);
  const gone = Date.now();
  while ((await ines.call("listProjects")).status !== 200) await sleep(20);
  expect(Date.now() - gone).toBeLessThan(5000);

  await ines.get("createProject", { body: { name: "Kept", description: "" } });
  const last = await databasePid();
  first.child.kill("SIGTERM");
  expect(await first.code).toBe(0);
  expect(isAlive(last)).toBe(false);

  // What was entered is there, and so is the session: a restart signs nobody out.
  const again = command("start.mjs");
  await again.says("Ctrl-C");
  const same = Object.assign(new Browser((await running()).address), { cookie: ines.cookie });
  expect((await same.get<Project[]>("listProjects")).map(({ name }) => name)).toContain("Kept");
  again.child.kill("SIGINT");
  expect(await again.code).toBe(0);
});

it("cleans up after a start that was killed", async () => {
  const killed = command("start.mjs");
  await killed.says("Ctrl-C");
  const pid = await databasePid();
  killed.child.kill("SIGKILL");
  await killed.code;
  const next = command("start.mjs", "--reset-demo");
  await next.says("Ctrl-C");
  expect(await databasePid()).toBe(pid);
  next.child.kill("SIGTERM");
  expect(await next.code).toBe(0);
  while (isAlive(pid)) await sleep(20);
});

it("says in one sentence what is wrong with how it was called", async () => {
  for (const [args, sentence] of [
    [["--port", "70000"], "70000 is no port: 1 to 65535."],
    [["--prot"], "Usage: npm start -- [--port N] [--reset-demo]"],
  ] as const) {
    const wrong = command("start.mjs", ...args);
    expect(await wrong.code).toBe(1);
    expect(wrong.said.text).toContain(sentence);
    expect(wrong.said.text).not.toContain("    at ");
  }
});
