import { projectDraftSchema, type Project } from "@restband/api/contract";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { showFailure } from "../../api/form-failure.ts";
import { Button } from "../../components/button.tsx";
import { DialogActions } from "../../components/dialog.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { TextArea, TextField } from "../../components/text-field.tsx";
import { zodResolver } from "@hookform/resolvers/zod";

interface ProjectFormProps {
  /** What is there already; a new project without it. */
  project?: Pick<Project, "name" | "description">;
  action: string;
  save: (draft: { name: string; description: string }) => Promise<unknown>;
  onCancel: () => void;
}

const messages: Record<string, string> = {
  name: "Give the project a name of up to 120 characters.",
  description: "A description has at most 2000 characters.",
};

/** Name and description of a project, inside a dialog. */
export function ProjectForm({ project, action, save, onCancel }: ProjectFormProps) {
  const [failure, setFailure] = useState<string | null>(null);
  const { register, handleSubmit, setError, formState } = useForm({
    resolver: zodResolver(projectDraftSchema, { error: ({ path }) => messages[String(path?.[0])] }),
    defaultValues: { name: project?.name ?? "", description: project?.description ?? "" },
  });
  const { errors, isSubmitting } = formState;
  const submit = handleSubmit(async (draft) => {
    setFailure(null);
    try {
      await save(draft);
    } catch (error) {
      setFailure(showFailure(error, ["name", "description"], setError));
    }
  });
  return (
    <form onSubmit={submit} noValidate className="flex flex-col gap-5">
      <TextField label="Name" data-first-focus error={errors.name?.message} {...register("name")} />
      <TextArea
        label="What it is about"
        help="Shown under the name to everybody in the project. May be left empty."
        error={errors.description?.message}
        {...register("description")}
      />
      {failure && <ErrorNote>{failure}</ErrorNote>}
      <DialogActions>
        <Button type="submit" kind="primary" isBusy={isSubmitting}>
          {action}
        </Button>
        <Button onClick={onCancel}>Cancel</Button>
      </DialogActions>
    </form>
  );
}
