import type { Notice } from "@restband/api/contract";
import { queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import { call } from "./client.ts";

const LOOK_AGAIN_MS = 30_000;

/** What waits for the reader in all their projects, newest first. */
export const noticesQuery = queryOptions({
  queryKey: ["notices"],
  queryFn: ({ signal }) => call("listNotices", { signal }),
  refetchInterval: LOOK_AGAIN_MS,
});

/** Puts a notice away, at once; it comes back where the server did not hear of it. */
export function useCloseNotice() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (noticeId: string) => call("closeNotice", { params: { noticeId } }),
    onMutate: (noticeId) =>
      client.setQueryData(noticesQuery.queryKey, (known?: Notice[]) => known?.filter(({ id }) => id !== noticeId)),
    onError: () => client.invalidateQueries({ queryKey: noticesQuery.queryKey }),
  });
}
