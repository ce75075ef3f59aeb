import { MutationCache, QueryCache, QueryClient } from "@tanstack/react-query";
import { ApiFailure } from "./api-failure.ts";
import { noteSessionEnd } from "./session-end.ts";

const isWorthRetrying = (failures: number, error: Error) =>
  failures < 2 && error instanceof ApiFailure && error.isUnreachable;

const onError = (error: Error) => {
  if (error instanceof ApiFailure && error.isSignedOut) noteSessionEnd();
};

/** Holds the server's copy of everything. Drafts live elsewhere: a refetch never touches what a person is typing. */
export function makeQueryClient(): QueryClient {
  return new QueryClient({
    queryCache: new QueryCache({ onError }),
    mutationCache: new MutationCache({ onError }),
    defaultOptions: {
      queries: { staleTime: 10_000, retry: isWorthRetrying, networkMode: "always" },
      mutations: { retry: false, networkMode: "always" },
    },
  });
}
