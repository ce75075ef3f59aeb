import { cellOf, cellReason, readField, type Scenario, type SweepPlan } from "@restband/solver";
import { useMemo, type ReactNode } from "react";
import { Button } from "../../../components/button.tsx";
import { samplesFor } from "../../../compute/samples-for.ts";
import { useRun, type Computed } from "../../../compute/use-run.ts";
import { say } from "../../../format/format-quantity.ts";
import type { ExploreFrame } from "../explore-frame.ts";
import { exploreField } from "../explore-field.ts";
import { CellTraces } from "./cell-traces.tsx";
import type { SweepCells } from "./sweep-cells.ts";

/** The button that opens the cell: Enter in the map presses it. */
export const openCellId = "open-cell";

interface SelectedCellProps extends ExploreFrame {
  plan: SweepPlan;
  cells: SweepCells;
  /** Number of the cell in the sweep. */
  cell: number;
  /** The answer of a run, in a sentence and its strip. */
  answer: (computed: Computed) => ReactNode;
  /** Where the cell is laid beside the scenario it comes from. */
  compare?: (cell: Scenario) => ReactNode;
}

/** One cell, run again here: what its values are, what the body does, how it moves, and the way to a scenario of it. */
export function SelectedCell({ scenario, plan, cells, cell, answer, open, compare }: SelectedCellProps) {
  const { scenario: own, faults } = useMemo(() => cellOf(scenario, plan, cell), [scenario, plan, cell]);
  const options = useMemo(() => ({ samples: own ? samplesFor(own) : 0 }), [own]);
  const { computed, isStale } = useRun(own, options);
  const figures = cells.read(cell);
  const values = own ? plan.axes.map(({ path }) => valueWords(scenario, own, path)).join(", ") : "";
  const isShown = computed !== null && !isStale;
  return (
    <section
      aria-label="Selected cell"
      className="rounded border border-line bg-raised p-4 desk:p-5"
      aria-busy={!isShown && own !== null}
    >
      <p className="text-13 text-quiet">Selected: {values}</p>
      {faults.length > 0 && <p className="mt-2 text-18">Refused: {faults[0].message}</p>}
      {figures?.refusal && own && <p className="mt-2">{cellReason(scenario, plan, cell, figures.refusal)}</p>}
      {own && (
        <div className={isShown ? "" : "stale"}>
          {computed ? (
            <div className="mt-2">{answer(computed)}</div>
          ) : (
            <p className="late mt-2 text-quiet">Running the cell</p>
          )}
          {computed && "result" in computed && <CellTraces scenario={computed.scenario} result={computed.result} />}
        </div>
      )}
      {own && (open || compare) && (
        <div className="mt-4 flex flex-wrap gap-3">
          {open && (
            <Button id={openCellId} kind="primary" onClick={() => open(own, values)}>
              Open as scenario
            </Button>
          )}
          {compare?.(own)}
        </div>
      )}
    </section>
  );
}

function valueWords(scenario: Scenario, cell: Scenario, path: string): string {
  const field = exploreField(scenario, path);
  return field ? `${field.name} ${say(readField(cell, path), field.measure, { digits: 4 })}` : path;
}
