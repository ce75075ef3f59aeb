import { claimSchema } from "@restband/api/contract";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { showFailure } from "../../api/form-failure.ts";
import { useClaimAccount } from "../../api/session.ts";
import { Button } from "../../components/button.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { PasswordField } from "../../components/password-field.tsx";
import { TextField } from "../../components/text-field.tsx";
import { checkedBy } from "./form-messages.ts";
import { passwordHelp } from "./sign-up-form.tsx";

const messages = {
  token: "This link is not whole. Copy it once more, to its last character.",
  name: "Enter your name, up to 80 characters.",
  password: "Enter a password of 12 to 256 characters.",
};

/** Name and password for the account a one-time link belongs to. */
export function ClaimForm({ token, onSignedIn }: { token: string; onSignedIn: () => void }) {
  const claim = useClaimAccount();
  const [failure, setFailure] = useState<string | null>(null);
  const { register, handleSubmit, setError, formState } = useForm({
    resolver: checkedBy(claimSchema, messages),
    defaultValues: { token, name: "", password: "" },
  });
  const { errors, isSubmitting } = formState;
  const submit = handleSubmit(async (values) => {
    setFailure(null);
    try {
      await claim.mutateAsync(values);
      onSignedIn();
    } catch (error) {
      setFailure(showFailure(error, ["name", "password"], setError));
    }
  });
  const shown = failure ?? errors.token?.message;
  return (
    <form onSubmit={submit} noValidate className="flex flex-col gap-5">
      <TextField label="Name" autoComplete="name" error={errors.name?.message} {...register("name")} />
      <PasswordField
        label="Password"
        autoComplete="new-password"
        help={passwordHelp}
        error={errors.password?.message}
        {...register("password")}
      />
      {shown && <ErrorNote>{shown}</ErrorNote>}
      <Button type="submit" kind="primary" isBusy={isSubmitting} className="h-[44px]">
        Open the account
      </Button>
    </form>
  );
}
