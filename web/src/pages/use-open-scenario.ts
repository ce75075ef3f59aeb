import type { Scenario } from "@restband/solver";
import { useQueryClient } from "@tanstack/react-query";
import { useNavigate } from "react-router-dom";
import { scenariosQuery, useCreateScenario } from "../api/scenarios.ts";
import { announce } from "../components/status.tsx";
import { freeTitle } from "../features/project-home/new-scenario.ts";
import { paths } from "../paths.ts";

const LONGEST_TITLE = 120;

/** Makes a scenario of what was found and opens it; what goes wrong is told, and the page stays. */
export function useOpenScenario(projectId: string) {
  const create = useCreateScenario(projectId);
  const client = useQueryClient();
  const navigate = useNavigate();
  return async (scenario: Scenario, what: string): Promise<void> => {
    try {
      const others = await client.ensureQueryData(scenariosQuery(projectId));
      const stem = `${scenario.title || "Untitled"}, ${what}`.slice(0, LONGEST_TITLE);
      const title = freeTitle(
        stem,
        others.map((each) => each.title),
      );
      const { id } = await create.mutateAsync({ ...scenario, title });
      await navigate(paths.scenario(projectId, id));
    } catch (error) {
      announce(`No scenario was made. ${error instanceof Error ? error.message : String(error)}`);
    }
  };
}
