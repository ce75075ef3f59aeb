import type { StoredScenario } from "@restband/api/contract";
import type { Scenario } from "@restband/solver";
import { queryOptions, useMutation, useQueryClient, type QueryClient } from "@tanstack/react-query";
import { call } from "./client.ts";
import { sendNamed, withPointsOf } from "./long-records.ts";
import type { Work } from "./work.ts";

/** All scenarios of a project without their contents, last touched first; archived ones too. */
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

/** Keeps an answer of the server and marks what counts, orders or tells of scenarios as old. */
function keep(client: QueryClient, stored: StoredScenario): void {
  client.setQueryData(scenarioQuery(stored.projectId, stored.id).queryKey, stored);
  refreshLists(client, stored.projectId);
}

function refreshLists(client: QueryClient, projectId: string): void {
  void client.invalidateQueries({ queryKey: scenariosQuery(projectId).queryKey, exact: true });
  void client.invalidateQueries({ queryKey: ["projects", projectId, "activity"] });
  void client.invalidateQueries({ queryKey: ["projects", projectId], exact: true });
  void client.invalidateQueries({ queryKey: ["projects"], exact: true });
}

/** The contents of up to `mostContents` scenarios of a project; those that are no longer in it are missing. */
export const readContents = (projectId: string, ids: readonly string[]) =>
  call("readContents", { params: { projectId }, query: { ids: ids.join(",") } });

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
    mutationFn: async ({ version, ...work }: Work & { version: number }) => {
      const send = ([{ content, switchedOff }]: readonly Work[]) => {
        const body = { content: { ...content }, switchedOff: [...switchedOff] };
        return call("saveScenario", { params: { projectId, scenarioId }, body, version });
      };
      return withPointsOf(work, await sendNamed([work], send));
    },
    onSuccess: (stored) => keep(client, stored),
  });
}

/** Makes a scenario of each content, or none of any: every fault is named under `contents[i]`. */
export function useCreateCases(projectId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (scenarios: readonly Scenario[]) =>
      sendNamed(
        scenarios.map((content) => ({ content, switchedOff: [] })),
        (works) => {
          const contents = works.map(({ content }) => ({ ...content }));
          return call("createCases", { params: { projectId }, body: { contents } });
        },
      ),
    onSuccess: () => refreshLists(client, projectId),
  });
}

/** What can be done to a scenario as a whole. The lists are read anew after each, whether it was done or not. */
export function useScenarioActs() {
  const client = useQueryClient();
  const at = (projectId: string, scenarioId: string) => ({ params: { projectId, scenarioId } });
  const then = async <Done>(projectId: string, done: Promise<Done>): Promise<Done> => {
    try {
      return await done;
    } finally {
      refreshLists(client, projectId);
    }
  };
  const marked = async (projectId: string, id: string, done: Promise<undefined>): Promise<void> => {
    await then(projectId, done);
    await client.invalidateQueries({ queryKey: scenarioQuery(projectId, id).queryKey });
  };
  return {
    duplicate: (projectId: string, id: string, title: string) =>
      then(projectId, call("duplicateScenario", { ...at(projectId, id), body: { title } })),
    move: async (projectId: string, id: string, toProjectId: string) => {
      await then(projectId, call("moveScenario", { ...at(projectId, id), body: { toProjectId } }));
      client.removeQueries({ queryKey: scenarioQuery(projectId, id).queryKey });
      refreshLists(client, toProjectId);
    },
    archive: (projectId: string, id: string) => marked(projectId, id, call("archiveScenario", at(projectId, id))),
    restore: (projectId: string, id: string) => marked(projectId, id, call("restoreScenario", at(projectId, id))),
  };
}
