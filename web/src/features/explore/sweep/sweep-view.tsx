import type { StoredExploration } from "@restband/api/contract";
import { cellCount, type Scenario } from "@restband/solver";
import { useMemo, useState, type ReactNode } from "react";
import { Button } from "../../../components/button.tsx";
import { fileNameOf, saveFile } from "../../../components/save-file.ts";
import type { Computed } from "../../../compute/use-run.ts";
import { useUnitSystem } from "../../../format/unit-system.ts";
import { TileProgress } from "../kept/tile-progress.tsx";
import { tileRunOf } from "../kept/tile-run.ts";
import { useTileRun } from "../kept/use-tile-run.ts";
import { storedSweep, sweepWork } from "./stored-sweep.ts";
import { sweepHeadline } from "./sweep-headline.ts";
import { axisScale } from "./axis-scale.ts";
import { MapChoice } from "./map-choice.tsx";
import { MapLegend } from "./map-legend.tsx";
import { MapNotes } from "./map-notes.tsx";
import { openCellId, SelectedCell } from "./selected-cell.tsx";
import { useShown } from "./shown.ts";
import { SolveElsewhere } from "./solve-elsewhere.tsx";
import { sweepCsv } from "./sweep-csv.ts";
import { SweepHead } from "./sweep-head.tsx";
import { SweepMap } from "./sweep-map.tsx";
import { SweepTable } from "./sweep-table.tsx";
import { LineFamily } from "./line-family.tsx";
import { useLimitLines } from "./use-limit-lines.ts";

interface SweepViewProps {
  projectId: string;
  stored: StoredExploration;
  canEdit: boolean;
  answer: (computed: Computed) => ReactNode;
  compare?: (cell: Scenario) => ReactNode;
  open?: (scenario: Scenario, title: string) => Promise<void>;
}

/** A sweep: what it says, its map as it fills, the selected cell, and everything as a table. */
export function SweepView({ projectId, stored, canEdit, answer, open, compare }: SweepViewProps) {
  useUnitSystem();
  const { plan, scenario } = useMemo(() => storedSweep(stored), [stored]);
  const run = tileRunOf(projectId, stored, () => sweepWork(plan, scenario));
  const { isComplete } = run;
  const conclusion = useMemo(
    () => (isComplete ? { headline: sweepHeadline(run.store), answer: {} } : null),
    [run, isComplete],
  );
  useTileRun(run, { projectId, stored, canEdit, conclusion });
  const cells = run.store;
  const edition = run.editionNow();
  const [across, up] = useMemo(() => {
    const [first, second] = plan.axes;
    return [axisScale(first, scenario, 9), second ? axisScale(second, scenario, 14) : null];
  }, [plan, scenario]);
  const isBoth = plan.continuation === "both";
  const [isDown, setDown] = useState(false);
  const first = isBoth && isDown ? cellCount(plan) / 2 : 0;
  const [selected, setSelected] = useState(
    () => Math.floor(across.count / 3) + across.count * Math.floor((up?.count ?? 1) / 2),
  );
  const [isTable, setTable] = useState(false);
  const { choice, shown, choose, setLog } = useShown(cells, edition);
  const lines = useLimitLines(run, scenario, plan, shown);
  const selectedCell = first + selected;
  return (
    <>
      <SweepHead stored={stored} scenario={scenario} cells={cells} lines={lines.outcomes.lines} edition={edition} />
      <div className="grid gap-x-12 gap-y-8 border-t border-line pt-6 wide:grid-cols-[minmax(0,1fr)_388px]">
        <div className="min-w-0">
          <TileProgress run={run} stored={stored} canEdit={canEdit} noun="cells" />
          <div className="my-4 flex flex-wrap items-center gap-3">
            <MapChoice
              plan={plan}
              scenario={scenario}
              choice={choice}
              onChoose={choose}
              shown={shown}
              onLog={setLog}
              isBoth={isBoth}
              isDown={isDown}
              onBranch={setDown}
            />
            <Button onClick={() => setTable(!isTable)} aria-pressed={isTable}>
              {isTable ? "As a map" : "As a table"}
            </Button>
            <Button onClick={() => saveFile(fileNameOf(stored.title, "csv"), "text/csv", sweepCsv(cells, scenario))}>
              Save as CSV
            </Button>
          </div>
          {isTable ? (
            <SweepTable
              cells={cells}
              scenario={scenario}
              scales={up ? [across, up] : [across]}
              selected={selectedCell}
              onSelect={(cell) => {
                setDown(isBoth && cell >= cellCount(plan) / 2);
                setSelected(isBoth ? cell % (cellCount(plan) / 2) : cell);
              }}
            />
          ) : (
            <>
              <SweepMap
                {...{ cells, scenario, across, up, first, shown, selected, edition }}
                lines={lines.shown.lines}
                onSelect={setSelected}
                onOpen={open && (() => document.getElementById(openCellId)?.click())}
              />
              <MapLegend shown={shown} cells={cells} quantity={choice} scenario={scenario} edition={edition} />
              <MapNotes found={lines.shown} shown={shown} plan={plan} scenario={scenario} />
              {shown.kind === "quantity" && (
                <div className="mt-6">
                  <LineFamily cells={cells} scenario={scenario} across={across} up={up} place={shown.place} />
                </div>
              )}
              <SolveElsewhere
                scenario={scenario}
                plan={plan}
                title={stored.title}
                {...(canEdit && !run.isComplete && { onTiles: (tiles) => run.bringIn(tiles) })}
              />
            </>
          )}
        </div>
        <div className="min-w-0">
          <SelectedCell {...{ scenario, plan, cells, answer, open, compare }} cell={selectedCell} />
          <p className="mt-2 text-13 text-quiet">Arrow keys move the selection in the map. Enter opens it.</p>
        </div>
      </div>
    </>
  );
}
