import { cellLines, type Scenario, type SweepPlan } from "@restband/solver";
import { useState } from "react";
import { Button } from "../../../components/button.tsx";
import { ErrorNote } from "../../../components/error-note.tsx";
import { FileButton } from "../../../components/file-button.tsx";
import { fileNameOf, saveFile } from "../../../components/save-file.ts";
import { announce } from "../../../components/status.tsx";
import { idlePool } from "../../../compute/explore-pools.ts";

interface SolveElsewhereProps {
  scenario: Scenario;
  plan: SweepPlan;
  title: string;
  /** Takes the tiles of answers that agree; absent where the person may not save. */
  onTiles?: (tiles: readonly Float64Array[]) => void;
}

const MOST_BYTES = 100e6;
const MOST_SHOWN = 3;

/** The cells as a file to be solved by other machines, and the way back for their answers. */
export function SolveElsewhere({ scenario, plan, title, onTiles }: SolveElsewhereProps) {
  const [faults, setFaults] = useState<readonly string[]>([]);
  const [isReading, setReading] = useState(false);
  if (plan.continuation !== "none") return null;
  const read = async (text: string): Promise<void> => {
    setReading(true);
    const seed = crypto.getRandomValues(new Int32Array(1))[0];
    const errand = { kind: "answers" as const, scenario, plan, text, seed };
    try {
      const answers = await idlePool.send(errand, new AbortController().signal);
      setFaults(answers.faults.map(({ path, message }) => (path === "" ? message : `${path}: ${message}`)));
      if (!answers.tiles) return;
      onTiles?.(answers.tiles);
      announce(`All cells are here. ${answers.recomputed} of them were run again and agree.`);
    } catch (error) {
      setFaults([error instanceof Error ? error.message : String(error)]);
    } finally {
      setReading(false);
    }
  };
  return (
    <details className="mt-8 border-t border-line pt-4">
      <summary className="link w-fit">Solve it on other machines</summary>
      <p className="mt-3 max-w-(--measure)">
        The file holds a first line with the scenario, then a line for each cell. Any number of machines solve it with
        Restband’s command line, each the first line and its part of the others. The answers go back behind the same
        first line: it tells the sweep they are of. Twenty cells are run again here before any is taken.
      </p>
      <pre className="figures mt-3 max-w-full overflow-x-auto text-13">
        {"head -1 cells.jsonl > answers.jsonl\nnpm run --silent solve -- --lines < cells.jsonl >> answers.jsonl"}
      </pre>
      <div className="mt-4 flex flex-wrap gap-3">
        <Button
          onClick={() =>
            saveFile(
              fileNameOf(`${title} cells`, "jsonl"),
              "application/x-ndjson",
              [...cellLines(scenario, plan), ""].join("\n"),
            )
          }
        >
          Save the cells
        </Button>
        {onTiles && (
          <FileButton
            accept=".jsonl,.ndjson,.txt"
            most={MOST_BYTES}
            onText={(text) => void read(text)}
            onRefused={(sentence) => setFaults([sentence])}
          >
            Bring in the answers
          </FileButton>
        )}
      </div>
      {isReading && <p className="late mt-3 text-13 text-quiet">Reading the answers, and running some of them again</p>}
      {faults.length > 0 && (
        <ErrorNote className="mt-4">
          {faults.slice(0, MOST_SHOWN).map((fault) => (
            <p key={fault}>{fault}</p>
          ))}
          {faults.length > MOST_SHOWN && <p>And {faults.length - MOST_SHOWN} more. Nothing was taken.</p>}
        </ErrorNote>
      )}
    </details>
  );
}
