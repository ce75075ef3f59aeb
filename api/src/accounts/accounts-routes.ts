import type { HandlersOf } from "../route-handler.ts";
import { openSession } from "../middleware/session.ts";
import type { SessionsService } from "../sessions/sessions-service.ts";
import type { AccountsService } from "./accounts-service.ts";

export function accountsRoutes(
  accounts: AccountsService,
  sessions: SessionsService,
): HandlersOf<"signUp" | "claimAccount" | "changeAccount"> {
  return {
    signUp: ({ body }) => accounts.signUp(body),
    changeAccount: ({ body, account }) => accounts.change(account, body),

    claimAccount: async ({ body, request }) => {
      await openSession(request, await accounts.claim(body));
      return sessions.describe(request);
    },
  };
}
