import { createHash } from "node:crypto";

/** True where the digest is the SHA-256 of the text, byte by byte. */
export function isOfDigest(text: string, digest: Buffer): boolean {
  return createHash("sha256").update(text).digest().equals(digest);
}
