import { useQuery } from "@tanstack/react-query";
import type { TrailFilter } from "../../api/activity.ts";
import { membersQuery } from "../../api/members.ts";
import { scenariosQuery } from "../../api/scenarios.ts";
import { SelectField } from "../../components/select.tsx";
import { TextField } from "../../components/text-field.tsx";
import { dayOf, fromDay, toDay } from "./trail-days.ts";

interface TrailFilterFieldsProps {
  projectId: string;
  filter: TrailFilter;
  onChange: (filter: TrailFilter) => void;
}

const kinds = [
  { value: "", label: "everything" },
  { value: "scenario", label: "scenarios" },
  { value: "revision", label: "revisions" },
  { value: "review", label: "asking for review" },
  { value: "comment", label: "comments" },
  { value: "exploration", label: "sweeps and searches" },
  { value: "cases", label: "tables of cases" },
  { value: "member", label: "people" },
  { value: "project", label: "the project" },
  { value: "checklist", label: "the checklist" },
];

/** What of the trail is shown: by what it is about, by person, scenario and days. */
export function TrailFilterFields({ projectId, filter, onChange }: TrailFilterFieldsProps) {
  const { data: members } = useQuery(membersQuery(projectId));
  const { data: scenarios } = useQuery(scenariosQuery(projectId));
  const set = (key: keyof TrailFilter, value: string | undefined): void => {
    const { [key]: _old, ...rest } = filter;
    onChange(value ? { ...rest, [key]: value } : rest);
  };
  return (
    <div className="mb-3 grid gap-x-4 gap-y-3 desk:grid-cols-3">
      <SelectField
        label="About"
        choices={kinds}
        value={filter.about ?? ""}
        onChange={(event) => set("about", event.target.value)}
      />
      <SelectField
        label="By"
        choices={[everybody, ...(members ?? []).map(({ accountId, name }) => ({ value: accountId, label: name }))]}
        value={filter.by ?? ""}
        onChange={(event) => set("by", event.target.value)}
      />
      <SelectField
        label="Scenario"
        choices={[all, ...(scenarios ?? []).map(({ id, title }) => ({ value: id, label: title || "Untitled" }))]}
        value={filter.scenarioId ?? ""}
        onChange={(event) => set("scenarioId", event.target.value)}
      />
      <TextField
        label="From"
        type="date"
        value={dayOf(filter.from)}
        onChange={(event) => set("from", fromDay(event.target.value))}
      />
      <TextField
        label="To"
        type="date"
        value={dayOf(filter.to, -1)}
        onChange={(event) => set("to", toDay(event.target.value))}
      />
    </div>
  );
}

const everybody = { value: "", label: "everybody" };
const all = { value: "", label: "all" };
