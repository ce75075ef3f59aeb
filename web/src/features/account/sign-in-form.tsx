import { signInSchema } from "@restband/api/contract";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { showFailure } from "../../api/form-failure.ts";
import { useSignIn } from "../../api/session.ts";
import { Button } from "../../components/button.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { PasswordField } from "../../components/password-field.tsx";
import { TextField } from "../../components/text-field.tsx";
import { checkedBy } from "./form-messages.ts";

interface SignInFormProps {
  /** The address to begin with. */
  email?: string;
  /** Called when the session is there, with the id of whom it belongs to. */
  onSignedIn: (accountId: string | undefined) => void;
}

const messages = {
  email: "Enter an e-mail address, as in name@firm.example.",
  password: "Enter the password.",
};

/** Address and password. A refusal does not say which of the two was wrong; both stay as typed. */
export function SignInForm({ email = "", onSignedIn }: SignInFormProps) {
  const signIn = useSignIn();
  const [failure, setFailure] = useState<string | null>(null);
  const { register, handleSubmit, setError, formState } = useForm({
    resolver: checkedBy(signInSchema, messages),
    defaultValues: { email, password: "" },
  });
  const { errors, isSubmitting } = formState;
  const submit = handleSubmit(async (values) => {
    setFailure(null);
    try {
      const { account } = await signIn.mutateAsync(values);
      onSignedIn(account?.id);
    } catch (error) {
      setFailure(showFailure(error, ["email", "password"], setError));
    }
  });
  return (
    <form onSubmit={submit} noValidate className="flex flex-col gap-5">
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
        autoComplete="current-password"
        data-first-focus={email !== "" || undefined}
        error={errors.password?.message}
        {...register("password")}
      />
      {failure && <ErrorNote>{failure}</ErrorNote>}
      <Button type="submit" kind="primary" isBusy={isSubmitting} className="h-[44px]">
        Sign in
      </Button>
    </form>
  );
}

/** Pasted addresses bring spaces along. */
export const trimmed = (value: string): string => value.trim();
