import type { HandlersOf } from "../route-handler.ts";
import type { ExplorationsService } from "./explorations-service.ts";

type Names =
  | "listExplorations"
  | "createExploration"
  | "readExploration"
  | "claimExploration"
  | "releaseExploration"
  | "readTiles"
  | "saveTile"
  | "concludeExploration"
  | "deleteExploration";

export function explorationsRoutes(explorations: ExplorationsService): HandlersOf<Names> {
  return {
    listExplorations: ({ params }) => explorations.list(params.projectId, params.scenarioId),
    createExploration: ({ params, body, account }) =>
      explorations.create(params.projectId, params.scenarioId, body, account.id),
    readExploration: ({ params }) => explorations.read(params),
    claimExploration: ({ params, body, account }) => explorations.claim(params, body, account.id),
    releaseExploration: ({ params, body }) => explorations.release(params, body.runner),
    readTiles: ({ params, query }) => explorations.readTiles(params, query.numbers),
    saveTile: ({ params, body, account }) => explorations.saveTile(params, Number(params.number), body, account.id),
    concludeExploration: ({ params, body }) => explorations.conclude(params, body),
    deleteExploration: ({ params, account }) => explorations.remove(params, account.id),
  };
}
