import { z } from "@restband/solver";
import { claimSchema, sessionSchema, signInSchema, signUpSchema } from "./accounts/accounts-schema.ts";
import { activitySchema } from "./activity/activity-schema.ts";
import {
  claimExplorationSchema,
  conclusionSchema,
  explorationDraftSchema,
  explorationSchema,
  explorationSummarySchema,
  runnerSchema,
  tileDraftSchema,
  tileNumbersSchema,
  tileSchema,
} from "./explorations/explorations-schema.ts";
import { memberAddSchema, memberChangeSchema, memberSchema } from "./members/members-schema.ts";
import { projectDraftSchema, projectSchema } from "./projects/projects-schema.ts";
import {
  casesDraftSchema,
  contentSchema,
  duplicateSchema,
  moveSchema,
  scenarioDraftSchema,
  scenarioIdsSchema,
  scenarioSchema,
  scenarioSummarySchema,
} from "./scenarios/scenarios-schema.ts";

export * from "./accounts/accounts-schema.ts";
export * from "./activity/activity-schema.ts";
export * from "./chain/chain-schema.ts";
export * from "./comments/comments-schema.ts";
export * from "./explorations/explorations-schema.ts";
export * from "./members/members-schema.ts";
export * from "./notices/notices-schema.ts";
export * from "./projects/projects-schema.ts";
export * from "./reviews/reviews-schema.ts";
export * from "./revisions/revisions-schema.ts";
export * from "./scenarios/scenarios-schema.ts";

/** One route of the server: what goes in, what comes out. Paths are express paths under `/api`; every object is strict. */
export interface Route {
  readonly method: "GET" | "POST" | "PUT" | "PATCH" | "DELETE";
  readonly path: string;
  readonly params?: z.ZodObject;
  readonly body?: z.ZodType;
  readonly query?: z.ZodObject;
  /** Status of success. */
  readonly status: 200 | 201 | 202 | 204;
  readonly response?: z.ZodType;
  /** True where the request must carry `If-Match: "<version>"`. */
  readonly ifMatch?: boolean;
}

const id = z.uuid();
const projectParams = z.strictObject({ projectId: id });
const memberParams = z.strictObject({ projectId: id, accountId: id });
const scenarioParams = z.strictObject({ projectId: id, scenarioId: id });
const explorationParams = z.strictObject({ projectId: id, explorationId: id });

/**
 * Every route, by name. The server registers from it, the page's client infers its types from it, the role test walks it.
 * A route is allowed to whom `middleware/permit.ts` says.
 */
export const routes = {
  signUp: { method: "POST", path: "/accounts", body: signUpSchema, status: 202 },
  claimAccount: { method: "POST", path: "/accounts/claim", body: claimSchema, status: 200, response: sessionSchema },
  readSession: { method: "GET", path: "/session", status: 200, response: sessionSchema },
  signIn: { method: "POST", path: "/session", body: signInSchema, status: 200, response: sessionSchema },
  signOut: { method: "DELETE", path: "/session", status: 204 },

  listProjects: { method: "GET", path: "/projects", status: 200, response: z.array(projectSchema) },
  createProject: { method: "POST", path: "/projects", body: projectDraftSchema, status: 201, response: projectSchema },
  readProject: {
    method: "GET",
    path: "/projects/:projectId",
    params: projectParams,
    status: 200,
    response: projectSchema,
  },
  changeProject: {
    method: "PATCH",
    path: "/projects/:projectId",
    params: projectParams,
    body: projectDraftSchema,
    status: 200,
    response: projectSchema,
  },

  archiveProject: {
    method: "POST",
    path: "/projects/:projectId/archive",
    params: projectParams,
    status: 200,
    response: projectSchema,
  },
  restoreProject: {
    method: "POST",
    path: "/projects/:projectId/restore",
    params: projectParams,
    status: 200,
    response: projectSchema,
  },
  listActivity: {
    method: "GET",
    path: "/projects/:projectId/activity",
    params: projectParams,
    query: z.strictObject({
      before: z
        .string()
        .regex(/^[0-9]{1,15}$/)
        .optional(),
    }),
    status: 200,
    response: z.array(activitySchema),
  },

  listMembers: {
    method: "GET",
    path: "/projects/:projectId/members",
    params: projectParams,
    status: 200,
    response: z.array(memberSchema),
  },
  addMember: {
    method: "POST",
    path: "/projects/:projectId/members",
    params: projectParams,
    body: memberAddSchema,
    status: 201,
    response: memberSchema,
  },
  changeMember: {
    method: "PATCH",
    path: "/projects/:projectId/members/:accountId",
    params: memberParams,
    body: memberChangeSchema,
    status: 200,
    response: memberSchema,
  },
  removeMember: {
    method: "DELETE",
    path: "/projects/:projectId/members/:accountId",
    params: memberParams,
    status: 204,
  },

  listScenarios: {
    method: "GET",
    path: "/projects/:projectId/scenarios",
    params: projectParams,
    status: 200,
    response: z.array(scenarioSummarySchema),
  },
  createScenario: {
    method: "POST",
    path: "/projects/:projectId/scenarios",
    params: projectParams,
    body: scenarioDraftSchema,
    status: 201,
    response: scenarioSchema,
  },
  readScenario: {
    method: "GET",
    path: "/projects/:projectId/scenarios/:scenarioId",
    params: scenarioParams,
    status: 200,
    response: scenarioSchema,
  },
  saveScenario: {
    method: "PUT",
    path: "/projects/:projectId/scenarios/:scenarioId",
    params: scenarioParams,
    body: scenarioDraftSchema,
    ifMatch: true,
    status: 200,
    response: scenarioSchema,
  },
  readContents: {
    method: "GET",
    path: "/projects/:projectId/contents",
    params: projectParams,
    query: scenarioIdsSchema,
    status: 200,
    response: z.array(contentSchema),
  },
  createCases: {
    method: "POST",
    path: "/projects/:projectId/cases",
    params: projectParams,
    body: casesDraftSchema,
    status: 201,
    response: z.array(scenarioSummarySchema),
  },
  duplicateScenario: {
    method: "POST",
    path: "/projects/:projectId/scenarios/:scenarioId/duplicate",
    params: scenarioParams,
    body: duplicateSchema,
    status: 201,
    response: scenarioSchema,
  },
  moveScenario: {
    method: "POST",
    path: "/projects/:projectId/scenarios/:scenarioId/move",
    params: scenarioParams,
    body: moveSchema,
    status: 204,
  },
  archiveScenario: {
    method: "POST",
    path: "/projects/:projectId/scenarios/:scenarioId/archive",
    params: scenarioParams,
    status: 204,
  },
  restoreScenario: {
    method: "POST",
    path: "/projects/:projectId/scenarios/:scenarioId/restore",
    params: scenarioParams,
    status: 204,
  },

  listExplorations: {
    method: "GET",
    path: "/projects/:projectId/scenarios/:scenarioId/explorations",
    params: scenarioParams,
    status: 200,
    response: z.array(explorationSummarySchema),
  },
  createExploration: {
    method: "POST",
    path: "/projects/:projectId/scenarios/:scenarioId/explorations",
    params: scenarioParams,
    body: explorationDraftSchema,
    status: 201,
    response: explorationSchema,
  },
  readExploration: {
    method: "GET",
    path: "/projects/:projectId/explorations/:explorationId",
    params: explorationParams,
    status: 200,
    response: explorationSchema,
  },
  claimExploration: {
    method: "POST",
    path: "/projects/:projectId/explorations/:explorationId/claim",
    params: explorationParams,
    body: claimExplorationSchema,
    status: 200,
    response: explorationSchema,
  },
  releaseExploration: {
    method: "POST",
    path: "/projects/:projectId/explorations/:explorationId/release",
    params: explorationParams,
    body: runnerSchema,
    status: 204,
  },
  readTiles: {
    method: "GET",
    path: "/projects/:projectId/explorations/:explorationId/tiles",
    params: explorationParams,
    query: tileNumbersSchema,
    status: 200,
    response: z.array(tileSchema),
  },
  saveTile: {
    method: "PUT",
    path: "/projects/:projectId/explorations/:explorationId/tiles/:number",
    params: explorationParams.extend({ number: z.string().regex(/^\d{1,6}$/) }),
    body: tileDraftSchema,
    status: 204,
  },
  concludeExploration: {
    method: "PUT",
    path: "/projects/:projectId/explorations/:explorationId/conclusion",
    params: explorationParams,
    body: conclusionSchema,
    status: 204,
  },
  deleteExploration: {
    method: "DELETE",
    path: "/projects/:projectId/explorations/:explorationId",
    params: explorationParams,
    status: 204,
  },
} as const satisfies Record<string, Route>;

export type RouteName = keyof typeof routes;

/** Every failure: a code for programs, a sentence for people, and the fields it concerns. */
export const failureSchema = z.strictObject({
  error: z.strictObject({
    code: z.string(),
    message: z.string(),
    fields: z.array(z.strictObject({ path: z.string(), message: z.string() })),
    /** On a 409 of `saveScenario`: the version now stored. */
    current: scenarioSchema.optional(),
  }),
});
export type Failure = z.infer<typeof failureSchema>["error"];
