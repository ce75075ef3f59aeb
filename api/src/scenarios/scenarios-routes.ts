import type { HandlersOf } from "../route-handler.ts";
import type { ScenariosService } from "./scenarios-service.ts";

export function scenariosRoutes(
  scenarios: ScenariosService,
): HandlersOf<"listScenarios" | "createScenario" | "readScenario" | "saveScenario"> {
  return {
    listScenarios: ({ params }) => scenarios.list(params.projectId),
    createScenario: ({ params, body, account }) => scenarios.create(params.projectId, body.content, account.id),
    readScenario: ({ params }) => scenarios.read(params.projectId, params.scenarioId),
    saveScenario: ({ params, body, version, account }) => scenarios.save(params, version, body.content, account.id),
  };
}
