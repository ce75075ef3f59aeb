import type { Freeze, ReplayDraft } from "@restband/api/contract";
import { queryOptions, useMutation, useQueryClient, type QueryClient } from "@tanstack/react-query";
import { call } from "./client.ts";

const revisionsKey = (projectId: string) => ["projects", projectId, "revisions"];

/** The revisions of one scenario, or of the whole project; newest first. */
export const revisionsQuery = (projectId: string, scenarioId?: string) =>
  queryOptions({
    queryKey: [...revisionsKey(projectId), "list", scenarioId ?? ""],
    queryFn: ({ signal }) =>
      call("listRevisions", { params: { projectId }, query: scenarioId === undefined ? {} : { scenarioId }, signal }),
  });

export const revisionQuery = (projectId: string, revisionId: string) =>
  queryOptions({
    queryKey: [...revisionsKey(projectId), revisionId],
    queryFn: ({ signal }) => call("readRevision", { params: { projectId, revisionId }, signal }),
  });

/** Who replayed a revision, and what came of it; newest first. */
export const replaysQuery = (projectId: string, revisionId: string) =>
  queryOptions({
    queryKey: [...revisionsKey(projectId), revisionId, "replays"],
    queryFn: ({ signal }) => call("listReplays", { params: { projectId, revisionId }, signal }),
  });

/** Whether all that a project's trail is made of is as it was written, and the key it is signed with. */
export const integrityQuery = (projectId: string) =>
  queryOptions({
    queryKey: ["projects", projectId, "integrity"],
    queryFn: ({ signal }) => call("readIntegrity", { params: { projectId }, signal }),
  });

/** Marks everything that tells of a project's revisions as old. */
export function refreshRevisions(client: QueryClient, projectId: string): void {
  void client.invalidateQueries({ queryKey: revisionsKey(projectId) });
  void client.invalidateQueries({ queryKey: integrityQuery(projectId).queryKey });
  void client.invalidateQueries({ queryKey: ["projects", projectId, "activity"] });
}

/** Freezes the version of a scenario that the page has seen. */
export function useFreeze(projectId: string, scenarioId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ version, ...body }: Freeze & { version: number }) =>
      call("freezeScenario", { params: { projectId, scenarioId }, body, version }),
    onSuccess: (revision) => {
      client.setQueryData(revisionQuery(projectId, revision.id).queryKey, revision);
      refreshRevisions(client, projectId);
    },
  });
}

/** Keeps that somebody ran a revision again, and what came of it. */
export function useKeepReplay(projectId: string, revisionId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: ReplayDraft) => call("keepReplay", { params: { projectId, revisionId }, body }),
    onSuccess: () => refreshRevisions(client, projectId),
  });
}
