import type { Project, ScenarioSummary } from "@restband/api/contract";
import { useQuery } from "@tanstack/react-query";
import { useState } from "react";
import { projectsQuery } from "../../api/projects.ts";
import { Button } from "../../components/button.tsx";
import { RadioChoices } from "../../components/choices.tsx";
import { Dialog, DialogActions } from "../../components/dialog.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { mayEdit } from "./roles.ts";

interface MoveDialogProps {
  projectId: string;
  /** What to move; nothing while null. */
  summary: ScenarioSummary | null;
  onMove: (summary: ScenarioSummary, target: Project) => Promise<void>;
  onClose: () => void;
}

/** Chooses the project a scenario goes to. */
export function MoveDialog({ projectId, summary, onMove, onClose }: MoveDialogProps) {
  return (
    <Dialog isOpen={summary !== null} title={`Move “${summary?.title || "Untitled"}”`} onClose={onClose}>
      {summary && <MoveForm projectId={projectId} summary={summary} onMove={onMove} onClose={onClose} />}
    </Dialog>
  );
}

function MoveForm({ projectId, summary, onMove, onClose }: MoveDialogProps & { summary: ScenarioSummary }) {
  const projects = useQuery(projectsQuery);
  const [chosen, setChosen] = useState("");
  const [failure, setFailure] = useState<string | null>(null);
  const [isBusy, setBusy] = useState(false);
  const targets = (projects.data ?? []).filter(
    ({ id, role, archivedAt }) => id !== projectId && mayEdit(role) && archivedAt === null,
  );
  const move = async () => {
    const target = targets.find(({ id }) => id === chosen);
    if (!target) return setFailure("Choose the project it goes to.");
    setBusy(true);
    try {
      await onMove(summary, target);
      onClose();
    } catch (error) {
      setFailure(error instanceof Error ? error.message : String(error));
    } finally {
      setBusy(false);
    }
  };
  if (projects.error) return <ErrorNote>{projects.error.message}</ErrorNote>;
  if (projects.data && targets.length === 0) return <p>There is no other project in which you may make scenarios.</p>;
  return (
    <>
      <p className="mb-4">
        The people of that project see it from then on; those who are only in this one no longer do.
      </p>
      <RadioChoices
        label="To"
        choices={targets.map(({ id, name, role }) => ({ value: id, label: name, remark: `you are ${role}` }))}
        value={chosen}
        onChange={setChosen}
      />
      {failure && <ErrorNote className="mt-4">{failure}</ErrorNote>}
      <DialogActions>
        <Button kind="primary" isBusy={isBusy} onClick={move}>
          Move
        </Button>
        <Button data-first-focus onClick={onClose}>
          Cancel
        </Button>
      </DialogActions>
    </>
  );
}
