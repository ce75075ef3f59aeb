import { queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import { call, type Input } from "./client.ts";

/** All projects of the person, last touched first. */
export const projectsQuery = queryOptions({
  queryKey: ["projects"],
  queryFn: ({ signal }) => call("listProjects", { signal }),
});

export const projectQuery = (projectId: string) =>
  queryOptions({
    queryKey: ["projects", projectId],
    queryFn: ({ signal }) => call("readProject", { params: { projectId }, signal }),
  });

export function useCreateProject() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: Input<"createProject">["body"]) => call("createProject", { body }),
    onSuccess: (project) => {
      client.setQueryData(projectQuery(project.id).queryKey, project);
      return client.invalidateQueries({ queryKey: projectsQuery.queryKey, exact: true });
    },
  });
}

export function useChangeProject(projectId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: Input<"changeProject">["body"]) => call("changeProject", { params: { projectId }, body }),
    onSuccess: (project) => {
      client.setQueryData(projectQuery(projectId).queryKey, project);
      return client.invalidateQueries({ queryKey: projectsQuery.queryKey, exact: true });
    },
  });
}

/** Puts a project away, or takes it out again. */
export function useArchiveProject(projectId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (isArchived: boolean) =>
      call(isArchived ? "archiveProject" : "restoreProject", { params: { projectId } }),
    onSuccess: (project) => {
      client.setQueryData(projectQuery(projectId).queryKey, project);
      void client.invalidateQueries({ queryKey: ["projects", projectId, "activity"] });
      return client.invalidateQueries({ queryKey: projectsQuery.queryKey, exact: true });
    },
  });
}
