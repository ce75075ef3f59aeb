import type { ScenarioSummary } from "@restband/api/contract";
import { Icon } from "../../components/icon.tsx";
import { Menu, menuItemClass } from "../../components/menu.tsx";

/** What can be done to a scenario as a whole. */
export interface RowActs {
  readonly copy: (summary: ScenarioSummary) => void;
  readonly save: (summary: ScenarioSummary) => void;
  readonly compare: (summary: ScenarioSummary) => void;
  readonly duplicate: (summary: ScenarioSummary) => void;
  readonly cases: (summary: ScenarioSummary) => void;
  readonly move: (summary: ScenarioSummary) => void;
  readonly archive: (summary: ScenarioSummary) => void;
  readonly restore: (summary: ScenarioSummary) => void;
}

const changing: readonly [keyof RowActs, string][] = [
  ["duplicate", "Duplicate"],
  ["cases", "Table of cases over it"],
  ["move", "Move to another project"],
  ["archive", "Archive"],
];
const archivedOnes: readonly [keyof RowActs, string][] = [
  ["restore", "Restore"],
  ["move", "Move to another project"],
];
const reading: readonly [keyof RowActs, string][] = [
  ["copy", "Copy as JSON"],
  ["save", "Save as a file"],
  ["compare", "Compare with another"],
];

/** The acts a person may do to a scenario, behind one small button. */
export function RowMenu({ summary, acts, canEdit }: { summary: ScenarioSummary; acts: RowActs; canEdit: boolean }) {
  const own = summary.archivedAt ? archivedOnes : changing;
  const title = summary.title || "Untitled";
  return (
    <Menu label={<Icon name="more" />} name={`More for ${title}`} kind="quiet">
      {[...(canEdit ? own : []), ...reading].map(([key, label]) => (
        <button key={key} type="button" className={menuItemClass} onClick={() => acts[key](summary)}>
          {label}
        </button>
      ))}
    </Menu>
  );
}
