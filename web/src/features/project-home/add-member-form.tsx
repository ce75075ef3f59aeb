import { zodResolver } from "@hookform/resolvers/zod";
import { memberAddSchema, type Role } from "@restband/api/contract";
import { useState } from "react";
import { Controller, useForm } from "react-hook-form";
import { showFailure } from "../../api/form-failure.ts";
import { useAddMember } from "../../api/members.ts";
import { Button } from "../../components/button.tsx";
import { RadioChoices } from "../../components/choices.tsx";
import { DialogActions } from "../../components/dialog.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { announce } from "../../components/status.tsx";
import { TextField } from "../../components/text-field.tsx";
import { roleChoices } from "./roles.ts";

const message = "Enter the e-mail address of their account, as in name@firm.example.";

/** Address and role of somebody with an account. */
export function AddMemberForm({ projectId, onDone }: { projectId: string; onDone: () => void }) {
  const add = useAddMember(projectId);
  const [failure, setFailure] = useState<string | null>(null);
  const { register, control, handleSubmit, setError, formState } = useForm({
    resolver: zodResolver(memberAddSchema, { error: () => message }),
    defaultValues: { email: "", role: "editor" as Role },
  });
  const submit = handleSubmit(async (values) => {
    setFailure(null);
    try {
      const member = await add.mutateAsync(values);
      announce(`${member.name} is in the project as ${member.role}.`);
      onDone();
    } catch (error) {
      setFailure(showFailure(error, ["email", "role"], setError));
    }
  });
  return (
    <form onSubmit={submit} noValidate className="flex flex-col gap-5">
      <TextField
        label="E-mail"
        type="email"
        autoCapitalize="off"
        spellCheck={false}
        data-first-focus
        help="They need an account first."
        error={formState.errors.email?.message}
        {...register("email", { setValueAs: (value: string) => value.trim() })}
      />
      <Controller
        control={control}
        name="role"
        render={({ field }) => (
          <RadioChoices label="Role" choices={roleChoices} value={field.value} onChange={field.onChange} />
        )}
      />
      {failure && <ErrorNote>{failure}</ErrorNote>}
      <DialogActions>
        <Button type="submit" kind="primary" isBusy={formState.isSubmitting}>
          Add
        </Button>
        <Button onClick={onDone}>Cancel</Button>
      </DialogActions>
    </form>
  );
}
