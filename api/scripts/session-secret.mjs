import { randomBytes } from "node:crypto";
import { join } from "node:path";
import { keep, local } from "./project.mjs";

/** What signs the session cookies of this folder's server: kept, so that a restart signs nobody out. */
export function sessionSecret() {
  return (
    process.env.RESTBAND_SESSION_SECRET ?? keep(join(local, "session-secret"), () => randomBytes(32).toString("hex"))
  );
}
