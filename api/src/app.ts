import compression from "compression";
import express, { type Express, type RequestHandler } from "express";
import type { Logger } from "pino";
import { accountsRoutes } from "./accounts/accounts-routes.ts";
import { createAccountsService } from "./accounts/accounts-service.ts";
import { activityRoutes } from "./activity/activity-routes.ts";
import { createActivityService } from "./activity/activity-service.ts";
import { chainRoutes } from "./chain/chain-routes.ts";
import { type ChainService, createChainService } from "./chain/chain-service.ts";
import { commentsRoutes } from "./comments/comments-routes.ts";
import { createCommentsService } from "./comments/comments-service.ts";
import type { Config } from "./config.ts";
import type { Database } from "./database/database.ts";
import { explorationsRoutes } from "./explorations/explorations-routes.ts";
import { createExplorationsService } from "./explorations/explorations-service.ts";
import { membersRoutes } from "./members/members-routes.ts";
import { createMembersService } from "./members/members-service.ts";
import { errorHandler, noSuchRoute } from "./middleware/error-handler.ts";
import { requestLog } from "./middleware/request-log.ts";
import { securityHeaders } from "./middleware/security-headers.ts";
import { session } from "./middleware/session.ts";
import { createThrottle } from "./middleware/throttle.ts";
import { noticesRoutes } from "./notices/notices-routes.ts";
import { createNoticesService } from "./notices/notices-service.ts";
import { createOnce } from "./once/once.ts";
import { pages } from "./pages.ts";
import { projectsRoutes } from "./projects/projects-routes.ts";
import { createProjectsService } from "./projects/projects-service.ts";
import { readinessOf } from "./readiness.ts";
import { createDecisionsService } from "./reviews/decisions-service.ts";
import { reviewsRoutes } from "./reviews/reviews-routes.ts";
import { createReviewsService } from "./reviews/reviews-service.ts";
import { createReadStandpoint } from "./reviews/standpoint.ts";
import { createRecomputing } from "./revisions/recompute-pool.ts";
import { revisionsRoutes } from "./revisions/revisions-routes.ts";
import { createRevisionsService } from "./revisions/revisions-service.ts";
import { createRouter } from "./router.ts";
import { scenariosRoutes } from "./scenarios/scenarios-routes.ts";
import { createScenariosService } from "./scenarios/scenarios-service.ts";
import { sessionsRoutes } from "./sessions/sessions-routes.ts";
import { createSessionsService } from "./sessions/sessions-service.ts";

/** The whole server, without the listening: everything a request meets, in order. */
export function createApp(config: Config, database: Database, log: Logger): Express {
  const app = express();
  const chain = createChainService(database);
  app.set("trust proxy", config.trustProxy);
  app.set("etag", false);
  app.use(requestLog(log), securityHeaders, compression());
  app.get("/health", (_request, response) => response.json({ alive: true }));
  app.get("/ready", answerReady(database, chain));
  app.use("/api", neverCached, session(database, config, log), createApi(config, database, chain), noSuchRoute);
  if (config.webRoot) app.use(pages(config.webRoot));
  app.use(noSuchRoute, errorHandler(log));
  return app;
}

function createApi(config: Config, database: Database, chain: ChainService) {
  const throttle = createThrottle(database, config);
  const accounts = createAccountsService(database);
  const sessions = createSessionsService(accounts, throttle);
  const members = createMembersService(database, accounts);
  const scenarios = createScenariosService(database, members);
  const revisions = createRevisionsService(database, createRecomputing(config.recomputing));
  const readStandpoint = createReadStandpoint(revisions);
  const handlers = {
    ...accountsRoutes(accounts, sessions),
    ...sessionsRoutes(sessions),
    ...projectsRoutes(createProjectsService(database, members)),
    ...membersRoutes(members),
    ...scenariosRoutes(scenarios),
    ...explorationsRoutes(createExplorationsService(database, scenarios)),
    ...activityRoutes(createActivityService(database)),
    ...chainRoutes(chain),
    ...revisionsRoutes(revisions),
    ...reviewsRoutes(
      createReviewsService(database, readStandpoint),
      createDecisionsService(database, revisions, readStandpoint),
      sessions,
    ),
    ...commentsRoutes(createCommentsService(database, members, revisions)),
    ...noticesRoutes(createNoticesService(database)),
  };
  return createRouter(handlers, members.findCaller, throttle, createOnce(database));
}

const neverCached: RequestHandler = (_request, response, next) => {
  response.set("Cache-Control", "no-store");
  next();
};

/**
 * 200 while the server can do its work on records that are as they were written; 503 while it only lives, or where a row of
 * a trail is not. `?deep` goes through all of them anew; else what was found may be some seconds old.
 */
function answerReady(database: Database, chain: ChainService): RequestHandler {
  return async (request, response) => {
    const readiness = await readinessOf(database, chain, { isDeep: "deep" in request.query });
    response.status(readiness.ready ? 200 : 503).json(readiness);
  };
}
