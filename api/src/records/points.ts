import { sha256Of } from "../sha256.ts";

/** The points of a record, by position. */
export interface Points {
  readonly times: readonly number[];
  readonly values: readonly number[];
}

/** The bytes a record is kept as and named by: its times, then its values, as little-endian Float64, −0 as 0. */
export function bytesOf({ times, values }: Points): Buffer {
  const bytes = Buffer.alloc(8 * (times.length + values.length));
  times.forEach((time, i) => bytes.writeDoubleLE(time + 0, 8 * i));
  values.forEach((value, i) => bytes.writeDoubleLE(value + 0, 8 * (times.length + i)));
  return bytes;
}

export function pointsFrom(bytes: Buffer): Points {
  const all = Array.from({ length: bytes.length / 8 }, (_, i) => bytes.readDoubleLE(8 * i));
  return { times: all.slice(0, all.length / 2), values: all.slice(all.length / 2) };
}

/** SHA-256 of the bytes, lower-case hex. */
export const digestOfBytes = (bytes: Buffer): string => sha256Of(bytes).toString("hex");
