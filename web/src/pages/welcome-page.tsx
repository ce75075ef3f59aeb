import { useNavigate, useParams } from "react-router-dom";
import { ClaimForm } from "../features/account/claim-form.tsx";
import { EntryPage } from "../features/account/entry-page.tsx";
import { paths } from "../paths.ts";

/** Where a one-time link leads. */
export function WelcomePage() {
  const navigate = useNavigate();
  const { token = "" } = useParams();
  return (
    <EntryPage title="Open your account">
      <title>Open your account · Restband</title>
      <ClaimForm token={token} onSignedIn={() => void navigate(paths.projects, { replace: true })} />
      <p className="mt-4 text-13 text-quiet">The link works once, and belongs to one address.</p>
    </EntryPage>
  );
}
