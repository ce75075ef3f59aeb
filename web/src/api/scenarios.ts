import type { StoredScenario } from "@restband/api/contract";
import type { Scenario } from "@restband/solver";
import { queryOptions, useMutation, useQueryClient, type QueryClient } from "@tanstack/react-query";
import { call } from "./client.ts";

/** All scenarios of a project, last touched first. */
export const scenariosQuery = (projectId: string) =>
  queryOptions({
    queryKey: ["projects", projectId, "scenarios"],
    queryFn: ({ signal }) => call("listScenarios", { params: { projectId }, signal }),
  });

export const scenarioQuery = (projectId: string, scenarioId: string) =>
  queryOptions({
    queryKey: ["projects", projectId, "scenarios", scenarioId],
    queryFn: ({ signal }) => call("readScenario", { params: { projectId, scenarioId }, signal }),
  });

/** Keeps an answer of the server and marks the lists that count or order scenarios as old. */
function keep(client: QueryClient, stored: StoredScenario): void {
  client.setQueryData(scenarioQuery(stored.projectId, stored.id).queryKey, stored);
  void client.invalidateQueries({ queryKey: scenariosQuery(stored.projectId).queryKey, exact: true });
  void client.invalidateQueries({ queryKey: ["projects", stored.projectId], exact: true });
  void client.invalidateQueries({ queryKey: ["projects"], exact: true });
}

export function useCreateScenario(projectId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (scenario: Scenario) =>
      call("createScenario", { params: { projectId }, body: { content: { ...scenario } } }),
    onSuccess: (stored) => keep(client, stored),
  });
}

/**
 * Saves a scenario over the version it was made from; a later version in its place is a 409 whose `current` is that
 * version. Saves of one scenario go one at a time, in the order asked.
 */
export function useSaveScenario(projectId: string, scenarioId: string) {
  const client = useQueryClient();
  return useMutation({
    scope: { id: `scenario ${scenarioId}` },
    mutationFn: ({ scenario, version }: { scenario: Scenario; version: number }) =>
      call("saveScenario", { params: { projectId, scenarioId }, body: { content: { ...scenario } }, version }),
    onSuccess: (stored) => keep(client, stored),
  });
}
