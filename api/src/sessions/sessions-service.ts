import type { z } from "@restband/solver";
import type { Request } from "express";
import type { Account, signInSchema } from "../accounts/accounts-schema.ts";
import type { AccountsService } from "../accounts/accounts-service.ts";
import { normaliseEmail } from "../accounts/email.ts";
import type { Session } from "../contract.ts";
import { Refusal, refusedContent } from "../errors.ts";
import { csrfTokenOf } from "../middleware/csrf.ts";
import { openSession, saveSession } from "../middleware/session.ts";
import type { Throttle } from "../middleware/throttle.ts";

export type SessionsService = ReturnType<typeof createSessionsService>;

/** Who is signed in at a browser. */
export function createSessionsService(accounts: AccountsService, throttle: Throttle) {
  return {
    /** The session as its browser may know it, with the token for unsafe requests; the database has it on return. */
    async describe(request: Request): Promise<Session> {
      const { accountId, csrfToken: known } = request.session;
      const csrfToken = csrfTokenOf(request);
      if (!known) await saveSession(request);
      return { account: accountId ? await accounts.find(accountId) : null, csrfToken };
    },

    /**
     * Opens a new session. A wrong password and an unknown address get one and the same answer, after the same work.
     * @throws Refusal 401, or 429 with the wait
     */
    async signIn(request: Request, claim: z.infer<typeof signInSchema>): Promise<void> {
      const email = normaliseEmail(claim.email);
      await throttle.countAccount(email);
      const accountId = await accounts.identify(claim);
      if (!accountId) throw new Refusal(401, "wrong-password", "Address and password do not belong together.");
      await openSession(request, accountId);
      await throttle.forgive(email, request);
    },

    /**
     * Demands the password of who is signed in once more, for what is signed with their name.
     * @throws Refusal 422 for a wrong one, or 429 with the wait
     */
    async confirm(request: Request, account: Account, password: string): Promise<void> {
      const email = normaliseEmail(account.email);
      await throttle.countAccount(email);
      if ((await accounts.identify({ email: account.email, password })) !== account.id) {
        throw refusedContent("wrong-password", [{ path: "password", message: "This is not your password." }]);
      }
      await throttle.forgive(email, request);
    },
  };
}
