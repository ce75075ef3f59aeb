import type { Account } from "../accounts/accounts-schema.ts";
import type { Database } from "../database/database.ts";
import { isDuplicate } from "../database/database-errors.ts";
import type { Member, Role } from "./members-schema.ts";

const TABLE = "members";

interface MemberRow {
  account_id: string;
  name: string;
  email: string;
  role: Role;
  created_at: Date;
}

interface CallerRow {
  id: string;
  name: string;
  email: string;
  is_administrator: number;
  units: Account["units"];
  role: Role | null;
  archived_at: Date | null;
}

/** Who asks, and what they are in the project asked for. */
export interface Caller {
  readonly account: Account;
  /** Null: no member, or no project asked for. */
  readonly role: Role | null;
  /** True where the project they are a member of is archived. */
  readonly isArchived: boolean;
}

/** Reads an account together with its role in a project in one query. */
export async function findCaller(
  database: Database,
  accountId: string,
  projectId: string | null,
): Promise<Caller | null> {
  const [row] = await database("accounts")
    .leftJoin(TABLE, (join) =>
      join.on("members.account_id", "accounts.id").andOnVal("members.project_id", projectId ?? ""),
    )
    .leftJoin("projects", "projects.id", "members.project_id")
    .where({ "accounts.id": accountId })
    .select<CallerRow[]>(
      "accounts.id",
      "accounts.name",
      "accounts.email",
      "accounts.is_administrator",
      "accounts.units",
      "members.role",
      "projects.archived_at",
    );
  if (!row) return null;
  const { id, name, email, units, is_administrator: isAdministrator, role, archived_at: archivedAt } = row;
  return {
    account: { id, name, email, units, isAdministrator: isAdministrator === 1 },
    role,
    isArchived: archivedAt !== null,
  };
}

/** Members in the order they came. */
export async function listMembers(database: Database, projectId: string): Promise<Member[]> {
  const rows = await membersOf(database, projectId).orderBy("members.created_at");
  return rows.map(memberOf);
}

export async function findMember(database: Database, projectId: string, accountId: string): Promise<Member | null> {
  const [row] = await membersOf(database, projectId).where({ "members.account_id": accountId });
  return row ? memberOf(row) : null;
}

/** Adds a member; false where the account is one already. */
export async function insertMember(
  database: Database,
  projectId: string,
  accountId: string,
  role: Role,
): Promise<boolean> {
  try {
    await database(TABLE).insert({ project_id: projectId, account_id: accountId, role, created_at: new Date() });
    return true;
  } catch (error) {
    if (isDuplicate(error, "PRIMARY")) return false;
    throw error;
  }
}

export async function updateMember(
  database: Database,
  projectId: string,
  accountId: string,
  role: Role,
): Promise<void> {
  await database(TABLE).where({ project_id: projectId, account_id: accountId }).update({ role });
}

export async function deleteMember(database: Database, projectId: string, accountId: string): Promise<void> {
  await database(TABLE).where({ project_id: projectId, account_id: accountId }).delete();
}

/** The roles of all members, by account; locks them until the transaction ends, so that two owners cannot both go. */
export async function lockRoles(transaction: Database, projectId: string): Promise<Map<string, Role>> {
  const rows = await transaction<{ project_id: string; account_id: string; role: Role }>(TABLE)
    .where({ project_id: projectId })
    .select("account_id", "role")
    .forUpdate();
  return new Map(rows.map((row) => [row.account_id, row.role]));
}

function membersOf(database: Database, projectId: string) {
  return database(TABLE)
    .join("accounts", "accounts.id", "members.account_id")
    .where({ "members.project_id": projectId })
    .select<MemberRow[]>("members.account_id", "accounts.name", "accounts.email", "members.role", "members.created_at");
}

function memberOf(row: MemberRow): Member {
  const { account_id: accountId, name, email, role } = row;
  return { accountId, name, email, role, since: row.created_at.toISOString() };
}
