import { signUpSchema } from "@restband/api/contract";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { ApiFailure } from "../../api/api-failure.ts";
import { showFailure } from "../../api/form-failure.ts";
import { useSignUp } from "../../api/session.ts";
import { Button } from "../../components/button.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { PasswordField } from "../../components/password-field.tsx";
import { TextField } from "../../components/text-field.tsx";
import { checkedBy } from "./form-messages.ts";
import { trimmed } from "./sign-in-form.tsx";

const messages = {
  name: "Enter your name, up to 80 characters.",
  email: "Enter an e-mail address, as in name@firm.example.",
  password: "Enter a password of 12 to 256 characters.",
};
export const passwordHelp = "At least 12 characters. A few unrelated words are good; nothing else is demanded.";

/** Makes an account and signs in with it. */
export function SignUpForm({ onSignedIn }: { onSignedIn: () => void }) {
  const signUp = useSignUp();
  const [failure, setFailure] = useState<string | null>(null);
  const { register, handleSubmit, setError, formState } = useForm({
    resolver: checkedBy(signUpSchema, messages),
    defaultValues: { name: "", email: "", password: "" },
  });
  const { errors, isSubmitting } = formState;
  const submit = handleSubmit(async (values) => {
    setFailure(null);
    try {
      await signUp.mutateAsync(values);
      onSignedIn();
    } catch (error) {
      setFailure(isWrongPassword(error) ? known : showFailure(error, ["name", "email", "password"], setError));
    }
  });
  return (
    <form onSubmit={submit} noValidate className="flex flex-col gap-5">
      <TextField label="Name" autoComplete="name" error={errors.name?.message} {...register("name")} />
      <TextField
        label="E-mail"
        type="email"
        autoComplete="username"
        autoCapitalize="off"
        spellCheck={false}
        error={errors.email?.message}
        {...register("email", { setValueAs: trimmed })}
      />
      <PasswordField
        label="Password"
        autoComplete="new-password"
        help={passwordHelp}
        error={errors.password?.message}
        {...register("password")}
      />
      {failure && <ErrorNote>{failure}</ErrorNote>}
      <Button type="submit" kind="primary" isBusy={isSubmitting} className="h-[44px]">
        Make the account
      </Button>
    </form>
  );
}

const known = "This address and password do not open an account. Where there was one before, its own password does.";

const isWrongPassword = (error: unknown): boolean => error instanceof ApiFailure && error.status === 401;
