import { Link, useNavigate, useSearchParams } from "react-router-dom";
import { EntryPage } from "../features/account/entry-page.tsx";
import { SignUpForm } from "../features/account/sign-up-form.tsx";
import { patterns, returnTarget } from "../paths.ts";

export function SignUpPage() {
  const navigate = useNavigate();
  const [search] = useSearchParams();
  return (
    <EntryPage title="Make an account">
      <title>Make an account · Restband</title>
      <SignUpForm onSignedIn={() => void navigate(returnTarget(search), { replace: true })} />
      <p className="mt-4 text-13 text-quiet">
        There is one already?{" "}
        <Link to={{ pathname: patterns.signIn, search: search.toString() }} className="link">
          Sign in
        </Link>
      </p>
    </EntryPage>
  );
}
