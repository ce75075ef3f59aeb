import { queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import { call, type Input } from "./client.ts";
import { refreshRevisions, revisionQuery } from "./revisions.ts";

const LOOK_AGAIN_MS = 10_000;

/** What was said to a revision, oldest first. */
export const commentsQuery = (projectId: string, revisionId: string) =>
  queryOptions({
    queryKey: [...revisionQuery(projectId, revisionId).queryKey, "comments"],
    queryFn: ({ signal }) => call("listComments", { params: { projectId, revisionId }, signal }),
    refetchInterval: LOOK_AGAIN_MS,
  });

function useRefreshed(projectId: string) {
  const client = useQueryClient();
  return () => refreshRevisions(client, projectId);
}

export function useAddComment(projectId: string, revisionId: string) {
  return useMutation({
    mutationFn: (body: Input<"addComment">["body"]) => call("addComment", { params: { projectId, revisionId }, body }),
    onSuccess: useRefreshed(projectId),
  });
}

export function useReply(projectId: string, revisionId: string, commentId: string) {
  return useMutation({
    mutationFn: (body: Input<"replyToComment">["body"]) =>
      call("replyToComment", { params: { projectId, revisionId, commentId }, body }),
    onSuccess: useRefreshed(projectId),
  });
}

/** Settles a comment, or opens it again. */
export function useSettle(projectId: string, revisionId: string, commentId: string) {
  return useMutation({
    mutationFn: (isSettled: boolean) =>
      call(isSettled ? "settleComment" : "reopenComment", { params: { projectId, revisionId, commentId } }),
    onSuccess: useRefreshed(projectId),
  });
}
