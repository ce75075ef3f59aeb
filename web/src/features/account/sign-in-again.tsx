import { useQueryClient } from "@tanstack/react-query";
import { useNavigate } from "react-router-dom";
import { useHasSessionEnded } from "../../api/session-end.ts";
import { sessionQuery } from "../../api/session.ts";
import { Dialog } from "../../components/dialog.tsx";
import { paths } from "../../paths.ts";
import { SignInForm } from "./sign-in-form.tsx";

/**
 * Asks for the password again when the session ends under an open page. The page behind stays as it is, with everything
 * typed in it. Whoever signs in as somebody else starts at their own projects.
 */
export function SignInAgain() {
  const hasEnded = useHasSessionEnded();
  const navigate = useNavigate();
  const account = useQueryClient().getQueryData(sessionQuery.queryKey)?.account;
  return (
    <Dialog isOpen={hasEnded} title="Sign in again" canClose={false} onClose={() => undefined}>
      <p className="mb-5 text-quiet">The session has ended. The page behind stays as you left it.</p>
      <SignInForm
        email={account?.email}
        onSignedIn={(accountId) => void (accountId !== account?.id && navigate(paths.projects))}
      />
    </Dialog>
  );
}
