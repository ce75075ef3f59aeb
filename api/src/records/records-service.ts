import type { RecordTerm, Scenario, Term } from "@restband/solver";
import type { Database } from "../database/database.ts";
import { type FieldFault, Refusal, refusedContent } from "../errors.ts";
import { bytesOf, type Points, pointsFrom } from "./points.ts";
import {
  copyRecords,
  countPoints,
  deleteUnused,
  findAltered,
  findRecords,
  insertRecords,
  lockRecordBytes,
} from "./records-store.ts";

/** What the records of one project may hold together. */
const MOST_BYTES = 200_000_000;

/** A record that something to be kept names by its digest. */
export interface NamedRecord {
  /** Of the term that names it, as `force[0]`. */
  readonly path: string;
  readonly digest: string;
  readonly points: number;
  /** Its points where they were sent along; null where the digest alone was. */
  readonly given: Points | null;
}

type Terms = Readonly<Record<string, Term>>;
type Stored = Extract<RecordTerm<string>, { digest: string }>;

const isStored = (term: Term): term is Term & Stored => "digest" in term;

/**
 * The records that terms name in the form they are kept in.
 * @param kept terms by their paths, long records named by digest
 * @param sent the same terms as they were sent
 */
export function namedRecords(kept: Terms, sent: Terms): NamedRecord[] {
  return Object.entries(kept).flatMap(([path, term]) => {
    if (!isStored(term)) return [];
    const given = sent[path];
    return [{ path, digest: term.digest, points: term.points, given: "times" in given ? given : null }];
  });
}

/** The terms of a scenario by their paths. */
export function termsOf({ force, base }: Pick<Scenario, "force" | "base">): Terms {
  const named = { force, base };
  const places = ["force", "base"] as const;
  return Object.fromEntries(places.flatMap((place) => named[place].map((term, i) => [`${place}[${i}]`, term])));
}

/**
 * Keeps the points of records with a project, each once, in the transaction that keeps what names them.
 * @throws Refusal 422 where only a digest was sent of what the project has not, 507 where its store is full
 */
export async function keepRecords(
  transaction: Database,
  projectId: string,
  records: readonly NamedRecord[],
): Promise<void> {
  const isSent = ({ given }: NamedRecord) => given !== null;
  const named = records.filter((record) => !isSent(record));
  const there = await countPoints(transaction, projectId, digestsOf(named), { isHeld: true });
  const faults = named.flatMap((record) => (there.get(record.digest) === record.points ? [] : lackOf(record)));
  if (faults.length > 0) throw refusedContent("unknown-record", faults);
  await addMissing(transaction, projectId, records.filter(isSent));
}

async function addMissing(transaction: Database, projectId: string, records: readonly NamedRecord[]): Promise<void> {
  const known = await countPoints(transaction, projectId, digestsOf(records), { isHeld: false });
  const byDigest = new Map(records.map((record) => [record.digest, record]));
  const missing = [...byDigest.values()].filter(({ digest }) => !known.has(digest));
  if (missing.length === 0) return;
  await demandRoom(transaction, projectId, missing);
  const added = missing.flatMap(({ digest, given }) => (given ? [{ digest, bytes: bytesOf(given) }] : []));
  await insertRecords(transaction, projectId, added);
}

/** Fills in the points of terms that name records of a project; a term whose points are not to be had stays as it is. */
export type Fill = (term: Term) => Term;

export async function fillingOf(database: Database, projectId: string, terms: readonly Term[]): Promise<Fill> {
  const digests = [...new Set(terms.filter(isStored).map(({ digest }) => digest))];
  const found = await findRecords(database, projectId, digests);
  return (term) => {
    const bytes = isStored(term) ? found.get(term.digest) : undefined;
    return bytes ? ({ kind: term.kind, ...pointsFrom(bytes) } as Term) : term;
  };
}

/** A scenario with the points of its records. */
export async function withPoints(database: Database, projectId: string, scenario: Scenario): Promise<Scenario> {
  const fill = await fillingOf(database, projectId, [...scenario.force, ...scenario.base]);
  return { ...scenario, force: scenario.force.map(fill), base: scenario.base.map(fill) };
}

/** The points that the long records of a scenario have, as it is kept. */
export function storedPoints({ force, base }: Scenario): number {
  return [...force, ...base].filter(isStored).reduce((sum, { points }) => sum + points, 0);
}

/** Paths of the terms that lack the points they name. */
export function pathsWithoutPoints(scenario: Scenario): string[] {
  return Object.entries(termsOf(scenario)).flatMap(([path, term]) => (isStored(term) ? [path] : []));
}

/** Gives another project the records that texts of this one name, for what is moved there. */
export function moveRecords(
  transaction: Database,
  texts: readonly string[],
  way: { from: string; to: string },
): Promise<void> {
  return copyRecords(transaction, [...new Set(texts.flatMap(digestsIn))], way);
}

/** Digests of records that a text of JSON names. */
export function digestsIn(text: string): string[] {
  return [...text.matchAll(/"digest":"([0-9a-f]{64})"/gu)].map(([, digest]) => digest);
}

/** What is wrong with the records of a project: those that were changed, and those named by it that are gone. */
export async function recordFaults(
  database: Database,
  projectId: string,
  named: readonly string[],
): Promise<{ digest: string; message: string }[]> {
  const altered = await findAltered(database, projectId);
  const there = await countPoints(database, projectId, named, { isHeld: false });
  const gone = [...new Set(named)].filter((digest) => !there.has(digest));
  return [
    ...altered.map((digest) => ({ digest, message: "These points were changed after they were kept." })),
    ...gone.map((digest) => ({ digest, message: "The points of a frozen record are gone." })),
  ];
}

/** Removes what nothing names any more. Needs the migrations account. */
export const removeUnusedRecords = (database: Database): Promise<void> => deleteUnused(database);

const digestsOf = (records: readonly NamedRecord[]): string[] => records.map(({ digest }) => digest);

function lackOf({ path, points }: NamedRecord): FieldFault[] {
  const message = `The ${points} points of this record are not in this project. Send them along.`;
  return [{ path: `${path}.digest`, message }];
}

async function demandRoom(transaction: Database, projectId: string, missing: readonly NamedRecord[]): Promise<void> {
  const held = await lockRecordBytes(transaction, projectId);
  const wanted = missing.reduce((sum, { points }) => sum + points * 16, 0);
  if (held + wanted <= MOST_BYTES) return;
  const [used, most] = [held, MOST_BYTES].map((bytes) => Math.round(bytes / 1e6));
  const message = `The records of this project hold ${used} of ${most} MB. Records that nothing uses any more are removed when the server starts anew; until then use shorter ones.`;
  throw new Refusal(507, "full-store", message);
}
