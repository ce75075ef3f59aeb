import { claimSchema } from "@restband/api/contract";
import { useClaimAccount } from "../../api/session.ts";
import { EntryForm, NameField, NewPasswordField } from "./entry-form.tsx";
import { nameMessage, newPasswordMessage } from "./form-messages.ts";
import { useEntryForm } from "./use-entry-form.ts";

/** Name and password for the account a one-time link belongs to. */
export function ClaimForm({ token, onSignedIn }: { token: string; onSignedIn: () => void }) {
  const claim = useClaimAccount();
  const { register, errors, isSubmitting, failure, submit } = useEntryForm({
    schema: claimSchema,
    messages: {
      token: "This link is not whole. Copy it once more, to its last character.",
      name: nameMessage,
      password: newPasswordMessage,
    },
    values: { token, name: "", password: "" },
    send: async (values) => {
      await claim.mutateAsync(values);
      onSignedIn();
    },
  });
  const told = failure ?? errors.token?.message;
  return (
    <EntryForm action="Open the account" isBusy={isSubmitting} failure={told} onSubmit={submit}>
      <NameField error={errors.name?.message} {...register("name")} />
      <NewPasswordField error={errors.password?.message} {...register("password")} />
    </EntryForm>
  );
}
