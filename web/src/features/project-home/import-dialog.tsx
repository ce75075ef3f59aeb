import type { Scenario } from "@restband/solver";
import { useNavigate } from "react-router-dom";
import { useCreateCases, useCreateScenario } from "../../api/scenarios.ts";
import { Dialog } from "../../components/dialog.tsx";
import { lazyPart } from "../../components/lazy-part.ts";
import { announce } from "../../components/status.tsx";
import { capitalised, sayMany } from "../../format/words.ts";
import { paths } from "../../paths.ts";

// Loaded when it is opened, with the rules that scenarios are checked by.
const ImportForm = lazyPart(async () => (await import("./import-form.tsx")).ImportForm);

interface ImportDialogProps {
  projectId: string;
  isOpen: boolean;
  onClose: () => void;
}

/** Brings scenarios in as JSON. A single one is opened, several are left in the list. */
export function ImportDialog({ projectId, isOpen, onClose }: ImportDialogProps) {
  const create = useCreateScenario(projectId);
  const createAll = useCreateCases(projectId);
  const navigate = useNavigate();
  const save = async (scenarios: Scenario[]) => {
    if (scenarios.length === 1) {
      const { id } = await create.mutateAsync(scenarios[0]);
      return navigate(paths.scenario(projectId, id));
    }
    await createAll.mutateAsync(scenarios);
    announce(`${capitalised(sayMany(scenarios.length, "scenario"))} brought in.`);
    onClose();
  };
  return (
    <Dialog isOpen={isOpen} isWide title="Bring in scenarios" onClose={onClose}>
      <ImportForm save={save} onCancel={onClose} />
    </Dialog>
  );
}
