import { createHash } from "node:crypto";
import { jsonText } from "@restband/solver";
import type { ChainedTable } from "./chained-tables.ts";

/** A row of a chained table as the database has it, or as it is to be added. */
export type Row = Readonly<Record<string, unknown>>;

/** Where a row stands in its chain. */
export interface Place {
  /** From 1. */
  readonly sequence: number;
  /** The hash of the row before it; zeros before the first. */
  readonly previous: Buffer;
}

/** What a row says of its place, and so no part of its content. */
const ownColumns = new Set(["sequence", "previous_hash", "hash", "signature", "signed_by"]);

/**
 * The hash of a row: SHA-256 of its table, place and content as JSON with sorted keys (RFC 8785). What is null is left out,
 * so that a column added later changes no hash; the trail's numbering is the database's, not the row's.
 */
export function hashOf(table: ChainedTable, row: object, { sequence, previous }: Place): Buffer {
  const columns = Object.entries(row as Row).filter(
    ([name, value]) => value !== null && !ownColumns.has(name) && !(table === "activity" && name === "id"),
  );
  const content = Object.fromEntries(columns.map(([name, value]) => [name, plain(name, value)]));
  const text = jsonText({ table, sequence, previous: previous.toString("hex"), row: content }, "sorted");
  return createHash("sha256").update(text).digest();
}

/** The one column of JSON comes back parsed or as text, as the driver has it. */
function plain(name: string, value: unknown): unknown {
  if (value instanceof Date) return value.toISOString();
  if (Buffer.isBuffer(value)) return value.toString("hex");
  if (typeof value === "boolean") return Number(value);
  return name === "detail" && typeof value === "string" ? (JSON.parse(value) as unknown) : value;
}

/** What the signature of a row stands under. */
export const signedRowText = (table: ChainedTable, hash: Buffer) => `restband-row/1 ${table} ${hash.toString("hex")}`;

/** What the signature of a chain's head stands under: nothing can be taken off the end without it. */
export const signedHeadText = (projectId: string, sequence: number, hash: Buffer) =>
  `restband-chain/1 ${projectId} ${sequence} ${hash.toString("hex")}`;
