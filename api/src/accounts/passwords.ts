import { hash, verify } from "@node-rs/argon2";

/** OWASP's second argon2id setting (19 MiB, 2 passes, 1 lane); argon2id is the library's default algorithm. */
const cost = { memoryCost: 19456, timeCost: 2, parallelism: 1 };

/** A hash of nothing anybody can type, so that an unknown address costs as much time as a known one. */
const nobody = hash(Buffer.from([0xff, 0xfe, ...crypto.getRandomValues(new Uint8Array(32))]), cost);

/** Hashes a password with argon2id; composed and decomposed letters of other keyboards count as the same. */
export function hashPassword(password: string): Promise<string> {
  return hash(password.normalize("NFKC"), cost);
}

/** True where the password belongs to the hash. Takes the same time with no hash at all, and is then false. */
export async function isPassword(password: string, passwordHash: string | null): Promise<boolean> {
  return verify(passwordHash ?? (await nobody), password.normalize("NFKC"));
}
