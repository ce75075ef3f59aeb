import type { Revision } from "@restband/api/contract";
import { pythonGap, pythonScript } from "@restband/solver";
import { useId, useState } from "react";
import { useKeepReplay } from "../../api/revisions.ts";
import { Button } from "../../components/button.tsx";
import { controlClass, FieldError } from "../../components/field.tsx";
import { fileNameOf, saveFile } from "../../components/save-file.ts";
import { announce } from "../../components/status.tsx";
import { readScriptOutput } from "./script-output.ts";

/** The revision as a Python file that runs without this product, and a place to bring back what it printed. */
export function ScriptPart({ revision }: { revision: Revision }) {
  const { content, result, title, number } = revision;
  const [isOpen, setOpen] = useState(false);
  const gap = pythonGap(content, result.ended);
  if (gap)
    return (
      <p className="mt-5 max-w-(--measure)">
        <strong>Check it yourself:</strong> not for this revision. {gap}
      </p>
    );
  const save = (): void => {
    const { quantities, events, eventCount, solverVersion } = result;
    const claim = { quantities, events, eventCount, solverVersion, digest: revision.digest };
    const text = pythonScript(content, { ...claim, name: `revision ${number} of ${title || "Untitled"}` });
    const name = fileNameOf(`${title} revision ${number}`, "py");
    saveFile(name, "text/x-python", text);
    announce(`${name} is saved. It needs Python with numpy and scipy.`);
  };
  return (
    <div className="mt-5">
      <p className="max-w-(--measure)">
        <strong>Check it yourself:</strong> one Python file that needs numpy and scipy and nothing of ours. It
        integrates the equation of motion by itself and prints each figure beside the frozen one.
      </p>
      <div className="mt-3 flex flex-wrap gap-3">
        <Button onClick={save}>Save the Python file</Button>
        <Button aria-expanded={isOpen} onClick={() => setOpen(!isOpen)}>
          Bring back what it printed
        </Button>
      </div>
      {isOpen && <OutputForm revision={revision} onKept={() => setOpen(false)} />}
    </div>
  );
}

function OutputForm({ revision, onKept }: { revision: Revision; onKept: () => void }) {
  const [text, setText] = useState("");
  const [fault, setFault] = useState<string | null>(null);
  const keep = useKeepReplay(revision.projectId, revision.id);
  const id = useId();
  const send = async (): Promise<void> => {
    const draft = readScriptOutput(text, revision.result.solverVersion);
    if (!draft)
      return setFault("This is not all of what the file prints: its last line begins with agrees or DIFFERS.");
    setFault(null);
    try {
      await keep.mutateAsync(draft);
      announce("What the Python file printed is kept as a replay.");
      onKept();
    } catch (error) {
      setFault(error instanceof Error ? error.message : String(error));
    }
  };
  return (
    <div className="mt-4 max-w-[760px]">
      <label htmlFor={id} className="text-15 font-semibold">
        What the file printed, from its first line to its last
      </label>
      <textarea
        id={id}
        rows={6}
        value={text}
        aria-invalid={fault ? true : undefined}
        aria-describedby={fault ? `${id}-error` : undefined}
        className={`${controlClass} figures mt-1.5 h-auto! w-full py-2 text-13!`}
        onChange={(event) => setText(event.currentTarget.value)}
      />
      {fault && <FieldError id={`${id}-error`}>{fault}</FieldError>}
      <Button className="mt-3" isBusy={keep.isPending} onClick={() => void send()}>
        Keep it as a replay
      </Button>
    </div>
  );
}
