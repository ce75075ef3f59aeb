import { insertOneTimeLink } from "./accounts/one-time-links-store.ts";
import { emailSchema } from "./accounts/accounts-schema.ts";
import { openDatabase } from "./database/database.ts";

/** Keeps a one-time link for the address given and prints its token as JSON: `{"token"}` or, where it is no address, `{"fault"}`. */
const { RESTBAND_DATABASE_URL: url } = process.env;
if (!url) throw new Error("RESTBAND_DATABASE_URL has to be set.");

const { data: email } = emailSchema.safeParse(process.argv[2]);
console.log(JSON.stringify(email ? { token: await keepLink(url, email) } : { fault: "This is no e-mail address." }));

async function keepLink(databaseUrl: string, address: string): Promise<string> {
  const database = openDatabase(databaseUrl);
  try {
    return await insertOneTimeLink(database, { email: address, makesAdministrator: true });
  } finally {
    await database.destroy();
  }
}
