import { createRequire } from "node:module";
import { dirname, join } from "node:path";
import { parseArgs } from "node:util";
import { demoPassword } from "./demo-password.mjs";
import { demandNode, installPackages } from "./install.mjs";
import { openDatabase } from "./local-database.mjs";
import { choosePort, freePort } from "./ports.mjs";
import { run, startService, stopService } from "./processes.mjs";
import { main, root, say } from "./project.mjs";
import { leavePlace, takePlace, tellRunning } from "./running.mjs";
import { sessionSecret } from "./session-secret.mjs";
import { untilStopped } from "./shutdown.mjs";
import { signingKey } from "./signing-key.mjs";

const USUAL_PORT = 5173;
const SCRIPT = "dev.mjs";

/** For contributors: the pages by vite with hot reloading, the server restarted at every change of its sources. */
await main(() => {
  demandNode();
  const { values } = parseArgs({ options: { port: { type: "string" } } });
  takePlace(SCRIPT);
  return untilStopped((atEnd) => develop(values, atEnd));
});

async function develop(options, atEnd) {
  atEnd(leavePlace);
  const port = await choosePort(options.port, USUAL_PORT, "127.0.0.1");
  await installPackages();
  const database = await openDatabase();
  atEnd(database.stop);
  await prepare(database);
  const apiPort = await freePort();
  const server = serve(database, apiPort);
  atEnd(() => stopService(server));
  const pages = servePages(port, apiPort);
  atEnd(() => stopService(pages));
  const address = `http://127.0.0.1:${port}`;
  tellRunning({ script: SCRIPT, address });
  say(`\nRestband for contributors is at ${address}; the demo's password is ${demoPassword()}`);
  return Promise.race([server.ended, pages.ended]).then(() => 1);
}

function prepare({ urls, grantTo }) {
  const env = {
    RESTBAND_MIGRATIONS_URL: urls.migrations,
    RESTBAND_GRANT_TO: grantTo,
    RESTBAND_DEMO_PASSWORD: demoPassword(),
    RESTBAND_SIGNING_KEY: signingKey(),
  };
  return run(process.execPath, ["--import", "tsx", "api/src/prepare.ts"], { quiet: true, env });
}

/** Programs are started by their files: `npx` would not pass the signal on. */
function serve({ urls }, port) {
  const args = [join(root, "node_modules/tsx/dist/cli.mjs"), "watch", "--clear-screen=false", "api/src/server.ts"];
  return startService(process.execPath, args, {
    stdio: ["ignore", "inherit", "inherit"],
    env: {
      RESTBAND_PORT: String(port),
      RESTBAND_DATABASE_URL: urls.server,
      RESTBAND_SESSION_SECRET: sessionSecret(),
      RESTBAND_SIGNING_KEY: signingKey(),
      RESTBAND_LOG_LEVEL: "warn",
    },
  });
}

function servePages(port, apiPort) {
  const vite = createRequire(join(root, "web/package.json")).resolve("vite/package.json");
  const args = [join(dirname(vite), "bin/vite.js"), "--port", String(port)];
  const env = { RESTBAND_API_PORT: String(apiPort) };
  return startService(process.execPath, args, { stdio: ["ignore", "inherit", "inherit"], env, cwd: join(root, "web") });
}
