import type { HandlersOf } from "../route-handler.ts";
import { openSession } from "../middleware/session.ts";
import type { SessionsService } from "../sessions/sessions-service.ts";
import type { AccountsService } from "./accounts-service.ts";

export function accountsRoutes(
  accounts: AccountsService,
  sessions: SessionsService,
): HandlersOf<"signUp" | "claimAccount"> {
  return {
    signUp: ({ body }) => accounts.signUp(body),

    claimAccount: async ({ body, request }) => {
      await openSession(request, await accounts.claim(body));
      return sessions.describe(request);
    },
  };
}
