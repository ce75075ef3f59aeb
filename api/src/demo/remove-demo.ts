import { addedTables } from "../chain/chained-tables.ts";
import type { Database } from "../database/database.ts";
import { normaliseEmail } from "../accounts/email.ts";
import { demoPeople } from "./demo-people.ts";

/**
 * Takes the demo away again: the projects that people of the demo own, all that is in them, and the people themselves
 * where no other project has them. Needs the migrations account, for the trail of those projects goes too. Returns the ids
 * of the projects.
 */
export function removeDemo(database: Database): Promise<string[]> {
  return database.transaction(async (transaction) => {
    const people = await peopleOf(transaction);
    const projects = transaction("members")
      .whereIn("account_id", people)
      .where({ role: "owner" })
      .distinct("project_id");
    const ids = (await projects).map((row: { project_id: string }) => row.project_id);
    for (const table of [...addedTables, "chains", "notices", "checklists", "scenarios", "members"])
      await transaction(table).whereIn("project_id", ids).delete();
    await transaction("projects").whereIn("id", ids).delete();
    await removePeople(transaction, people);
    return ids;
  });
}

async function peopleOf(transaction: Database): Promise<string[]> {
  const emails = Object.values(demoPeople).map((person) => normaliseEmail(person.email));
  const rows = await transaction("accounts").whereIn("email_normalised", emails).select<{ id: string }[]>("id");
  return rows.map((row) => row.id);
}

/** Somebody who was added to a project of other people stays: what they did there names them. */
async function removePeople(transaction: Database, people: string[]): Promise<void> {
  const kept = new Set<string>();
  for (const [table, column] of [
    ["members", "account_id"],
    ["scenarios", "created_by"],
    ["scenarios", "updated_by"],
    ["revisions", "frozen_by"],
    ["replays", "replayed_by"],
    ["review_requests", "reviewer_id"],
    ["decisions", "decided_by"],
    ["comments", "said_by"],
  ] as const) {
    const rows = await transaction(table).whereIn(column, people).distinct<{ id: string }[]>(`${column} as id`);
    for (const { id } of rows) kept.add(id);
  }
  await transaction("accounts")
    .whereIn(
      "id",
      people.filter((id) => !kept.has(id)),
    )
    .delete();
}
