import { z } from "@restband/solver";
import { addresses, type Address, type RouteName } from "./addresses.ts";
import {
  accountChangeSchema,
  accountSchema,
  claimSchema,
  sessionSchema,
  signInSchema,
  signUpSchema,
} from "./accounts/accounts-schema.ts";
import { activityQuerySchema, activitySchema } from "./activity/activity-schema.ts";
import { chainContract } from "./chain/chain-schema.ts";
import { commentsContract } from "./comments/comments-schema.ts";
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
import { noticesContract } from "./notices/notices-schema.ts";
import { projectDraftSchema, projectSchema } from "./projects/projects-schema.ts";
import { reviewsContract } from "./reviews/reviews-schema.ts";
import { revisionsContract } from "./revisions/revisions-schema.ts";
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

export type { RouteName } from "./addresses.ts";
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

/** One route of the server: what goes in, what comes out. Every object is strict. */
export interface Route extends Address {
  readonly params?: z.ZodObject;
  readonly body?: z.ZodType;
  readonly query?: z.ZodObject;
  /** Status of success. */
  readonly status: 200 | 201 | 202 | 204;
  readonly response?: z.ZodType;
  /** True where the request must carry `If-Match: "<version>"`. */
  readonly ifMatch?: boolean;
  /** True where the same `Idempotency-Key` stands for the same act: it is done once, and answered alike for 24 hours. */
  readonly isOnce?: boolean;
  /** True where the body may carry the points of records, and is as large as an upload then. */
  readonly carriesRecords?: boolean;
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
  signUp: { ...addresses.signUp, body: signUpSchema, status: 202 },
  claimAccount: { ...addresses.claimAccount, body: claimSchema, status: 200, response: sessionSchema },
  changeAccount: { ...addresses.changeAccount, body: accountChangeSchema, status: 200, response: accountSchema },
  readSession: { ...addresses.readSession, status: 200, response: sessionSchema },
  signIn: { ...addresses.signIn, body: signInSchema, status: 200, response: sessionSchema },
  signOut: { ...addresses.signOut, status: 204 },
  listProjects: { ...addresses.listProjects, status: 200, response: z.array(projectSchema) },
  createProject: {
    ...addresses.createProject,
    body: projectDraftSchema,
    isOnce: true,
    status: 201,
    response: projectSchema,
  },
  readProject: { ...addresses.readProject, params: projectParams, status: 200, response: projectSchema },
  changeProject: {
    ...addresses.changeProject,
    params: projectParams,
    body: projectDraftSchema,
    status: 200,
    response: projectSchema,
  },
  archiveProject: { ...addresses.archiveProject, params: projectParams, status: 200, response: projectSchema },
  restoreProject: { ...addresses.restoreProject, params: projectParams, status: 200, response: projectSchema },
  listActivity: {
    ...addresses.listActivity,
    params: projectParams,
    query: activityQuerySchema,
    status: 200,
    response: z.array(activitySchema),
  },
  listMembers: { ...addresses.listMembers, params: projectParams, status: 200, response: z.array(memberSchema) },
  addMember: {
    ...addresses.addMember,
    params: projectParams,
    body: memberAddSchema,
    status: 201,
    response: memberSchema,
  },
  changeMember: {
    ...addresses.changeMember,
    params: memberParams,
    body: memberChangeSchema,
    status: 200,
    response: memberSchema,
  },
  removeMember: { ...addresses.removeMember, params: memberParams, status: 204 },
  listScenarios: {
    ...addresses.listScenarios,
    params: projectParams,
    status: 200,
    response: z.array(scenarioSummarySchema),
  },
  createScenario: {
    ...addresses.createScenario,
    params: projectParams,
    body: scenarioDraftSchema,
    carriesRecords: true,
    isOnce: true,
    status: 201,
    response: scenarioSchema,
  },
  readScenario: { ...addresses.readScenario, params: scenarioParams, status: 200, response: scenarioSchema },
  saveScenario: {
    ...addresses.saveScenario,
    params: scenarioParams,
    body: scenarioDraftSchema,
    carriesRecords: true,
    ifMatch: true,
    status: 200,
    response: scenarioSchema,
  },
  readContents: {
    ...addresses.readContents,
    params: projectParams,
    query: scenarioIdsSchema,
    status: 200,
    response: z.array(contentSchema),
  },
  createCases: {
    ...addresses.createCases,
    params: projectParams,
    body: casesDraftSchema,
    isOnce: true,
    status: 201,
    response: z.array(scenarioSummarySchema),
  },
  duplicateScenario: {
    ...addresses.duplicateScenario,
    params: scenarioParams,
    body: duplicateSchema,
    isOnce: true,
    status: 201,
    response: scenarioSchema,
  },
  moveScenario: { ...addresses.moveScenario, params: scenarioParams, body: moveSchema, status: 204 },
  archiveScenario: { ...addresses.archiveScenario, params: scenarioParams, status: 204 },
  restoreScenario: { ...addresses.restoreScenario, params: scenarioParams, status: 204 },
  listExplorations: {
    ...addresses.listExplorations,
    params: scenarioParams,
    status: 200,
    response: z.array(explorationSummarySchema),
  },
  createExploration: {
    ...addresses.createExploration,
    params: scenarioParams,
    body: explorationDraftSchema,
    isOnce: true,
    status: 201,
    response: explorationSchema,
  },
  readExploration: {
    ...addresses.readExploration,
    params: explorationParams,
    status: 200,
    response: explorationSchema,
  },
  claimExploration: {
    ...addresses.claimExploration,
    params: explorationParams,
    body: claimExplorationSchema,
    status: 200,
    response: explorationSchema,
  },
  releaseExploration: { ...addresses.releaseExploration, params: explorationParams, body: runnerSchema, status: 204 },
  readTiles: {
    ...addresses.readTiles,
    params: explorationParams,
    query: tileNumbersSchema,
    status: 200,
    response: z.array(tileSchema),
  },
  saveTile: {
    ...addresses.saveTile,
    params: explorationParams.extend({ number: z.string().regex(/^\d{1,6}$/) }),
    body: tileDraftSchema,
    status: 204,
  },
  concludeExploration: {
    ...addresses.concludeExploration,
    params: explorationParams,
    body: conclusionSchema,
    status: 204,
  },
  deleteExploration: { ...addresses.deleteExploration, params: explorationParams, status: 204 },

  ...chainContract,
  ...revisionsContract,
  ...reviewsContract,
  ...commentsContract,
  ...noticesContract,
} as const satisfies Record<RouteName, Route>;

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
