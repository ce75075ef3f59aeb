import type { ComponentProps, FormEventHandler, ReactNode } from "react";
import { Button } from "../../components/button.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { PasswordField } from "../../components/password-field.tsx";
import { TextField } from "../../components/text-field.tsx";

interface EntryFormProps {
  /** What its one button says. */
  action: string;
  isBusy: boolean;
  failure: string | undefined | null;
  onSubmit: FormEventHandler<HTMLFormElement>;
  children: ReactNode;
}

/** The frame of a form before the sign-in: its fields, what went wrong, its button. */
export function EntryForm({ action, isBusy, failure, onSubmit, children }: EntryFormProps) {
  return (
    <form onSubmit={onSubmit} noValidate className="flex flex-col gap-5">
      {children}
      {failure && <ErrorNote>{failure}</ErrorNote>}
      <Button type="submit" kind="primary" isBusy={isBusy} className="h-[44px]">
        {action}
      </Button>
    </form>
  );
}

type OwnField = Omit<ComponentProps<typeof TextField>, "label" | "type">;

export function NameField(field: OwnField) {
  return <TextField label="Name" autoComplete="name" {...field} />;
}

export function EmailField(field: OwnField) {
  return (
    <TextField label="E-mail" type="email" autoComplete="username" autoCapitalize="off" spellCheck={false} {...field} />
  );
}

/** A password that is chosen here, with what is demanded of it. */
export function NewPasswordField(field: OwnField) {
  return (
    <PasswordField
      label="Password"
      autoComplete="new-password"
      help="At least 12 characters. A few unrelated words are good; nothing else is demanded."
      {...field}
    />
  );
}
