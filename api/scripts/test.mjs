import { existsSync, readdirSync, readFileSync, rmSync } from "node:fs";
import { join } from "node:path";
import { build } from "./build.mjs";
import { openDatabaseServer } from "./database-server.mjs";
import { demandNode, installPackages, installPrograms, installScipy } from "./install.mjs";
import { isProcess, run, stopProcess } from "./processes.mjs";
import { local, main, makePrivateFolder, readIfThere, say } from "./project.mjs";
import { untilStopped } from "./shutdown.mjs";

const PREFIX = "test-run-";
const folder = join(local, `${PREFIX}${process.pid}`);

/** Everything that must hold: types, lint, format, build and all tests. Its last line counts them. */
await main(() => {
  demandNode();
  return untilStopped(test);
});

async function test(atEnd) {
  await installPackages();
  await installPrograms(["chromium", "parallel"], ["chromium", "parallel"]);
  await installScipy();
  await removeLeftovers();
  makePrivateFolder(folder);
  atEnd(() => rmSync(folder, { recursive: true, force: true }));
  const database = await openDatabaseServer(join(folder, "mariadb"), { isThrowAway: true });
  atEnd(database.stop);
  const counts = [...(await checkSources()), await runVitest(database.urls.root)];
  const sum = (key) => counts.reduce((total, count) => total + count[key], 0);
  say(`\n${sum("passed")} passed, ${sum("failed")} failed`);
  return sum("failed") > 0 ? 1 : 0;
}

/** Types on one core, all else on another. */
async function checkSources() {
  const script = (name) => check(name, () => run("npm", ["run", "--silent", name]));
  const types = script("types");
  const others = [await script("lint"), await script("format"), await check("build", () => build())];
  return [await types, ...others];
}

async function check(name, work) {
  const start = Date.now();
  const failure = await work().then(
    () => null,
    (error) => error,
  );
  const seconds = ((Date.now() - start) / 1000).toFixed(0);
  say(failure ? `${name}: failed (${seconds} s)\n${failure.message}` : `${name}: passed (${seconds} s)`);
  return failure ? { passed: 0, failed: 1 } : { passed: 1, failed: 0 };
}

/** Runs every test of every project; what fails outside a test (a file that does not load, say) counts as one failure. */
async function runVitest(rootUrl) {
  const report = join(folder, "vitest.json");
  const args = [
    "node_modules/vitest/vitest.mjs",
    "run",
    "--reporter=default",
    "--reporter=json",
    `--outputFile.json=${report}`,
  ];
  const failure = await run(process.execPath, args, { env: { RESTBAND_TEST_DATABASE_URL: rootUrl } }).then(
    () => null,
    (error) => error,
  );
  const told = JSON.parse(readIfThere(report) ?? "{}");
  const [passed, failed] = [told.numPassedTests ?? 0, (told.numFailedTests ?? 0) + filesNotLoaded(told)];
  return { passed, failed: failure && failed === 0 ? 1 : failed };
}

function filesNotLoaded({ testResults = [] }) {
  return testResults.filter(({ status, assertionResults }) => status === "failed" && assertionResults.length === 0)
    .length;
}

/** What a run that was killed has left: its database goes on, and its folder lies there. */
async function removeLeftovers() {
  if (!existsSync(local)) return;
  for (const name of readdirSync(local).filter((entry) => entry.startsWith("test-"))) {
    const owner = Number(name.split("-").find((part) => /^\d+$/.test(part)));
    if (isProcess(owner, "")) continue;
    await stopDatabaseIn(join(local, name));
    rmSync(join(local, name), { recursive: true, force: true });
  }
}

async function stopDatabaseIn(leftover) {
  for (const place of [leftover, join(leftover, "mariadb")]) {
    const file = join(place, "pid");
    if (existsSync(file)) await stopProcess(Number(readFileSync(file, "utf8")), `--datadir=${join(place, "data")}`);
  }
}
