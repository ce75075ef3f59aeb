import { z } from "@restband/solver";
import type { RequestHandler } from "express";
import { type Account, type Role, type RouteName, roles, routes } from "../contract.ts";
import { archived, notAllowed, notFound, notSignedIn } from "../errors.ts";

/**
 * Who may call a route: anybody, anybody signed in, or members of the project in its path who have one of the roles.
 * `orSelf`: also the person whose account the path names, whatever the role. `evenArchived`: a change that is made to an
 * archived project too; all other routes but readings are then refused.
 */
type Permission =
  "public" | "signed-in" | { readonly roles: readonly Role[]; readonly orSelf?: true; readonly evenArchived?: true };

const everyMember = { roles } as const;
const authors = { roles: ["owner", "editor"] } as const;
const owners = { roles: ["owner"] } as const;
const deciders = { roles: ["owner", "reviewer"] } as const;
const commenters = { roles: ["owner", "editor", "reviewer"] } as const;

/** The one role table. A site administrator has no place in it: being one opens no project. */
export const permissions = {
  signUp: "public",
  claimAccount: "public",
  changeAccount: "signed-in",
  readSession: "public",
  signIn: "public",
  signOut: "public",

  listProjects: "signed-in",
  createProject: "signed-in",
  readProject: everyMember,
  changeProject: owners,
  archiveProject: { ...owners, evenArchived: true },
  restoreProject: { ...owners, evenArchived: true },
  listActivity: everyMember,

  listMembers: everyMember,
  addMember: owners,
  changeMember: owners,
  removeMember: { ...owners, orSelf: true, evenArchived: true },

  listScenarios: everyMember,
  createScenario: authors,
  readScenario: everyMember,
  saveScenario: authors,
  readContents: everyMember,
  createCases: authors,
  duplicateScenario: authors,
  moveScenario: authors,
  archiveScenario: authors,
  restoreScenario: authors,

  listExplorations: everyMember,
  createExploration: authors,
  readExploration: everyMember,
  claimExploration: authors,
  releaseExploration: authors,
  readTiles: everyMember,
  saveTile: authors,
  concludeExploration: authors,
  deleteExploration: authors,

  readIntegrity: everyMember,
  listRevisions: everyMember,
  freezeScenario: authors,
  readRevision: everyMember,
  listReplays: everyMember,
  keepReplay: everyMember,
  readReview: everyMember,
  askForReview: authors,
  decideRevision: deciders,
  selfCheckRevision: authors,
  withdrawRevision: owners,
  readChecklist: everyMember,
  setChecklist: owners,
  listComments: everyMember,
  addComment: commenters,
  replyToComment: commenters,
  settleComment: commenters,
  reopenComment: commenters,
  listNotices: "signed-in",
  closeNotice: "signed-in",
} as const satisfies Record<RouteName, Permission>;

/**
 * Finds who an account is, what role it has in a project and whether that is archived; null where there is no such
 * account.
 */
export type FindCaller = (
  accountId: string,
  projectId: string | null,
) => Promise<{ account: Account; role: Role | null; isArchived: boolean } | null>;

/**
 * Lets a request through that the table permits. The role is read anew each time, so that a change acts at once. Who is
 * no member learns nothing, not even that there is a project.
 *
 * @throws Error for a route that has no entry: the server then does not start
 */
export function permit(name: RouteName, findCaller: FindCaller): RequestHandler {
  const permission: Permission | undefined = permissions[name];
  if (!permission) throw new Error(`The route ${name} has no entry in the role table.`);
  if (permission !== "public" && permission !== "signed-in" && !routes[name].path.includes(":projectId")) {
    throw new Error(`The route ${name} asks for a role, but its path names no project.`);
  }
  return async (request, response, next) => {
    if (permission === "public") return next();
    const { accountId } = request.session;
    const projectId = idOf(request.params.projectId);
    const caller = accountId ? await findCaller(accountId, projectId) : null;
    if (!caller) throw notSignedIn();
    if (permission !== "signed-in") {
      demandRole(permission, caller.role, request.params.accountId === accountId);
      if (caller.isArchived && routes[name].method !== "GET" && !permission.evenArchived) throw archived("project");
    }
    Object.assign(response.locals, caller);
    next();
  };
}

function demandRole(permission: Exclude<Permission, string>, role: Role | null, isSelf: boolean): void {
  if (!role) throw notFound();
  if (permission.roles.includes(role) || (permission.orSelf && isSelf)) return;
  throw notAllowed(`Your role in this project is ${role}; this takes ${permission.roles.join(" or ")}.`);
}

/** Null for what cannot be the id of a project: nobody is a member there. */
function idOf(value: string | string[] | undefined): string | null {
  return z.uuid().safeParse(value).data ?? null;
}
