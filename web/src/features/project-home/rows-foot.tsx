import type { ScenarioSummary } from "@restband/api/contract";
import { useEffect, useRef, useState } from "react";
import { ProgressLine } from "../../components/progress-line.tsx";
import { announce } from "../../components/status.tsx";
import type { Glances } from "./glances/use-glances.ts";
import { fileNameOf, saveFile } from "../../components/save-file.ts";

interface RowsFootProps {
  projectName: string;
  rows: readonly ScenarioSummary[];
  glances: Glances;
  /** Told while all rows are to be computed. */
  onNeed: (isNeeded: boolean) => void;
}

/** The results of the rows shown as a file; those not computed yet are computed first. */
export function RowsFoot({ projectName, rows, glances, onNeed }: RowsFootProps) {
  const [wanted, setWanted] = useState<readonly ScenarioSummary[] | null>(null);
  const done = wanted?.filter(({ digest }) => glances.of(digest)).length ?? 0;
  const isReady = wanted !== null && done === wanted.length;
  const want = (next: typeof wanted) => {
    setWanted(next);
    onNeed(next !== null);
  };
  const save = useRef<() => Promise<void>>(null);
  useEffect(() => {
    save.current = async () => {
      const { resultsCsv } = await import("./results-csv.ts");
      const csv = resultsCsv(
        [],
        (wanted ?? []).map(({ title, digest }) => ({ title, inputs: [], glance: glances.of(digest) })),
      );
      const name = fileNameOf(`${projectName} results`, "csv");
      saveFile(name, "text/csv", csv);
      announce(`${name} is saved.`);
    };
  });
  useEffect(() => {
    if (!isReady) return;
    void save.current?.();
    setWanted(null);
    onNeed(false);
    // Once for each time that all are there.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [isReady]);
  return (
    <div className="mt-4 flex min-h-10 flex-wrap items-center gap-4 text-13">
      {wanted === null ? (
        <button type="button" className="link" onClick={() => want(rows)}>
          Results as CSV
        </button>
      ) : (
        <ProgressLine
          label="Computing the rows"
          fraction={done / Math.max(1, wanted.length)}
          remark={`${done} of ${wanted.length} scenarios`}
          onCancel={() => want(null)}
        />
      )}
    </div>
  );
}
