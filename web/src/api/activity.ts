import type { ActivityEntry } from "@restband/api/contract";
import { infiniteQueryOptions, useQuery, useQueryClient } from "@tanstack/react-query";
import { useEffect, useRef } from "react";
import { call, type Input } from "./client.ts";

/** What of a trail is asked for; nothing: all of it. */
export type TrailFilter = Omit<Input<"listActivity">["query"], "before">;

const listActivity = (
  projectId: string,
  before: number | null,
  signal: AbortSignal,
  filter: TrailFilter = {},
): Promise<ActivityEntry[]> =>
  call("listActivity", {
    params: { projectId },
    query: { ...filter, ...(before === null ? {} : { before: String(before) }) },
    signal,
  });

/** The trail of a project, or what of it is asked for, newest first, a page at a time. */
export const trailQuery = (projectId: string, filter: TrailFilter = {}) =>
  infiniteQueryOptions({
    queryKey: ["projects", projectId, "trail", filter],
    queryFn: ({ pageParam, signal }) => listActivity(projectId, pageParam, signal, filter),
    initialPageParam: null as number | null,
    getNextPageParam: (page) => page.at(-1)?.id ?? null,
  });

const LOOK_AGAIN_MS = 10_000;

/**
 * The newest page of the trail, looked at again every few seconds while the page is in sight. An act that is new means
 * that somebody changed something: everything the page shows of the project is then read anew.
 */
export function useLately(projectId: string) {
  const client = useQueryClient();
  const lately = useQuery({
    queryKey: ["projects", projectId, "activity"],
    queryFn: ({ signal }) => listActivity(projectId, null, signal),
    refetchInterval: LOOK_AGAIN_MS,
  });
  const newest = lately.data?.[0]?.id;
  const seen = useRef(newest);
  useEffect(() => {
    if (seen.current !== undefined && newest !== undefined && newest > seen.current) {
      const isOther = ({ queryKey }: { queryKey: readonly unknown[] }) =>
        queryKey[1] === projectId && queryKey[2] !== "activity";
      void client.invalidateQueries({ predicate: isOther });
    }
    seen.current = newest;
  }, [client, projectId, newest]);
  return lately;
}
