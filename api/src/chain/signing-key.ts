import { createHash, createPrivateKey, createPublicKey, sign, verify } from "node:crypto";

/** The Ed25519 key a server signs with. */
export interface SigningKey {
  /** The 32 bytes of the public key. */
  readonly publicKey: Buffer;
  /** SHA-256 of the public key, lower-case hex: what people compare. */
  readonly fingerprint: string;
  sign(text: string): Buffer;
  /** True for its own public key and those this server signed with before. */
  trusts(publicKey: Buffer): boolean;
}

/** What an Ed25519 public key has before its 32 bytes as SubjectPublicKeyInfo (RFC 8410). */
const PREFIX = Buffer.from("302a300506032b6570032100", "hex");

/**
 * @param text the private key, PKCS #8 in base64
 * @param former fingerprints of keys that were in use before and are trusted still
 * @throws Error where it is no Ed25519 key
 */
export function openSigningKey(text: string, former: readonly string[] = []): SigningKey {
  const privateKey = createPrivateKey({ key: Buffer.from(text, "base64"), format: "der", type: "pkcs8" });
  if (privateKey.asymmetricKeyType !== "ed25519") throw new Error("The signing key has to be an Ed25519 key.");
  const publicKey = createPublicKey(privateKey).export({ format: "der", type: "spki" }).subarray(PREFIX.length);
  const fingerprint = fingerprintOf(publicKey);
  const trusted = new Set([fingerprint, ...former]);
  return {
    publicKey,
    fingerprint,
    sign: (signed) => sign(null, Buffer.from(signed), privateKey),
    trusts: (other) => trusted.has(fingerprintOf(other)),
  };
}

/** SHA-256 of a public key's 32 bytes, lower-case hex. */
export function fingerprintOf(publicKey: Buffer): string {
  return createHash("sha256").update(publicKey).digest("hex");
}

/** True where the owner of the public key (its 32 bytes) has signed the text. */
export function isSignedBy(publicKey: Buffer, text: string, signature: Buffer): boolean {
  const key = createPublicKey({ key: Buffer.concat([PREFIX, publicKey]), format: "der", type: "spki" });
  return verify(null, Buffer.from(text), key, signature);
}
