import { randomUUID } from "node:crypto";
import type { Database } from "../database/database.ts";
import { isDuplicate } from "../database/database-errors.ts";
import type { Account } from "./accounts-schema.ts";
import { normaliseEmail } from "./email.ts";

const TABLE = "accounts";
const COLUMNS = ["id", "name", "email", "is_administrator", "units"];

export interface NewAccount {
  readonly name: string;
  readonly email: string;
  readonly passwordHash: string;
  readonly isAdministrator: boolean;
}

interface AccountRow {
  id: string;
  name: string;
  email: string;
  is_administrator: number;
  units: Account["units"];
}

interface HashRow {
  id: string;
  password_hash: string;
}

export async function findAccount(database: Database, id: string): Promise<Account | null> {
  const [row] = await database(TABLE).where({ id }).select<AccountRow[]>(COLUMNS);
  return row ? accountOf(row) : null;
}

export async function findAccountByEmail(database: Database, email: string): Promise<Account | null> {
  const [row] = await database(TABLE).where(hasEmail(email)).select<AccountRow[]>(COLUMNS);
  return row ? accountOf(row) : null;
}

export async function findPasswordHash(
  database: Database,
  email: string,
): Promise<{ id: string; passwordHash: string } | null> {
  const [row] = await database(TABLE).where(hasEmail(email)).select<HashRow[]>("id", "password_hash");
  return row ? { id: row.id, passwordHash: row.password_hash } : null;
}

/** Adds an account and returns its id, or null where the address has one already. */
export async function insertAccount(database: Database, account: NewAccount): Promise<string | null> {
  const id = randomUUID();
  const now = new Date();
  try {
    await database(TABLE).insert({
      id,
      name: account.name,
      email: account.email,
      ...hasEmail(account.email),
      password_hash: account.passwordHash,
      is_administrator: account.isAdministrator,
      created_at: now,
      updated_at: now,
    });
    return id;
  } catch (error) {
    if (isDuplicate(error, "accounts_email_normalised_unique")) return null;
    throw error;
  }
}

/** Gives the account of an address a new name and password and returns its id; makes it an administrator's where asked, never takes that away. */
export async function renewAccount(database: Database, account: NewAccount): Promise<string> {
  const itself = database(TABLE).where(hasEmail(account.email));
  await itself.clone().update({
    name: account.name,
    password_hash: account.passwordHash,
    ...(account.isAdministrator && { is_administrator: true }),
    updated_at: new Date(),
  });
  const [row] = await itself.clone().select<{ id: string }[]>("id");
  return row.id;
}

export async function updateUnits(database: Database, id: string, units: Account["units"]): Promise<void> {
  await database(TABLE).where({ id }).update({ units, updated_at: new Date() });
}

function hasEmail(email: string) {
  return { email_normalised: normaliseEmail(email) };
}

function accountOf(row: AccountRow): Account {
  const { id, name, email, units } = row;
  return { id, name, email, units, isAdministrator: row.is_administrator === 1 };
}
