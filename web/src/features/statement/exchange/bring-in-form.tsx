import type { Fault, Scenario } from "@restband/solver";
import { useState } from "react";
import { Button } from "../../../components/button.tsx";
import { DialogActions } from "../../../components/dialog.tsx";
import { FileButton } from "../../../components/file-button.tsx";
import { TextArea } from "../../../components/text-field.tsx";
import { sayMany } from "../../../format/words.ts";
import { readScenario } from "./read-scenario.ts";

/** Bytes a scenario's file may have: records of some 100,000 points fit. */
const MOST = 5e6;

/** A scenario pasted or from a file, taken as a whole; nothing is taken of one with a fault, and each fault is named. */
export function BringInForm({ onTake }: { onTake: (scenario: Scenario) => void }) {
  const [text, setText] = useState("");
  const [faults, setFaults] = useState<readonly Fault[]>([]);
  const take = (source: string): void => {
    const { scenario, faults: found } = readScenario(source);
    setFaults(found);
    if (scenario) onTake(scenario);
  };
  const takeFile = (source: string): void => {
    setText(source);
    take(source);
  };
  const type = (source: string): void => {
    setText(source);
    setFaults([]);
  };
  return (
    <>
      <TextArea
        label="Scenario as JSON"
        help="It takes the place of the one on the page; Undo brings that back."
        error={faults.length > 0 && <Faults faults={faults} />}
        rows={10}
        spellCheck={false}
        value={text}
        onChange={(event) => type(event.currentTarget.value)}
      />
      <DialogActions>
        <Button kind="primary" onClick={() => take(text)}>
          Take it
        </Button>
        <FileButton
          accept=".json,application/json"
          most={MOST}
          onText={takeFile}
          onRefused={(message) => setFaults([{ path: "", message }])}
        >
          Choose a file
        </FileButton>
      </DialogActions>
    </>
  );
}

function Faults({ faults }: { faults: readonly Fault[] }) {
  if (faults.length === 1 && faults[0].path === "") return faults[0].message;
  return (
    <span role="alert">
      Not taken: {sayMany(faults.length, "fault")}.
      {faults.map(({ path, message }) => (
        <span key={path + message} className="mt-1 block">
          {path && <code className="figures font-semibold">{path}</code>} {message}
        </span>
      ))}
    </span>
  );
}
