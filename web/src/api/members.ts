import type { Role } from "@restband/api/contract";
import { queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import { call, type Input } from "./client.ts";
import { projectQuery, projectsQuery } from "./projects.ts";

export const membersQuery = (projectId: string) =>
  queryOptions({
    queryKey: ["projects", projectId, "members"],
    queryFn: ({ signal }) => call("listMembers", { params: { projectId }, signal }),
  });

/** Reads the project anew after a change: one's own role may be among what changed. */
function useRefreshed(projectId: string) {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: projectQuery(projectId).queryKey });
}

/** Adds the account with an address. */
export function useAddMember(projectId: string) {
  return useMutation({
    mutationFn: (body: Input<"addMember">["body"]) => call("addMember", { params: { projectId }, body }),
    onSuccess: useRefreshed(projectId),
  });
}

export function useChangeMember(projectId: string) {
  return useMutation({
    mutationFn: ({ accountId, role }: { accountId: string; role: Role }) =>
      call("changeMember", { params: { projectId, accountId }, body: { role } }),
    onSuccess: useRefreshed(projectId),
  });
}

/** Takes a person out of the project. Whoever takes themselves out cannot read it afterwards: only the list is. */
export function useRemoveMember(projectId: string, isSelf: boolean) {
  const client = useQueryClient();
  const refresh = useRefreshed(projectId);
  return useMutation({
    mutationFn: (accountId: string) => call("removeMember", { params: { projectId, accountId } }),
    onSuccess: () => (isSelf ? client.invalidateQueries({ queryKey: projectsQuery.queryKey, exact: true }) : refresh()),
  });
}
