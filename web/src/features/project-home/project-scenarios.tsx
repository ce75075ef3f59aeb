import type { Project, ScenarioSummary } from "@restband/api/contract";
import { useEffect, useMemo, useRef, useState, type ReactNode } from "react";
import { ProgressLine } from "../../components/progress-line.tsx";
import { arrange, candidatesOf, knownOf } from "./arrange.ts";
import type { Glance } from "./glances/glance-book.ts";
import type { Glances } from "./glances/use-glances.ts";
import { MoveDialog } from "./move-dialog.tsx";
import { RowMenu } from "./row-menu.tsx";
import { RowsBar } from "./rows-bar.tsx";
import { RowsFoot } from "./rows-foot.tsx";
import { ScenarioRows } from "./scenario-rows.tsx";
import { useRowActs } from "./use-row-acts.ts";
import { needsAnswers, useView, type View } from "./view.ts";

interface ProjectScenariosProps {
  project: Project;
  scenarios: readonly ScenarioSummary[];
  glances: Glances;
  ownId: string;
  canEdit: boolean;
  /** A row with its answer, as far as it is there. */
  row: (summary: ScenarioSummary, glance: Glance | undefined, menu: ReactNode) => ReactNode;
  /** Said where the project has no scenario in use. */
  empty: ReactNode;
}

/** Up to here every answer is computed unasked; of more, those that come into sight or decide what is shown. */
const ALL_UP_TO = 200;

/** The scenarios of a project as its home shows them: searched, narrowed, in order, each with its answer. */
export function ProjectScenarios({ project, scenarios, glances, ownId, canEdit, row, empty }: ProjectScenariosProps) {
  const [view, change] = useView();
  const [moving, setMoving] = useState<ScenarioSummary | null>(null);
  const { rowActs, move } = useRowActs(project.id, () => scenarios.map(({ title }) => title), setMoving);
  const [areAllNeeded, setAllNeeded] = useState(false);
  const { candidates, rows, waiting, noteSeen } = useArranged(scenarios, view, glances, areAllNeeded);
  if (scenarios.length === 0) return empty;
  return (
    <section aria-labelledby="scenarios">
      <RowsBar scenarios={scenarios} ownId={ownId} view={view} onChange={change} />
      {waiting > 0 && (
        <div className="border-b border-line py-2">
          <ProgressLine
            label="Computing the answers that decide"
            fraction={1 - waiting / candidates.length}
            remark={`${candidates.length - waiting} of ${candidates.length} answers`}
            onCancel={() => change({ order: "touched", outcome: "", limits: "" })}
          />
        </div>
      )}
      {candidates.length === 0 && !view.isArchived && scenarios.every(({ archivedAt }) => archivedAt) && empty}
      {rows.length === 0 &&
        waiting === 0 &&
        scenarios.some(({ archivedAt }) => (archivedAt !== null) === view.isArchived) && (
          <p className="py-6 text-18 text-quiet">No scenario fits what is asked for.</p>
        )}
      {view.isArchived && !scenarios.some(({ archivedAt }) => archivedAt !== null) && (
        <p className="py-6 text-18 text-quiet">Nothing is archived any more.</p>
      )}
      <ScenarioRows
        rows={rows}
        onSeen={noteSeen}
        row={(summary) =>
          row(summary, glances.of(summary.digest), <RowMenu summary={summary} acts={rowActs} canEdit={canEdit} />)
        }
      />
      {rows.length > 0 && <RowsFoot projectName={project.name} rows={rows} glances={glances} onNeed={setAllNeeded} />}
      <MoveDialog projectId={project.id} summary={moving} onMove={move} onClose={() => setMoving(null)} />
    </section>
  );
}

/** The rows of a view, and the asking for what they need: first what is in sight, then what decides. */
function useArranged(scenarios: readonly ScenarioSummary[], view: View, glances: Glances, areAllNeeded: boolean) {
  const { edition, of, want } = glances;
  const candidates = useMemo(() => candidatesOf(scenarios, view), [scenarios, view]);
  const arranged = useMemo(
    () => arrange(candidates, view, (digest) => knownOf(of(digest))),
    // The edition stands for what `of` gives.
    // eslint-disable-next-line react-hooks/exhaustive-deps
    [candidates, view, of, edition],
  );
  const seen = useRef<readonly ScenarioSummary[]>([]);
  const others = scenarios.length <= ALL_UP_TO || needsAnswers(view) || areAllNeeded ? candidates : [];
  const ask = (): void => want([...seen.current, ...others]);
  useEffect(() => {
    ask();
    // Asked anew when the list changes; what is in sight tells itself.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [candidates, others.length]);
  const noteSeen = (rows: readonly ScenarioSummary[]): void => {
    seen.current = rows;
    ask();
  };
  return { candidates, ...arranged, noteSeen };
}
