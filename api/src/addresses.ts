/** Where a route is reached: an express path under `/api`. */
export interface Address {
  readonly method: "GET" | "POST" | "PUT" | "PATCH" | "DELETE";
  readonly path: string;
}

/**
 * Every route by name, and its address. Apart from what goes in and comes out (`contract.ts`): the page needs the addresses
 * for its first call, and would load every schema with them.
 */
export const addresses = {
  signUp: { method: "POST", path: "/accounts" },
  claimAccount: { method: "POST", path: "/accounts/claim" },
  changeAccount: { method: "PATCH", path: "/account" },
  readSession: { method: "GET", path: "/session" },
  signIn: { method: "POST", path: "/session" },
  signOut: { method: "DELETE", path: "/session" },
  listProjects: { method: "GET", path: "/projects" },
  createProject: { method: "POST", path: "/projects" },
  readProject: { method: "GET", path: "/projects/:projectId" },
  changeProject: { method: "PATCH", path: "/projects/:projectId" },
  archiveProject: { method: "POST", path: "/projects/:projectId/archive" },
  restoreProject: { method: "POST", path: "/projects/:projectId/restore" },
  listActivity: { method: "GET", path: "/projects/:projectId/activity" },
  listMembers: { method: "GET", path: "/projects/:projectId/members" },
  addMember: { method: "POST", path: "/projects/:projectId/members" },
  changeMember: { method: "PATCH", path: "/projects/:projectId/members/:accountId" },
  removeMember: { method: "DELETE", path: "/projects/:projectId/members/:accountId" },
  listScenarios: { method: "GET", path: "/projects/:projectId/scenarios" },
  createScenario: { method: "POST", path: "/projects/:projectId/scenarios" },
  readScenario: { method: "GET", path: "/projects/:projectId/scenarios/:scenarioId" },
  saveScenario: { method: "PUT", path: "/projects/:projectId/scenarios/:scenarioId" },
  readContents: { method: "GET", path: "/projects/:projectId/contents" },
  createCases: { method: "POST", path: "/projects/:projectId/cases" },
  duplicateScenario: { method: "POST", path: "/projects/:projectId/scenarios/:scenarioId/duplicate" },
  moveScenario: { method: "POST", path: "/projects/:projectId/scenarios/:scenarioId/move" },
  archiveScenario: { method: "POST", path: "/projects/:projectId/scenarios/:scenarioId/archive" },
  restoreScenario: { method: "POST", path: "/projects/:projectId/scenarios/:scenarioId/restore" },
  listExplorations: { method: "GET", path: "/projects/:projectId/scenarios/:scenarioId/explorations" },
  createExploration: { method: "POST", path: "/projects/:projectId/scenarios/:scenarioId/explorations" },
  readExploration: { method: "GET", path: "/projects/:projectId/explorations/:explorationId" },
  claimExploration: { method: "POST", path: "/projects/:projectId/explorations/:explorationId/claim" },
  releaseExploration: { method: "POST", path: "/projects/:projectId/explorations/:explorationId/release" },
  readTiles: { method: "GET", path: "/projects/:projectId/explorations/:explorationId/tiles" },
  saveTile: { method: "PUT", path: "/projects/:projectId/explorations/:explorationId/tiles/:number" },
  concludeExploration: { method: "PUT", path: "/projects/:projectId/explorations/:explorationId/conclusion" },
  deleteExploration: { method: "DELETE", path: "/projects/:projectId/explorations/:explorationId" },
  readIntegrity: { method: "GET", path: "/projects/:projectId/integrity" },
  listRevisions: { method: "GET", path: "/projects/:projectId/revisions" },
  freezeScenario: { method: "POST", path: "/projects/:projectId/scenarios/:scenarioId/revisions" },
  readRevision: { method: "GET", path: "/projects/:projectId/revisions/:revisionId" },
  listReplays: { method: "GET", path: "/projects/:projectId/revisions/:revisionId/replays" },
  keepReplay: { method: "POST", path: "/projects/:projectId/revisions/:revisionId/replays" },
  readReview: { method: "GET", path: "/projects/:projectId/revisions/:revisionId/review" },
  askForReview: { method: "POST", path: "/projects/:projectId/revisions/:revisionId/requests" },
  decideRevision: { method: "POST", path: "/projects/:projectId/revisions/:revisionId/decision" },
  selfCheckRevision: { method: "POST", path: "/projects/:projectId/revisions/:revisionId/self-check" },
  withdrawRevision: { method: "POST", path: "/projects/:projectId/revisions/:revisionId/withdrawal" },
  readChecklist: { method: "GET", path: "/projects/:projectId/checklist" },
  setChecklist: { method: "PUT", path: "/projects/:projectId/checklist" },
  listComments: { method: "GET", path: "/projects/:projectId/revisions/:revisionId/comments" },
  addComment: { method: "POST", path: "/projects/:projectId/revisions/:revisionId/comments" },
  replyToComment: { method: "POST", path: "/projects/:projectId/revisions/:revisionId/comments/:commentId/replies" },
  settleComment: { method: "POST", path: "/projects/:projectId/revisions/:revisionId/comments/:commentId/settle" },
  reopenComment: { method: "POST", path: "/projects/:projectId/revisions/:revisionId/comments/:commentId/reopen" },
  listNotices: { method: "GET", path: "/notices" },
  closeNotice: { method: "DELETE", path: "/notices/:noticeId" },
} as const satisfies Record<string, Address>;

export type RouteName = keyof typeof addresses;
