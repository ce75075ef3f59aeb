import { z } from "@restband/solver";
import { addresses } from "../addresses.ts";

/** A row that is not as it was written, or does not follow the one before it. */
export const chainFaultSchema = z.strictObject({
  /** Null for the acts that concern no project. */
  projectId: z.uuid().nullable(),
  /** "revisions" and the like; "chains" for a row that is gone, and for the end of the chain; "records" for points. */
  table: z.string(),
  /** The row's own id, of points their digest; null where it is gone. */
  id: z.string().nullable(),
  /** Its place in the chain, from 1; 0 for points, which have none. */
  sequence: z.number().int(),
  message: z.string(),
});
export type ChainFault = z.infer<typeof chainFaultSchema>;

/** Whether everything a project's trail is made of is as it was written. */
export const integritySchema = z.strictObject({
  isWhole: z.boolean(),
  checkedAt: z.iso.datetime(),
  /** Rows gone through. */
  rows: z.number().int(),
  faults: z.array(chainFaultSchema),
  /** SHA-256 of the public key this server signs with, lower-case hex. */
  fingerprint: z.string(),
  /** False: the server's database account could change these rows, so that the database guards nothing. */
  isGuarded: z.boolean(),
});
export type Integrity = z.infer<typeof integritySchema>;

export const chainContract = {
  readIntegrity: {
    ...addresses.readIntegrity,
    params: z.strictObject({ projectId: z.uuid() }),
    status: 200,
    response: integritySchema,
  },
} as const;
