import { signInSchema } from "@restband/api/contract";
import { useSignIn } from "../../api/session.ts";
import { PasswordField } from "../../components/password-field.tsx";
import { EmailField, EntryForm } from "./entry-form.tsx";
import { emailMessage, trimmed } from "./form-messages.ts";
import { useEntryForm } from "./use-entry-form.ts";

interface SignInFormProps {
  /** The address to begin with. */
  email?: string;
  /** Called when the session is there, with the id of whom it belongs to. */
  onSignedIn: (accountId: string | undefined) => void;
}

/** Address and password. A refusal does not say which of the two was wrong; both stay as typed. */
export function SignInForm({ email = "", onSignedIn }: SignInFormProps) {
  const signIn = useSignIn();
  const { register, errors, isSubmitting, failure, submit } = useEntryForm({
    schema: signInSchema,
    messages: { email: emailMessage, password: "Enter the password." },
    values: { email, password: "" },
    send: async (values) => onSignedIn((await signIn.mutateAsync(values)).account?.id),
  });
  return (
    <EntryForm action="Sign in" isBusy={isSubmitting} failure={failure} onSubmit={submit}>
      <EmailField error={errors.email?.message} {...register("email", { setValueAs: trimmed })} />
      <PasswordField
        label="Password"
        autoComplete="current-password"
        data-first-focus={email !== "" || undefined}
        error={errors.password?.message}
        {...register("password")}
      />
    </EntryForm>
  );
}
