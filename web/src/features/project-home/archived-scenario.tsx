import type { StoredScenario } from "@restband/api/contract";
import { useScenarioActs } from "../../api/scenarios.ts";
import { Button } from "../../components/button.tsx";
import { announce } from "../../components/status.tsx";
import { sayWhen } from "../../format/when.ts";

interface ArchivedScenarioProps {
  stored: StoredScenario;
  archivedAt: string;
  /** Whether the person may take it out again. */
  canRestore: boolean;
}

/** Says on a scenario's own page that it was put away. */
export function ArchivedScenario({ stored, archivedAt, canRestore }: ArchivedScenarioProps) {
  const acts = useScenarioActs();
  const restore = async (): Promise<void> => {
    try {
      await acts.restore(stored.projectId, stored.id);
      announce(`“${stored.content.title || "Untitled"}” is in use again.`);
    } catch (error) {
      announce(error instanceof Error ? error.message : String(error));
    }
  };
  return (
    <div className="mb-6 flex w-fit flex-wrap items-center gap-x-4 gap-y-2 border-[1.5px] border-ink px-3.5 py-2.5">
      <p>
        Archived since {sayWhen(new Date(archivedAt))}. Everything can be read and tried; no change is kept until it is
        restored.
      </p>
      {canRestore && <Button onClick={() => void restore()}>Restore</Button>}
    </div>
  );
}
