import type { Review } from "@restband/api/contract";
import { queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import { call, type Input } from "./client.ts";
import { noticesQuery } from "./notices.ts";
import { refreshRevisions, revisionQuery } from "./revisions.ts";

/** How often what others say and decide is looked at again while the page is in sight. */
const LOOK_AGAIN_MS = 10_000;

/** Who was asked, what was decided, and what the reader may do about a revision. */
export const reviewQuery = (projectId: string, revisionId: string) =>
  queryOptions({
    queryKey: [...revisionQuery(projectId, revisionId).queryKey, "review"],
    queryFn: ({ signal }) => call("readReview", { params: { projectId, revisionId }, signal }),
    refetchInterval: LOOK_AGAIN_MS,
  });

type Act = "askForReview" | "decideRevision" | "selfCheckRevision" | "withdrawRevision";

/** Does something to a revision; the page then reads it and what waits anew, also where somebody else was faster. */
function useReviewAct<Name extends Act>(name: Name, projectId: string, revisionId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: Input<Name> extends { body: infer Body } ? Body : never): Promise<Review> =>
      call(name as "askForReview", { params: { projectId, revisionId }, body: body as Input<"askForReview">["body"] }),
    onSettled: () => {
      refreshRevisions(client, projectId);
      void client.invalidateQueries({ queryKey: noticesQuery.queryKey });
    },
  });
}

export const useAskForReview = (projectId: string, revisionId: string) =>
  useReviewAct("askForReview", projectId, revisionId);
export const useDecide = (projectId: string, revisionId: string) =>
  useReviewAct("decideRevision", projectId, revisionId);
export const useSelfCheck = (projectId: string, revisionId: string) =>
  useReviewAct("selfCheckRevision", projectId, revisionId);
export const useWithdraw = (projectId: string, revisionId: string) =>
  useReviewAct("withdrawRevision", projectId, revisionId);

/** Sets what the project wants looked at before a revision is accepted. */
export function useSetChecklist(projectId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (points: string[]) => call("setChecklist", { params: { projectId }, body: { points } }),
    onSuccess: () => refreshRevisions(client, projectId),
  });
}
