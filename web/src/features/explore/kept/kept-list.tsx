import type { ExplorationSummary } from "@restband/api/contract";
import { Link } from "react-router-dom";
import { Button } from "../../../components/button.tsx";
import { DataTable, type Column } from "../../../components/data-table.tsx";
import { sayWhen } from "../../../format/when.ts";

interface KeptListProps {
  explorations: readonly ExplorationSummary[];
  addressOf: (id: string) => string;
  /** Absent where the person may only read. */
  onDelete?: (exploration: ExplorationSummary) => void;
}

const kinds: Record<ExplorationSummary["kind"], string> = {
  search: "search",
  sweep: "sweep",
  study: "tolerance study",
};

/** What was asked of the scenario before, by whom, and what it came to. */
export function KeptList({ explorations, addressOf, onDelete }: KeptListProps) {
  if (explorations.length === 0)
    return (
      <p className="text-18 text-quiet">
        Nothing yet. Searches, sweeps and studies stand here for everybody in the project.
      </p>
    );
  const columns: Column<ExplorationSummary>[] = [
    {
      key: "asked",
      head: "asked",
      cell: ({ id, title, kind, headline }) => (
        <div className="max-w-[560px] min-w-64 whitespace-normal">
          <Link to={addressOf(id)}>{title}</Link>
          <span className="block text-13 text-quiet">
            {kinds[kind]}
            {headline && ` · ${headline}`}
          </span>
        </div>
      ),
    },
    {
      key: "state",
      head: "state",
      cell: (each) => <span className="block min-w-28 whitespace-normal">{stateWords(each)}</span>,
    },
    {
      key: "by",
      head: "by",
      cell: ({ createdBy, createdAt }) => (
        <>
          {createdBy.name}
          <span className="block text-13 text-quiet">{sayWhen(new Date(createdAt))}</span>
        </>
      ),
    },
    ...(onDelete
      ? [
          {
            key: "act",
            head: <span className="sr-only">act</span>,
            cell: (each: ExplorationSummary) => <Button onClick={() => onDelete(each)}>Delete</Button>,
          },
        ]
      : []),
  ];
  return (
    <DataTable caption="Searches, sweeps and studies" rows={explorations} keyOf={({ id }) => id} columns={columns} />
  );
}

function stateWords({ state, tiles, tilesSaved, isStale, scenarioVersion }: ExplorationSummary): string {
  const share = tiles > 0 ? Math.floor((100 * tilesSaved) / tiles) : 100;
  const words = state === "done" ? "done" : state === "running" ? `running, ${share} % saved` : `stopped at ${share} %`;
  return isStale ? `${words}; of version ${scenarioVersion}, the scenario has other numbers by now` : words;
}
