import type { SwitchedOff } from "@restband/api/contract";
import { jsonText, type Scenario } from "@restband/solver";
import { laterPart } from "../../../later-part.ts";

/** What is kept of a draft: the scenario in force, and the terms switched off beside it. */
export interface Work {
  readonly content: Scenario;
  readonly switchedOff: readonly SwitchedOff[];
}

// Hashing is no part of the first paint: it tells only whether a record is the one that is named by its digest.
const digests = laterPart(() => import("./content-digest.ts"));

/** Whatever the order of their members. */
export const isSame = (a: unknown, b: unknown): boolean => jsonText(a, "sorted") === jsonText(b, "sorted");

/**
 * Whether two scenarios are the same in all that is stored. A long record may stand in one with its points and in the other
 * by its digest; until that can be told, they are not.
 */
export function isSameScenario(a: Scenario, b: Scenario): boolean {
  if (isSame(a, b)) return true;
  if (!hasDigest(a) && !hasDigest(b)) return false;
  void digests.ask();
  const there = digests.now();
  return there !== null && there.digestOf(a) === there.digestOf(b);
}

const hasDigest = ({ force, base }: Scenario): boolean => [...force, ...base].some((term) => "digest" in term);

/** Whether two versions are the same in all that is stored. */
export const isSameWork = (a: Work, b: Work): boolean =>
  isSameScenario(a.content, b.content) && isSame(a.switchedOff, b.switchedOff);
