import { jsonText } from "@restband/solver";
import { useState } from "react";
import { fileNameOf, saveFile } from "../../components/save-file.ts";
import type { RunView } from "./run-view.ts";
import { SamplesDialog } from "./samples-dialog.tsx";

/** The run as files: its samples, its scenario and its result. */
export function SaveRun({ view }: { view: RunView }) {
  const [isChoosing, setChoosing] = useState(false);
  const { scenario, result } = view;
  const save = (what: string, content: unknown): void =>
    saveFile(fileNameOf(`${scenario.title} ${what}`, "json"), "application/json", `${jsonText(content)}\n`);
  return (
    <>
      <div className="mt-3 flex flex-wrap items-center gap-x-4 text-13 text-quiet">
        Save
        <button type="button" className="link hit" onClick={() => setChoosing(true)}>
          samples as CSV
        </button>
        <button type="button" className="link hit" onClick={() => save("scenario", scenario)}>
          scenario as JSON
        </button>
        <button type="button" className="link hit" onClick={() => save("result", result)}>
          result as JSON
        </button>
      </div>
      {isChoosing && <SamplesDialog view={view} onClose={() => setChoosing(false)} />}
    </>
  );
}
