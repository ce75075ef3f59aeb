import type { Fault, Scenario } from "@restband/solver";
import { useState } from "react";
import { Button } from "../../components/button.tsx";
import { DialogActions } from "../../components/dialog.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { FileButton } from "../../components/file-button.tsx";
import { TextArea } from "../../components/text-field.tsx";
import { sayMany } from "../../format/words.ts";
import { readScenarios } from "./read-scenarios.ts";

interface ImportFormProps {
  save: (scenarios: Scenario[]) => Promise<void>;
  onCancel: () => void;
}

const MOST_FAULTS = 50;

/** Brings in scenarios as JSON, from a file or pasted; every refusal is named, and the text stays to be put right. */
export function ImportForm({ save, onCancel }: ImportFormProps) {
  const [text, setText] = useState("");
  const [faults, setFaults] = useState<readonly Fault[]>([]);
  const [failure, setFailure] = useState<string | null>(null);
  const [isBusy, setBusy] = useState(false);
  const take = (next: string) => {
    setText(next);
    setFaults([]);
    setFailure(null);
  };
  const bringIn = async () => {
    const read = readScenarios(text);
    setFaults(read.faults ?? []);
    setFailure(null);
    if (!read.scenarios) return;
    setBusy(true);
    await save(read.scenarios).catch((error: unknown) =>
      setFailure(String(error instanceof Error ? error.message : error)),
    );
    setBusy(false);
  };
  return (
    <div className="flex flex-col gap-4">
      <TextArea
        label="A scenario as JSON"
        help="As “Copy as JSON” and the command line have it; a list in [ ] brings in several."
        rows={10}
        spellCheck={false}
        data-first-focus
        value={text}
        onChange={(event) => take(event.target.value)}
      />
      <div>
        <FileButton accept=".json,application/json" most={1_000_000} onText={take} onRefused={setFailure}>
          Choose a file
        </FileButton>
      </div>
      {failure && <ErrorNote>{failure}</ErrorNote>}
      {faults.length > 0 && <Faults faults={faults} />}
      <DialogActions>
        <Button kind="primary" isBusy={isBusy} onClick={bringIn}>
          Bring in
        </Button>
        <Button onClick={onCancel}>Cancel</Button>
      </DialogActions>
    </div>
  );
}

function Faults({ faults }: { faults: readonly Fault[] }) {
  return (
    <ErrorNote>
      <p className="font-semibold">{sayFaults(faults.length)}</p>
      <ul className="mt-1 max-h-52 overflow-y-auto text-13" tabIndex={0} aria-label="Faults">
        {faults.slice(0, MOST_FAULTS).map(({ path, message }, index) => (
          <li key={index} className="mt-1">
            {path && <span className="figures">{path} </span>}
            {message}
          </li>
        ))}
        {faults.length > MOST_FAULTS && <li className="mt-1">and {faults.length - MOST_FAULTS} more</li>}
      </ul>
    </ErrorNote>
  );
}

const sayFaults = (count: number): string => `Nothing was brought in: ${sayMany(count, "fault")} to put right.`;
