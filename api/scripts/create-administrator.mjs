import { join } from "node:path";
import { build } from "./build.mjs";
import { demoPassword } from "./demo-password.mjs";
import { demandNode, installPackages } from "./install.mjs";
import { openDatabase } from "./local-database.mjs";
import { run } from "./processes.mjs";
import { main, root, say, Trouble } from "./project.mjs";
import { findRunning } from "./running.mjs";
import { untilStopped } from "./shutdown.mjs";
import { signingKey } from "./signing-key.mjs";

/** Prints a link, good once and for seven days, by which the person of an address becomes a site administrator. */
await main(() => {
  demandNode();
  const [email, ...rest] = process.argv.slice(2);
  if (!email || rest.length > 0) throw new Trouble("Usage: npm run create-administrator -- ADDRESS");
  return untilStopped((atEnd) => createLink(email, atEnd));
});

async function createLink(email, atEnd) {
  const running = findRunning();
  await installPackages();
  const database = await openDatabase();
  // A running server goes on using the database.
  if (!running) atEnd(database.stop);
  await build(["api"]);
  await runBuilt("prepare", [], {
    RESTBAND_MIGRATIONS_URL: database.urls.migrations,
    RESTBAND_GRANT_TO: database.grantTo,
    RESTBAND_DEMO_PASSWORD: demoPassword(),
    RESTBAND_SIGNING_KEY: signingKey(),
  });
  const output = await runBuilt("create-administrator", [email], { RESTBAND_DATABASE_URL: database.urls.server });
  const { token, fault } = JSON.parse(output);
  if (fault) throw new Trouble(fault);
  const address = process.env.RESTBAND_ADDRESS ?? running?.address ?? "http://127.0.0.1:4780";
  say(`For ${email}, once, within 7 days:\n${address}/welcome/${token}`);
  return 0;
}

function runBuilt(name, args, env) {
  return run(process.execPath, [join(root, "api/dist", `${name}.js`), ...args], { quiet: true, env });
}
