import { sha256 } from "@noble/hashes/sha2.js";
import { bytesToHex, utf8ToBytes } from "@noble/hashes/utils.js";
import { jsonText } from "../json-text.ts";
import type { Scenario, Term } from "./scenario.ts";

/** Records longer than this are named by their digest in the canonical form. */
export const inlinePoints = 1000;

/**
 * The canonical text of a checked scenario (RFC 8785): keys sorted, numbers as ECMAScript prints them, −0 as 0, every
 * default written, long records by their digest. The same scenario gives the same bytes, whoever wrote it, and the text
 * checked and written again is itself.
 */
export function canonicalText(scenario: Scenario): string {
  return jsonText(canonicalForm(scenario), "sorted");
}

/** SHA-256 of the canonical text, lower-case hex. */
export function digestOf(scenario: Scenario): string {
  return digestOfText(canonicalText(scenario));
}

/** SHA-256 of a text's UTF-8, lower-case hex. */
export const digestOfText = (text: string): string => bytesToHex(sha256(utf8ToBytes(text)));

/** A checked scenario with its long records named by digest; their points then travel beside it. */
export function canonicalForm(scenario: Scenario): Scenario {
  return { ...scenario, force: scenario.force.map(storedForm), base: scenario.base.map(storedForm) };
}

/** A term as it is kept: a long record by its digest. */
export function storedForm(term: Term): Term {
  if (!("times" in term) || term.times.length <= inlinePoints) return term;
  const { kind, times, values } = term;
  return { kind, digest: recordDigest(times, values), points: times.length } as Term;
}

/** What a stored record is named by: SHA-256 of its bytes, lower-case hex. */
export const recordDigest = (times: ArrayLike<number>, values: ArrayLike<number>): string =>
  bytesToHex(sha256(recordBytes(times, values)));

/** The bytes of a record: its times, then its values, as little-endian Float64, −0 as 0. */
export function recordBytes(times: ArrayLike<number>, values: ArrayLike<number>): Uint8Array {
  const view = new DataView(new ArrayBuffer(8 * (times.length + values.length)));
  for (let i = 0; i < times.length; i++) view.setFloat64(8 * i, times[i] + 0, true);
  for (let i = 0; i < values.length; i++) view.setFloat64(8 * (times.length + i), values[i] + 0, true);
  return new Uint8Array(view.buffer);
}
