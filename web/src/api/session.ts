import type { Account, Session } from "@restband/api/contract";
import { queryOptions, useMutation, useQueryClient, useSuspenseQuery, type QueryClient } from "@tanstack/react-query";
import { call, forgetToken, type Input } from "./client.ts";
import { noteSessionStart } from "./session-end.ts";

/** Who is signed in; `account` is null for nobody. Kept until it changes: a session that ends shows in the next call. */
export const sessionQuery = queryOptions({
  queryKey: ["session"],
  queryFn: ({ signal }) => call("readSession", { signal }),
  staleTime: Infinity,
});

/** The person signed in. Only for pages behind the sign-in. */
export function useAccount(): Account {
  const { account } = useSuspenseQuery(sessionQuery).data;
  if (!account) throw new Error("This page needs somebody signed in.");
  return account;
}

/** Puts a session in force. What another person could see is forgotten, what the same person saw is read anew. */
function adopt(client: QueryClient, session: Session): void {
  const before = client.getQueryData(sessionQuery.queryKey)?.account?.id;
  const isOther = ({ queryKey }: { queryKey: readonly unknown[] }) => queryKey[0] !== sessionQuery.queryKey[0];
  if (before !== session.account?.id) client.removeQueries({ predicate: isOther });
  client.setQueryData(sessionQuery.queryKey, session);
  noteSessionStart();
  void client.invalidateQueries({ predicate: isOther });
}

export function useSignIn() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: Input<"signIn">["body"]) => call("signIn", { body }),
    onSuccess: (session) => adopt(client, session),
  });
}

/**
 * Makes an account and signs in with it. Where the address had an account already the server does not say so: the
 * sign-in then fails as one with a wrong password does.
 */
export function useSignUp() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async (body: Input<"signUp">["body"]) => {
      await call("signUp", { body });
      return call("signIn", { body: { email: body.email, password: body.password } });
    },
    onSuccess: (session) => adopt(client, session),
  });
}

/** Uses up a one-time link and signs in. */
export function useClaimAccount() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: Input<"claimAccount">["body"]) => call("claimAccount", { body }),
    onSuccess: (session) => adopt(client, session),
  });
}

/** Remembers the units a person thinks in. They hold at once, and as long as the page where the server does not answer. */
export function useChangeUnits() {
  const client = useQueryClient();
  const show = (units: Account["units"]) =>
    client.setQueryData(sessionQuery.queryKey, (old) =>
      old?.account ? { ...old, account: { ...old.account, units } } : old,
    );
  return useMutation({
    scope: { id: "units" },
    mutationFn: (units: Account["units"]) => call("changeAccount", { body: { units } }),
    onMutate: show,
  });
}

/** Ends the session; the caller then leaves the page. */
export function useSignOut() {
  return useMutation({ mutationFn: () => call("signOut", {}), onSuccess: forgetToken });
}
