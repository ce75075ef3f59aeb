import compression from "compression";
import express, { type Express, type RequestHandler } from "express";
import type { Logger } from "pino";
import { accountsRoutes } from "./accounts/accounts-routes.ts";
import { createAccountsService } from "./accounts/accounts-service.ts";
import { activityRoutes } from "./activity/activity-routes.ts";
import { createActivityService } from "./activity/activity-service.ts";
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
import { pages } from "./pages.ts";
import { projectsRoutes } from "./projects/projects-routes.ts";
import { createProjectsService } from "./projects/projects-service.ts";
import { isReady } from "./readiness.ts";
import { createRouter } from "./router.ts";
import { scenariosRoutes } from "./scenarios/scenarios-routes.ts";
import { createScenariosService } from "./scenarios/scenarios-service.ts";
import { sessionsRoutes } from "./sessions/sessions-routes.ts";
import { createSessionsService } from "./sessions/sessions-service.ts";

/** The whole server, without the listening: everything a request meets, in order. */
export function createApp(config: Config, database: Database, log: Logger): Express {
  const app = express();
  app.set("trust proxy", config.trustProxy);
  app.set("etag", false);
  app.use(requestLog(log), securityHeaders, compression());
  app.get("/health", (_request, response) => response.json({ alive: true }));
  app.get("/ready", answerReady(database));
  app.use("/api", neverCached, session(database, config, log), createApi(config, database), noSuchRoute);
  if (config.webRoot) app.use(pages(config.webRoot));
  app.use(noSuchRoute, errorHandler(log));
  return app;
}

function createApi(config: Config, database: Database) {
  const throttle = createThrottle(database, config);
  const accounts = createAccountsService(database);
  const sessions = createSessionsService(accounts, throttle);
  const members = createMembersService(database, accounts);
  const scenarios = createScenariosService(database, members);
  const handlers = {
    ...accountsRoutes(accounts, sessions),
    ...sessionsRoutes(sessions),
    ...projectsRoutes(createProjectsService(database, members)),
    ...membersRoutes(members),
    ...scenariosRoutes(scenarios),
    ...explorationsRoutes(createExplorationsService(database, scenarios)),
    ...activityRoutes(createActivityService(database)),
  };
  return createRouter(handlers, members.findCaller, throttle);
}

const neverCached: RequestHandler = (_request, response, next) => {
  response.set("Cache-Control", "no-store");
  next();
};

/** 200 while the server can do its work, 503 while it only lives. */
function answerReady(database: Database): RequestHandler {
  return async (_request, response) => {
    const ready = await isReady(database);
    response.status(ready ? 200 : 503).json({ ready });
  };
}
