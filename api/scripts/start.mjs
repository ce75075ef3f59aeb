import { openSync } from "node:fs";
import { join } from "node:path";
import { parseArgs } from "node:util";
import { build } from "./build.mjs";
import { demoPassword } from "./demo-password.mjs";
import { demandNode, installPackages } from "./install.mjs";
import { openDatabase } from "./local-database.mjs";
import { choosePort } from "./ports.mjs";
import { run, startService, stopService } from "./processes.mjs";
import { local, main, root, say, Trouble } from "./project.mjs";
import { leavePlace, takePlace, tellRunning } from "./running.mjs";
import { sessionSecret } from "./session-secret.mjs";
import { untilStopped } from "./shutdown.mjs";
import { signingKey } from "./signing-key.mjs";

const USUAL_PORT = 4780;
const SCRIPT = "start.mjs";

await main(() => {
  demandNode();
  const options = readOptions();
  takePlace(SCRIPT);
  return untilStopped((atEnd) => start(options, atEnd));
});

function readOptions() {
  try {
    return parseArgs({ options: { port: { type: "string" }, "reset-demo": { type: "boolean" } } }).values;
  } catch (error) {
    throw new Trouble(`${error.message}\nUsage: npm start -- [--port N] [--reset-demo]`);
  }
}

/** Brings everything up and stays until the server ends. */
async function start(options, atEnd) {
  atEnd(leavePlace);
  const host = process.env.RESTBAND_HOST ?? "127.0.0.1";
  const port = await choosePort(options.port, USUAL_PORT, host);
  await installPackages();
  const [database] = await Promise.all([openAndKeep(atEnd), build()]);
  const { demoPeople } = await prepare(database, options["reset-demo"]);
  const address = `http://${host}:${port}`;
  const server = await serve({ database, host, port }, atEnd);
  tellRunning({ script: SCRIPT, address });
  welcome({ address, database, demoPeople });
  const code = await server.ended;
  throw new Trouble(`The server ended by itself (${code}); its log is ${logFile()}.`);
}

/** Opens the database and, should its server end by itself, starts it again. */
async function openAndKeep(atEnd) {
  let isStopping = false;
  let opening = openDatabase();
  // Registered before it is open: a stop that comes meanwhile waits for it and ends it.
  atEnd(async () => {
    isStopping = true;
    await (await opening.catch(() => null))?.stop();
  });
  const watch = async ({ lost }) => {
    await lost;
    if (isStopping) return;
    say("The database ended by itself; it is started again.");
    opening = openDatabase();
    await watch(await opening);
  };
  const database = await opening;
  watch(database).catch((error) => say(`The database does not start again: ${error.message}`));
  return database;
}

async function prepare({ urls, grantTo, seenEnds }, isReset) {
  const env = {
    RESTBAND_MIGRATIONS_URL: urls.migrations,
    RESTBAND_GRANT_TO: grantTo,
    RESTBAND_DEMO_PASSWORD: demoPassword(),
    RESTBAND_SIGNING_KEY: signingKey(),
    RESTBAND_SEEN_ENDS: seenEnds,
  };
  const args = [join(root, "api/dist/prepare.js"), ...(isReset ? ["--reset-demo"] : [])];
  const output = await run(process.execPath, args, { quiet: true, env });
  return JSON.parse(output.trim().split("\n").at(-1));
}

/** Starts the server and waits until it listens. Its log goes to a file of this folder. */
async function serve({ database, host, port }, atEnd) {
  const log = openSync(logFile(), "a", 0o600);
  const server = startService(process.execPath, [join(root, "api/dist/server.js")], {
    stdio: ["ignore", log, log, "ipc"],
    env: {
      NODE_ENV: "production",
      RESTBAND_HOST: host,
      RESTBAND_PORT: String(port),
      RESTBAND_DATABASE_URL: database.urls.server,
      RESTBAND_SESSION_SECRET: sessionSecret(),
      RESTBAND_SIGNING_KEY: signingKey(),
      RESTBAND_SEEN_ENDS: database.seenEnds,
      RESTBAND_WEB_ROOT: join(root, "web/dist"),
    },
  });
  atEnd(() => stopService(server));
  const listening = new Promise((resolve) => server.once("message", () => resolve("listening")));
  const state = await Promise.race([listening, server.ended]);
  if (state !== "listening") throw new Trouble(`The server did not start (${state}); its log is ${logFile()}.`);
  return server;
}

function logFile() {
  return join(local, "server.log");
}

function welcome({ address, database, demoPeople }) {
  say(`\nRestband is at ${address}`);
  if (demoPeople.length > 0) {
    say(`The demo's people, all with the password ${demoPassword()}:`);
    for (const { name, email } of demoPeople) say(`  ${email.padEnd(32)}${name}`);
  }
  if (!database.isGuarded)
    say("One database account does everything: nothing guards the trail against the server itself.");
  say("Ctrl-C stops it; everything entered stays.");
}
