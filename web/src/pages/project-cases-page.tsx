import type { ScenarioSummary } from "@restband/api/contract";
import { fieldPaths, type Scenario } from "@restband/solver";
import { useSuspenseQueries, useSuspenseQuery } from "@tanstack/react-query";
import { useMemo } from "react";
import { Navigate, useNavigate, useParams, useSearchParams } from "react-router-dom";
import { projectQuery } from "../api/projects.ts";
import { scenarioQuery, scenariosQuery, useCreateCases } from "../api/scenarios.ts";
import { SelectField } from "../components/select.tsx";
import { announce } from "../components/status.tsx";
import { WorkHeader } from "../features/account/work-header.tsx";
import type { CaseField } from "../features/project-home/cases/case-field.ts";
import { CasesBoard } from "../features/project-home/cases/cases-board.tsx";
import { useKeptText } from "../features/project-home/cases/kept-text.ts";
import { mayEdit } from "../features/project-home/roles.ts";
import { writePath } from "../features/statement/path.ts";
import { fieldAt, measureOf, numberAt } from "../features/statement/scenario-fields.ts";
import { capitalised, sayMany } from "../format/words.ts";
import { paths } from "../paths.ts";

/** A table of cases over one scenario of a project. */
export function ProjectCasesPage() {
  const { projectId = "" } = useParams();
  const [{ data: project }, { data: scenarios }] = useSuspenseQueries({
    queries: [projectQuery(projectId), scenariosQuery(projectId)],
  });
  const [search, setSearch] = useSearchParams();
  const used = scenarios.filter(({ archivedAt }) => archivedAt === null);
  const base = used.find(({ id }) => id === search.get("base")) ?? used.at(0);
  if (!base || !mayEdit(project.role) || project.archivedAt !== null) return <Navigate to={paths.project(projectId)} />;
  return (
    <>
      <title>{`Table of cases · ${project.name} · Restband`}</title>
      <WorkHeader trail={[{ label: project.name, to: paths.project(projectId) }]} title="Table of cases" />
      <main id="content" tabIndex={-1} className="page-width grow py-8 desk:py-9">
        <h1 className="text-24 font-semibold desk:text-34">A row per case, a column per number.</h1>
        <p className="mt-3 mb-8 max-w-(--measure) text-18 text-quiet">
          Every row is the base scenario with the numbers of the row in place. Each is computed here; all become
          scenarios at once, or none.
        </p>
        <SelectField
          label="Base scenario"
          className="mb-6 max-w-[480px]"
          choices={used.map(({ id, title }) => ({ value: id, label: title || "Untitled" }))}
          value={base.id}
          onChange={(event) => setSearch({ base: event.target.value }, { replace: true })}
        />
        <Board projectId={projectId} base={base} />
      </main>
    </>
  );
}

function Board({ projectId, base }: { projectId: string; base: ScenarioSummary }) {
  const { data: stored } = useSuspenseQuery(scenarioQuery(projectId, base.id));
  const [text, setText] = useKeptText(`restband-cases-${projectId}`);
  const fields = useMemo(() => fieldsOf(stored.content), [stored.content]);
  const create = useCreateCases(projectId);
  const navigate = useNavigate();
  const save = async (scenarios: Scenario[]) => {
    await create.mutateAsync(scenarios);
    setText("");
    announce(`${capitalised(sayMany(scenarios.length, "scenario"))} made.`);
    await navigate(paths.project(projectId));
  };
  return <CasesBoard {...{ fields, text, save }} base={stored.content} write={writePath} onText={setText} />;
}

/** Every number of a scenario that a column may be for. */
function fieldsOf(scenario: Scenario): CaseField[] {
  return fieldPaths(scenario).flatMap((path) => {
    const field = fieldAt(scenario, path);
    const value = numberAt(scenario, path);
    if (!field || value === undefined) return [];
    return [{ path, label: field.label, symbol: field.symbol, measure: measureOf(scenario, field), value }];
  });
}
