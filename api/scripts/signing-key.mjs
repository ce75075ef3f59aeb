import { generateKeyPairSync } from "node:crypto";
import { join } from "node:path";
import { keep, local } from "./project.mjs";

/**
 * What signs this folder's revisions, decisions and trails, as PKCS #8 in base64: made at the first start and kept. It is
 * part of a backup: with another key, what was signed before is no longer known as this server's.
 */
export function signingKey() {
  return process.env.RESTBAND_SIGNING_KEY ?? keep(join(local, "signing-key"), makeKey);
}

function makeKey() {
  const { privateKey } = generateKeyPairSync("ed25519");
  return privateKey.export({ format: "der", type: "pkcs8" }).toString("base64");
}
