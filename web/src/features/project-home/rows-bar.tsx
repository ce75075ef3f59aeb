import type { ScenarioSummary } from "@restband/api/contract";
import { PlainSelect, type Choice } from "../../components/select.tsx";
import { controlClass } from "../../components/field.tsx";
import { classNames } from "../../components/class-names.ts";
import { outcomeWords } from "../../format/outcomes.ts";
import { isNarrowed, type Order, type View } from "./view.ts";
import type { Standing } from "./headline.ts";

interface RowsBarProps {
  scenarios: readonly ScenarioSummary[];
  ownId: string;
  view: View;
  onChange: (change: Partial<View>) => void;
}

const orderChoices: Choice<Order>[] = [
  { value: "touched", label: "last touched first" },
  { value: "title", label: "by title" },
  { value: "outcome", label: "by outcome" },
  { value: "broken", label: "broken limits first" },
];

const outcomeChoices: Choice[] = [
  { value: "", label: "any outcome" },
  ...Object.entries(outcomeWords).map(([value, label]) => ({ value, label })),
  { value: "none", label: "no answer" },
];

const limitChoices: Choice<Standing | "">[] = [
  { value: "", label: "limits or none" },
  { value: "broken", label: "limits broken" },
  { value: "kept", label: "limits kept" },
  { value: "unjudged", label: "limits not judged" },
  { value: "no-limits", label: "no limits set" },
];

/** The head of the list: search, order, what is shown, and the way to what is archived. */
export function RowsBar({ scenarios, ownId, view, onChange }: RowsBarProps) {
  const archivedCount = scenarios.filter(({ archivedAt }) => archivedAt !== null).length;
  const set = (key: keyof View) => (event: { target: { value: string } }) => onChange({ [key]: event.target.value });
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-2 border-b border-edge pb-2 text-13">
      <h2 id="scenarios" className="font-bold">
        {view.isArchived ? "Archived scenarios" : "Scenarios"}
      </h2>
      <input
        type="search"
        aria-label="Search by title"
        placeholder="Search by title"
        value={view.search}
        onChange={set("search")}
        className={classNames(controlClass, "h-8! w-44! text-13!")}
      />
      <PlainSelect isQuiet aria-label="Order" choices={orderChoices} value={view.order} onChange={set("order")} />
      <PlainSelect
        isQuiet
        aria-label="Outcome"
        choices={outcomeChoices}
        value={view.outcome}
        onChange={set("outcome")}
      />
      <PlainSelect isQuiet aria-label="Limits" choices={limitChoices} value={view.limits} onChange={set("limits")} />
      <PlainSelect
        isQuiet
        aria-label="Last saved by"
        choices={authorChoices(scenarios, ownId)}
        value={view.author}
        onChange={set("author")}
      />
      {isNarrowed(view) && (
        <button
          type="button"
          className="link"
          onClick={() => onChange({ search: "", outcome: "", limits: "", author: "" })}
        >
          show all
        </button>
      )}
      {(archivedCount > 0 || view.isArchived) && (
        <button type="button" className="link ml-auto" onClick={() => onChange({ isArchived: !view.isArchived })}>
          {view.isArchived ? "back to those in use" : `${archivedCount} archived`}
        </button>
      )}
    </div>
  );
}

function authorChoices(scenarios: readonly ScenarioSummary[], ownId: string): Choice[] {
  const names = new Map(scenarios.map(({ updatedBy }) => [updatedBy.accountId, updatedBy.name]));
  const people = [...names].map(([value, name]) => ({ value, label: value === ownId ? "you" : name }));
  return [{ value: "", label: "anybody's" }, ...people.sort((a, b) => a.label.localeCompare(b.label))];
}
