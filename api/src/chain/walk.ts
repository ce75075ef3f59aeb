import { type Database, seenEndsOf, signingKeyOf } from "../database/database.ts";
import { digestsIn, recordFaults } from "../records/records-service.ts";
import type { ChainFault } from "./chain-schema.ts";
import { type ChainedTable, chainedTables, nowhere, signedTables } from "./chained-tables.ts";
import { hashOf, type Row, signedHeadText, signedRowText } from "./link.ts";
import type { SeenEnd } from "./seen-ends.ts";
import { fingerprintOf, isSignedBy, type SigningKey } from "./signing-key.ts";

/** Rows of one table read at a time. */
const STRIDE = 200;

export interface Link {
  sequence: number;
  previous_hash: Buffer;
  hash: Buffer;
  signature?: Buffer | null;
  signed_by?: Buffer | null;
}

interface Head extends Omit<Link, "previous_hash"> {
  project_id: string;
}

interface Found {
  readonly table: ChainedTable;
  readonly row: Row & Link;
}

/** What going through a chain has found. */
export interface Walk {
  readonly rows: number;
  readonly faults: readonly ChainFault[];
  /** Null where the chain has none. */
  readonly end: SeenEnd | null;
}

/**
 * Goes through the whole chain of a project, oldest row first: each row at its place, as it was when its hash was made, after
 * the row it names, signed where its table asks for it; and the end where its signed head says, no less far than it was seen
 * before. Reads one state of the database, so that what is added meanwhile is no fault.
 */
export async function walkChain(database: Database, projectId: string | null): Promise<Walk> {
  const seenEnds = seenEndsOf(database);
  // Before the database is read: what is seen afterwards may be newer than what is read.
  const seen = seenEnds.of(projectId ?? nowhere);
  const walk = await walkFrom(database, projectId, seen);
  if (walk.end && walk.faults.length === 0) seenEnds.note(projectId ?? nowhere, walk.end);
  return walk;
}

function walkFrom(database: Database, projectId: string | null, seen: SeenEnd | undefined): Promise<Walk> {
  return database.transaction(async (transaction) => {
    const head = await transaction("chains")
      .where({ project_id: projectId ?? nowhere })
      .first<Head>();
    const walker = new Walker(projectId, signingKeyOf(database), seen);
    if (!head) return walker.lacksHead();
    for (let from = 1; from <= head.sequence; from += STRIDE) {
      const found = await linksOf(transaction, projectId, from, from + STRIDE);
      for (const link of found) walker.pass(link);
    }
    for (const link of await linksOf(transaction, projectId, head.sequence + 1, Infinity)) walker.pass(link);
    if (projectId) walker.passRecords(await recordFaults(transaction, projectId, walker.records));
    return walker.end(head);
  });
}

/** The rows of all chained tables whose places lie in [from, to), in the order of their places. */
async function linksOf(database: Database, projectId: string | null, from: number, to: number): Promise<Found[]> {
  const found: Found[] = [];
  for (const table of chainedTables) {
    const rows = await database(table)
      .where({ project_id: projectId })
      .where("sequence", ">=", from)
      .modify((query) => to < Infinity && void query.where("sequence", "<", to))
      .select<(Row & Link)[]>("*");
    found.push(...rows.map((row) => ({ table, row })));
  }
  return found.sort((a, b) => a.row.sequence - b.row.sequence);
}

/** Follows one chain and notes what does not fit. */
class Walker {
  readonly #projectId: string | null;
  readonly #key: SigningKey;
  readonly #seen: SeenEnd | undefined;
  readonly #faults: ChainFault[] = [];
  /** Digests of the records that what was frozen names. */
  readonly records: string[] = [];
  #rows = 0;
  #sequence = 0;
  /** Of the row passed last; null where that one is gone. */
  #hash: Buffer | null = Buffer.alloc(32);

  constructor(projectId: string | null, key: SigningKey, seen: SeenEnd | undefined) {
    this.#projectId = projectId;
    this.#key = key;
    this.#seen = seen;
  }

  pass({ table, row }: Found): void {
    const id = typeof row.id === "string" || typeof row.id === "number" ? String(row.id) : null;
    const note = (message: string) => this.#note({ table, id, sequence: row.sequence, message });
    this.#noteGap(row.sequence);
    if (this.#hash && !row.previous_hash.equals(this.#hash)) note("It does not follow the row before it.");
    for (const fault of rowFaults(table, row, this.#key)) note(fault);
    if (row.sequence === this.#seen?.sequence && row.hash.toString("hex") !== this.#seen.hash)
      note("Another row stood at this place when it was last looked at.");
    if (table === "revisions") this.records.push(...digestsIn(String(row.content)));
    this.#rows += 1;
    this.#sequence = row.sequence;
    this.#hash = row.hash;
  }

  /** Points are no links of the chain: they stand or fall with the digest that a link names. */
  passRecords(faults: readonly { digest: string; message: string }[]): void {
    for (const { digest, message } of faults) this.#note({ table: "records", id: digest, sequence: 0, message });
  }

  /** Rows that are gone, and rows that stand twice at one place. */
  #noteGap(sequence: number): void {
    const expected = this.#sequence + 1;
    if (sequence === expected) return;
    const message =
      sequence < expected ? "Two rows stand at this place." : `${sequence - expected} missing before ${sequence}.`;
    this.#note({ table: "chains", id: null, sequence: Math.min(sequence, expected), message });
    // A row after a gap cannot follow what is gone: the gap tells it.
    this.#hash = null;
  }

  end(head: Head): Walk {
    const note = (message: string) => this.#note({ table: "chains", id: null, sequence: head.sequence, message });
    if (head.sequence !== this.#sequence) note(`${head.sequence} rows were added, ${this.#sequence} are there.`);
    else if (this.#hash && !head.hash.equals(this.#hash)) note("The last row is not the one that was added last.");
    const text = signedHeadText(this.#projectId ?? nowhere, head.sequence, head.hash);
    for (const fault of signatureFaults(head, text, this.#key)) note(fault);
    this.#noteLoss(head.sequence);
    return this.#walk({ sequence: head.sequence, hash: head.hash.toString("hex") });
  }

  /** Rows that are gone together with the end that told of them. */
  #noteLoss(sequence: number): void {
    const before = this.#seen?.sequence ?? 0;
    if (before <= sequence) return;
    const message = `${before} rows were there when it was last looked at, ${sequence} are left.`;
    this.#note({ table: "chains", id: null, sequence, message });
  }

  lacksHead(): Walk {
    this.#note({ table: "chains", id: null, sequence: 0, message: "There is no end of the chain." });
    this.#noteLoss(0);
    return this.#walk(null);
  }

  #walk(end: SeenEnd | null): Walk {
    return { rows: this.#rows, faults: this.#faults, end };
  }

  #note(fault: Omit<ChainFault, "projectId">): void {
    this.#faults.push({ projectId: this.#projectId, ...fault });
  }
}

/** What does not fit in a row by itself, as sentences: empty for a row as it was added. */
export function rowFaults(table: ChainedTable, row: Link, key: SigningKey): string[] {
  const hash = hashOf(table, row, { sequence: row.sequence, previous: row.previous_hash });
  return [
    ...(hash.equals(row.hash) ? [] : ["It was changed after it was written."]),
    ...(signedTables.has(table) ? signatureFaults(row, signedRowText(table, row.hash), key) : []),
  ];
}

function signatureFaults(
  { signature, signed_by: by }: Pick<Link, "signature" | "signed_by">,
  text: string,
  key: SigningKey,
): string[] {
  if (!signature || !by || !isSignedBy(by, text, signature)) return ["Its signature does not fit."];
  return key.trusts(by) ? [] : [`It is signed with a key this server does not know, ${fingerprintOf(by)}.`];
}
