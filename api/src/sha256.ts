import { createHash } from "node:crypto";

/** SHA-256 of bytes, or of a text's UTF-8. */
export const sha256Of = (data: string | Buffer): Buffer => createHash("sha256").update(data).digest();
