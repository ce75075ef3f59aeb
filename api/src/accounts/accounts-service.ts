import { setTimeout as sleep } from "node:timers/promises";
import type { z } from "@restband/solver";
import { recordAct } from "../activity/activity-service.ts";
import type { Database } from "../database/database.ts";
import { refusedContent, Refusal } from "../errors.ts";
import { endSessionsOf } from "../middleware/database-sessions.ts";
import type { Account, accountChangeSchema, claimSchema, signInSchema, signUpSchema } from "./accounts-schema.ts";
import {
  findAccount,
  findAccountByEmail,
  findPasswordHash,
  insertAccount,
  renewAccount,
  updateUnits,
  type NewAccount,
} from "./accounts-store.ts";
import { findOneTimeLink, useOneTimeLink } from "./one-time-links-store.ts";
import { hashPassword, isPassword } from "./passwords.ts";
import { faultOfPassword } from "./password-rules.ts";

const NEUTRAL_MILLISECONDS = 250;

export type AccountsService = ReturnType<typeof createAccountsService>;

/** People who can sign in. */
export function createAccountsService(database: Database) {
  return {
    find: (id: string) => findAccount(database, id),
    findByEmail: (email: string) => findAccountByEmail(database, email),

    /** Remembers what a person thinks in, wherever they sign in next. */
    async change(account: Account, { units }: z.infer<typeof accountChangeSchema>): Promise<Account> {
      await updateUnits(database, account.id, units);
      return { ...account, units };
    },

    /** Makes an account, or does nothing where the address has one: the answer and its time are the same. */
    async signUp({ name, email, password }: z.infer<typeof signUpSchema>): Promise<void> {
      demandGoodPassword(password, { name, email });
      const passwordHash = hashPassword(password);
      const work = database.transaction(async (transaction) => {
        const account = { name, email, passwordHash: await passwordHash, isAdministrator: false };
        const id = await insertAccount(transaction, account);
        if (id) await recordAct(transaction, { projectId: null, accountId: id, act: "account.signed-up" });
      });
      // What a row more takes to write would tell the two apart: neither is answered sooner than this.
      await Promise.all([work, sleep(NEUTRAL_MILLISECONDS)]);
    },

    /** Returns the account's id where address and password belong together, else null: it does not say which was wrong. */
    async identify({ email, password }: z.infer<typeof signInSchema>): Promise<string | null> {
      const found = await findPasswordHash(database, email);
      const isRight = await isPassword(password, found?.passwordHash ?? null);
      return isRight && found ? found.id : null;
    },

    /** Uses a one-time link: makes the account it is bound to, or renews its password; returns its id. */
    async claim({ token, name, password }: z.infer<typeof claimSchema>): Promise<string> {
      const link = (await findOneTimeLink(database, token)) ?? refuseLink();
      demandGoodPassword(password, { name, email: link.email });
      const passwordHash = await hashPassword(password);
      return database.transaction(async (transaction) => {
        if (!(await useOneTimeLink(transaction, token))) refuseLink();
        const account = { name, email: link.email, passwordHash, isAdministrator: link.makesAdministrator };
        const accountId = await insertOrRenew(transaction, account);
        await endSessionsOf(transaction, accountId);
        await recordAct(transaction, { projectId: null, accountId, act: "account.claimed" });
        return accountId;
      });
    },
  };
}

async function insertOrRenew(database: Database, account: NewAccount): Promise<string> {
  const id = await insertAccount(database, account);
  return id ?? renewAccount(database, account);
}

function demandGoodPassword(password: string, own: { name: string; email: string }): void {
  const message = faultOfPassword(password, own);
  if (message) throw refusedContent("weak-password", [{ path: "password", message }]);
}

function refuseLink(): never {
  throw new Refusal(410, "link-used", "This link was used already or is older than 7 days. Ask for a new one.");
}
