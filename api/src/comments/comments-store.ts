import { randomUUID } from "node:crypto";
import { append } from "../chain/chain.ts";
import { type Link, rowFaults } from "../chain/walk.ts";
import { type Database, signingKeyOf } from "../database/database.ts";
import type { Anchor, Comment } from "./comments-schema.ts";

const TABLE = "comments";

/** One entry of the log, as it is added. */
export interface Entry {
  readonly projectId: string;
  readonly revisionId: string;
  readonly entry: "comment" | "answer" | "settle" | "reopen";
  /** The comment that is answered, settled or opened again. */
  readonly parentId?: string;
  readonly anchor?: Anchor;
  readonly words?: string;
  readonly mentions?: readonly string[];
  readonly saidBy: string;
}

interface EntryRow extends Link {
  id: string;
  entry: Entry["entry"];
  parent_id: string | null;
  anchor: string | null;
  words: string | null;
  mentions: string | null;
  said_by: string;
  said_at: Date;
  name: string;
}

export async function insertEntry(transaction: Database, entry: Entry): Promise<string> {
  const id = randomUUID();
  await append(transaction, TABLE, {
    ...{ id, project_id: entry.projectId, revision_id: entry.revisionId, entry: entry.entry },
    parent_id: entry.parentId ?? null,
    anchor: entry.anchor ? JSON.stringify(entry.anchor) : null,
    words: entry.words ?? null,
    mentions: entry.mentions ? JSON.stringify(entry.mentions) : null,
    ...{ said_by: entry.saidBy, said_at: new Date() },
  });
  return id;
}

/** The comments of a revision, oldest first, each with what was said to it. */
export async function listComments(database: Database, revisionId: string): Promise<Comment[]> {
  const rows = await database(TABLE)
    .join("accounts", "accounts.id", "comments.said_by")
    .where({ revision_id: revisionId })
    .orderBy("comments.sequence")
    .select<EntryRow[]>("comments.*", "accounts.name");
  const names = await namesOf(database, rows);
  const said = (row: EntryRow) => saidFrom(row, names, faultsOf(database, row));
  return rows
    .filter(({ entry }) => entry === "comment")
    .map((row, i) => {
      const thread = rows.filter(({ parent_id: parentId }) => parentId === row.id);
      const answers = thread.filter(({ entry }) => entry === "answer");
      const last = thread.filter(({ entry }) => entry !== "answer").at(-1);
      return {
        ...said(row),
        number: i + 1,
        anchor: JSON.parse(row.anchor!) as Anchor,
        replies: answers.map(said),
        settled: last?.entry === "settle" ? { by: personFrom(last), at: last.said_at.toISOString() } : null,
      };
    });
}

/** The names of everybody who is mentioned. */
async function namesOf(database: Database, rows: readonly EntryRow[]): Promise<Map<string, string>> {
  const ids = new Set(rows.flatMap(({ mentions }) => mentionsFrom(mentions)));
  if (ids.size === 0) return new Map();
  const found = await database("accounts")
    .whereIn("id", [...ids])
    .select<{ id: string; name: string }[]>("id", "name");
  return new Map(found.map(({ id, name }) => [id, name]));
}

function saidFrom(row: EntryRow, names: ReadonlyMap<string, string>, faults: string[]) {
  return {
    id: row.id,
    by: personFrom(row),
    at: row.said_at.toISOString(),
    words: row.words ?? "",
    mentions: mentionsFrom(row.mentions).map((accountId) => ({ accountId, name: names.get(accountId) ?? "" })),
    faults,
  };
}

function faultsOf(database: Database, { name: _joined, ...row }: EntryRow): string[] {
  return rowFaults(TABLE, row, signingKeyOf(database));
}

const mentionsFrom = (text: string | null): string[] => (text === null ? [] : (JSON.parse(text) as string[]));
const personFrom = ({ said_by: accountId, name }: EntryRow) => ({ accountId, name });
