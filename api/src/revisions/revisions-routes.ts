import type { HandlersOf } from "../route-handler.ts";
import type { RevisionsService } from "./revisions-service.ts";

type Names = "listRevisions" | "freezeScenario" | "readRevision" | "listReplays" | "keepReplay";

export function revisionsRoutes(revisions: RevisionsService): HandlersOf<Names> {
  return {
    listRevisions: ({ params, query }) => revisions.list(params.projectId, query.scenarioId),
    freezeScenario: ({ params, version, body, account }) => revisions.freeze(params, version, body, account.id),
    readRevision: ({ params }) => revisions.read(params),
    listReplays: ({ params }) => revisions.listReplays(params),
    keepReplay: ({ params, body, account }) => revisions.keepReplay(params, body, account.id),
  };
}
