import type { HandlersOf } from "../route-handler.ts";
import type { ScenariosService } from "./scenarios-service.ts";

type Names =
  | "listScenarios"
  | "createScenario"
  | "readScenario"
  | "saveScenario"
  | "readContents"
  | "createCases"
  | "duplicateScenario"
  | "moveScenario"
  | "archiveScenario"
  | "restoreScenario";

export function scenariosRoutes(scenarios: ScenariosService): HandlersOf<Names> {
  return {
    listScenarios: ({ params }) => scenarios.list(params.projectId),
    createScenario: ({ params, body, account }) => scenarios.create(params.projectId, body, account.id),
    readScenario: ({ params }) => scenarios.read(params.projectId, params.scenarioId),
    saveScenario: ({ params, body, version, account }) => scenarios.save(params, version, body, account.id),
    readContents: ({ params, query }) => scenarios.readContents(params.projectId, query.ids),
    createCases: ({ params, body, account }) => scenarios.createCases(params.projectId, body.contents, account.id),
    duplicateScenario: ({ params, body, account }) => scenarios.duplicate(params, body.title, account.id),
    moveScenario: ({ params, body, account }) => scenarios.move(params, body.toProjectId, account.id),
    archiveScenario: ({ params, account }) => scenarios.archive(params, account.id),
    restoreScenario: ({ params, account }) => scenarios.restore(params, account.id),
  };
}
