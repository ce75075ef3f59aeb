import { signUpSchema } from "@restband/api/contract";
import { ApiFailure } from "../../api/api-failure.ts";
import { useSignUp } from "../../api/session.ts";
import { EmailField, EntryForm, NameField, NewPasswordField } from "./entry-form.tsx";
import { emailMessage, nameMessage, newPasswordMessage, trimmed } from "./form-messages.ts";
import { useEntryForm } from "./use-entry-form.ts";

/** Makes an account and signs in with it. */
export function SignUpForm({ onSignedIn }: { onSignedIn: () => void }) {
  const signUp = useSignUp();
  const { register, errors, isSubmitting, failure, submit } = useEntryForm({
    schema: signUpSchema,
    messages: { name: nameMessage, email: emailMessage, password: newPasswordMessage },
    values: { name: "", email: "", password: "" },
    send: async (values) => {
      await signUp.mutateAsync(values);
      onSignedIn();
    },
    sayOwn: (error) => (isWrongPassword(error) ? known : null),
  });
  return (
    <EntryForm action="Make the account" isBusy={isSubmitting} failure={failure} onSubmit={submit}>
      <NameField error={errors.name?.message} {...register("name")} />
      <EmailField error={errors.email?.message} {...register("email", { setValueAs: trimmed })} />
      <NewPasswordField error={errors.password?.message} {...register("password")} />
    </EntryForm>
  );
}

const known = "This address and password do not open an account. Where there was one before, its own password does.";

const isWrongPassword = (error: unknown): boolean => error instanceof ApiFailure && error.status === 401;
