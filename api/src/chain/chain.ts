import type { Knex } from "knex";
import { type Database, seenEndsOf, signingKeyOf } from "../database/database.ts";
import { type ChainedTable, nowhere, signedTables } from "./chained-tables.ts";
import type { SeenEnd } from "./seen-ends.ts";
import { hashOf, type Row, signedHeadText, signedRowText } from "./link.ts";

interface Head {
  sequence: number;
  hash: Buffer;
}

/** Begins the chain of a new project, in the transaction that makes it; its first row signs it. */
export async function openChain(transaction: Database, projectId: string): Promise<void> {
  await transaction("chains").insert({ project_id: projectId, sequence: 0, hash: Buffer.alloc(32) });
}

/**
 * Holds the end of a project's chain until the transaction ends: what is read after this, nobody else can add to. Null
 * stands for the acts that concern no project.
 */
export async function holdChain(transaction: Database, projectId: string | null): Promise<Head> {
  const head = await transaction("chains")
    .where({ project_id: projectId ?? nowhere })
    .first<Head>("sequence", "hash")
    .forUpdate();
  if (!head) throw new Error(`There is no chain for ${projectId ?? nowhere}.`);
  return head;
}

/**
 * Adds a row to one of the chained tables as the next link of its project's chain, signed where its table asks for it.
 * Comes late in a transaction: from here on everybody else who adds to the project waits.
 *
 * @param row all its columns but those of the chain; `project_id` says which chain
 */
export async function append(transaction: Database, table: ChainedTable, row: Row): Promise<void> {
  const projectId = (row.project_id as string | null) ?? null;
  const head = await holdChain(transaction, projectId);
  const place = { sequence: head.sequence + 1, previous: head.hash };
  const hash = hashOf(table, row, place);
  const link = { sequence: place.sequence, previous_hash: place.previous, hash };
  const signed = signedTables.has(table) ? signature(transaction, signedRowText(table, hash)) : {};
  await transaction(table).insert({ ...row, ...link, ...signed });
  await moveHead(transaction, projectId ?? nowhere, { sequence: place.sequence, hash });
  noteOnceDone(transaction, projectId ?? nowhere, { sequence: place.sequence, hash: hash.toString("hex") });
}

/** Notes an end once its transaction stands; one that is taken back was never seen. */
function noteOnceDone(transaction: Database, projectId: string, end: SeenEnd): void {
  const note = () => seenEndsOf(transaction).note(projectId, end);
  (transaction as Knex.Transaction).executionPromise.then(note, () => undefined);
}

async function moveHead(transaction: Database, projectId: string, { sequence, hash }: Head): Promise<void> {
  const head = { sequence, hash, ...signature(transaction, signedHeadText(projectId, sequence, hash)) };
  await transaction("chains").where({ project_id: projectId }).update(head);
}

function signature(database: Database, text: string) {
  const key = signingKeyOf(database);
  return { signature: key.sign(text), signed_by: key.publicKey };
}

/** Signs the heads that a migration has laid; run with the key, by what carries migrations out. */
export async function signHeads(database: Database): Promise<void> {
  const heads = await database("chains")
    .whereNull("signature")
    .select<(Head & { project_id: string })[]>("project_id", "sequence", "hash");
  for (const { project_id: projectId, sequence, hash } of heads) {
    await database("chains")
      .where({ project_id: projectId, sequence })
      .whereNull("signature")
      .update(signature(database, signedHeadText(projectId, sequence, hash)));
  }
}
