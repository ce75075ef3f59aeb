import { parseArgs } from "node:util";
import { signHeads } from "./chain/chain.ts";
import { openSeenEnds } from "./chain/seen-ends.ts";
import { openSigningKey } from "./chain/signing-key.ts";
import { openDatabase } from "./database/database.ts";
import { grantToServer } from "./database/grants.ts";
import { migrateUp } from "./database/migrate.ts";
import { demoPeople } from "./demo/demo-people.ts";
import { removeDemo } from "./demo/remove-demo.ts";
import { removeUnusedRecords } from "./records/records-service.ts";
import { seedDemo } from "./demo/seed-demo.ts";

/**
 * Makes a database ready for the server: migrations, rights of the server's account, the demo where nobody has an account
 * yet (or anew with `--reset-demo`). The last line of its output is JSON: the migrations carried out, and who can sign in
 * to the demo.
 */
const { values: options } = parseArgs({ options: { "reset-demo": { type: "boolean", default: false } } });
const {
  RESTBAND_MIGRATIONS_URL: url,
  RESTBAND_GRANT_TO: grantTo,
  RESTBAND_DEMO_PASSWORD: password,
  RESTBAND_SIGNING_KEY: key,
  RESTBAND_SEEN_ENDS: seenEndsFile,
} = process.env;
if (!url || !password || !key) {
  throw new Error("RESTBAND_MIGRATIONS_URL, RESTBAND_DEMO_PASSWORD and RESTBAND_SIGNING_KEY have to be set.");
}

const database = openDatabase(url, openSigningKey(key));
try {
  const migrated = await migrateUp(database);
  // Whoever could clear a signature could have it made anew by a restart: only what a migration has laid just now is signed.
  if (migrated.includes("20261201101000-chain-activity")) await signHeads(database);
  await removeUnusedRecords(database);
  if (grantTo) await grantToServer(database, grantTo);
  if (options["reset-demo"]) openSeenEnds(seenEndsFile || null).forget(await removeDemo(database));
  if (options["reset-demo"] || (await isEmpty())) await seedDemo(database, password);
  console.log(JSON.stringify({ migrated, demoPeople: await findDemoPeople() }));
} finally {
  await database.destroy();
}

async function isEmpty(): Promise<boolean> {
  return (await database("accounts").first("id")) === undefined;
}

async function findDemoPeople() {
  const emails = Object.values(demoPeople).map((person) => person.email);
  return database("accounts").whereIn("email", emails).orderBy("created_at").select<object[]>("name", "email");
}
