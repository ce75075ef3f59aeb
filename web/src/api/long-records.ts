import type { StoredScenario } from "@restband/api/contract";
import type { Term } from "@restband/solver";
import { ApiFailure } from "./api-failure.ts";
import type { Work } from "./work.ts";

/** Records of more points are kept by the server once, and named from then on. */
const LONG = 1000;

const isLong = (term: Term): boolean => "times" in term && term.times.length > LONG;

const termsOf = ({ content, switchedOff }: Work): Term[] => [
  ...content.force,
  ...content.base,
  ...switchedOff.map(({ term }) => term),
];

/** Sends work; the points of long records only where the server has not got them yet. */
export async function sendNamed<Sent>(
  works: readonly Work[],
  send: (works: readonly Work[]) => Promise<Sent>,
): Promise<Sent> {
  if (!works.flatMap(termsOf).some(isLong)) return send(works);
  // Digests need code that a page without long records does without.
  const { named } = await import("./named-records.ts");
  try {
    return await send(works.map(named));
  } catch (error) {
    if (!(error instanceof ApiFailure && error.code === "unknown-record")) throw error;
    return send(works);
  }
}

/** What a server has kept, with the points of the records that were sent to it by their digests. */
export function withPointsOf(sent: Work, stored: StoredScenario): StoredScenario {
  const fill = (mine: readonly Term[]) => (term: Term, i: number) => ("digest" in term ? (mine[i] ?? term) : term);
  const off = fill(sent.switchedOff.map(({ term }) => term));
  const { content } = stored;
  return {
    ...stored,
    content: {
      ...content,
      force: content.force.map(fill(sent.content.force)),
      base: content.base.map(fill(sent.content.base)),
    },
    switchedOff: stored.switchedOff.map((each, i) => ({ ...each, term: off(each.term, i) })),
  };
}
