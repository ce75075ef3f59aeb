import { Link, useNavigate, useSearchParams } from "react-router-dom";
import { EntryPage } from "../features/account/entry-page.tsx";
import { SignInForm } from "../features/account/sign-in-form.tsx";
import { paths, returnTarget } from "../paths.ts";

export function SignInPage() {
  const navigate = useNavigate();
  const [search] = useSearchParams();
  return (
    <EntryPage title="Sign in">
      <title>Sign in · Restband</title>
      <SignInForm onSignedIn={() => void navigate(returnTarget(search), { replace: true })} />
      <p className="mt-4 text-13 text-quiet">
        No account?{" "}
        <Link to={{ pathname: paths.signUp, search: search.toString() }} className="link">
          Make one
        </Link>
        , and whoever owns a project adds you to it by its address.
      </p>
    </EntryPage>
  );
}
