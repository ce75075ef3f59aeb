import type { z } from "@restband/solver";
import type { AccountsService } from "../accounts/accounts-service.ts";
import { recordAct } from "../activity/activity-service.ts";
import type { Database } from "../database/database.ts";
import { notAllowed, notFound, Refusal, refusedContent } from "../errors.ts";
import type { Member, memberAddSchema, Role } from "./members-schema.ts";
import {
  deleteMember,
  findCaller,
  findMember,
  insertMember,
  listMembers,
  lockRoles,
  updateMember,
} from "./members-store.ts";

export type MembersService = ReturnType<typeof createMembersService>;

/** Who is in a project and as what. A project always has an owner. */
export function createMembersService(database: Database, accounts: AccountsService) {
  const read = async (projectId: string, accountId: string): Promise<Member> =>
    (await findMember(database, projectId, accountId)) ?? noSuchMember();

  return {
    findCaller: (accountId: string, projectId: string | null) => findCaller(database, accountId, projectId),
    list: (projectId: string) => listMembers(database, projectId),

    /** Within the transaction that makes the project. */
    makeOwner: (transaction: Database, projectId: string, accountId: string) =>
      insertMember(transaction, projectId, accountId, "owner"),

    /** Adds the account of an address. Only an owner comes here, and may learn that the address has no account yet. */
    async add(projectId: string, { email, role }: z.infer<typeof memberAddSchema>, by: string): Promise<Member> {
      const account = (await accounts.findByEmail(email)) ?? noAccount(email);
      await database.transaction(async (transaction) => {
        if (!(await insertMember(transaction, projectId, account.id, role))) alreadyMember(account.name);
        await recordAct(transaction, {
          projectId,
          accountId: by,
          act: "member.added",
          subjectId: account.id,
          detail: { role },
        });
      });
      return read(projectId, account.id);
    },

    async change(projectId: string, accountId: string, role: Role, by: string): Promise<Member> {
      await database.transaction(async (transaction) => {
        const before = await lockMember(transaction, { projectId, accountId, by }, role);
        await updateMember(transaction, projectId, accountId, role);
        await recordAct(transaction, {
          projectId,
          accountId: by,
          act: "member.changed",
          subjectId: accountId,
          detail: { before, role },
        });
      });
      return read(projectId, accountId);
    },

    /** Removes a member, by an owner or by itself. */
    async remove(projectId: string, accountId: string, by: string): Promise<void> {
      await database.transaction(async (transaction) => {
        const before = await lockMember(transaction, { projectId, accountId, by }, null);
        await deleteMember(transaction, projectId, accountId);
        await recordAct(transaction, {
          projectId,
          accountId: by,
          act: "member.removed",
          subjectId: accountId,
          detail: { before },
        });
      });
    },
  };
}

/** Who is in a project, as it is in a transaction. */
export function membersIn(transaction: Database, projectId: string): Promise<Member[]> {
  return listMembers(transaction, projectId);
}

/**
 * Locks the members until the transaction ends and makes sure that who asks is an owner still, and that an owner is left once
 * the member has its next role. Anybody may go.
 */
async function lockMember(
  transaction: Database,
  { projectId, accountId, by }: { projectId: string; accountId: string; by: string },
  next: Role | null,
): Promise<Role> {
  const roles = await lockRoles(transaction, projectId);
  const asking = roles.get(by) ?? noSuchMember();
  const isGoing = by === accountId && next === null;
  if (asking !== "owner" && !isGoing) throw notAllowed(`Your role in this project is ${asking}; this takes owner.`);
  const before = roles.get(accountId) ?? noSuchMember();
  const owners = [...roles.values()].filter((role) => role === "owner").length;
  if (before === "owner" && next !== "owner" && owners === 1) {
    throw new Refusal(409, "last-owner", "A project keeps at least one owner. Make somebody else owner first.");
  }
  return before;
}

function noSuchMember(): never {
  throw notFound();
}

function noAccount(email: string): never {
  const message = `There is no account with the address ${email} yet. It can be added once its owner has signed up.`;
  throw refusedContent("no-account", [{ path: "email", message }]);
}

function alreadyMember(name: string): never {
  throw new Refusal(409, "already-member", `${name} is a member already.`, {
    fields: [{ path: "email", message: `${name} is a member already.` }],
  });
}
