import express, { type RequestHandler, Router } from "express";
import { type Account, type Route, type RouteName, routes } from "./contract.ts";
import { csrf } from "./middleware/csrf.ts";
import { type FindCaller, permit } from "./middleware/permit.ts";
import type { Throttle } from "./middleware/throttle.ts";
import { validate } from "./middleware/validate.ts";
import { noteBody, type Once } from "./once/once.ts";
import type { Call, Handler, Handlers } from "./route-handler.ts";

/** Routes at which passwords or tokens may be tried. */
const throttled = new Set<RouteName>([
  "signUp",
  "signIn",
  "claimAccount",
  "decideRevision",
  "selfCheckRevision",
  "withdrawRevision",
]);

const methods = { GET: "get", POST: "post", PUT: "put", PATCH: "patch", DELETE: "delete" } as const;

const readJson = express.json({ limit: "1mb", verify: noteBody });
/** 200,000 points take 9 MB at most; a scenario may have more than one record. */
const readRecords = express.json({ limit: "20mb", verify: noteBody });

/**
 * Registers every route of the contract, all by the same steps: permitted? from our pages? too often? well formed?
 * then the handler, whose answer is checked as strictly as the request, so that nothing leaves by accident.
 */
export function createRouter(handlers: Handlers, findCaller: FindCaller, throttle: Throttle, once: Once): Router {
  const router = Router();
  for (const name of Object.keys(routes) as RouteName[]) {
    const route: Route = routes[name];
    router[methods[route.method]](
      route.path,
      permit(name, findCaller),
      csrf,
      ...(throttled.has(name) ? [throttle.countOrigin] : []),
      ...(route.body ? [route.carriesRecords ? readRecords : readJson] : []),
      validate(route),
      handle(route, handlers[name] as Handler<RouteName>, once),
    );
  }
  return router;
}

function handle(route: Route, handler: Handler<RouteName>, once: Once): RequestHandler {
  return async (request, response) => {
    const act = async () => {
      const answer = await handler({ ...response.locals, request } as Call<RouteName>);
      return route.response ? JSON.stringify(route.response.parse(answer)) : null;
    };
    const { account } = response.locals as { account?: Account };
    const text = route.isOnce && account ? await once(request, account.id, route.status, act) : await act();
    response.status(route.status);
    if (text === null) response.end();
    else response.type("json").send(text);
  };
}
