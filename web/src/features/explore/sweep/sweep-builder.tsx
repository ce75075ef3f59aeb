import type { Continuation, Scenario, SweepPlan } from "@restband/solver";
import { useMemo, useState } from "react";
import { Button } from "../../../components/button.tsx";
import { QuantityChoice } from "../quantity-choice.tsx";
import { Checkbox } from "../../../components/choices.tsx";
import { SelectField } from "../../../components/select.tsx";
import { formatNumber } from "../../../format/format-number.ts";
import { AskingForm } from "../asking-form.tsx";
import { exploreFields } from "../explore-field.ts";
import { tileSizes } from "../../../compute/run-tiles.ts";
import { AxisForm } from "./axis-form.tsx";
import {
  axisDraftOf,
  canKeepDampingRatio,
  canKeepFrictionRatio,
  planOf,
  secondsOf,
  sweepDraftOf,
  timeMeasure,
  usualSpacing,
  type AxisDraft,
  type SweepDraft,
} from "./sweep-draft.ts";
import { TypedNumber } from "../typed-number.tsx";
import type { AskedSweep } from "./stored-sweep.ts";
import { sweepTitle } from "./sweep-title.ts";

interface SweepBuilderProps {
  scenario: Scenario;
  onRun: (asked: AskedSweep, title: string) => Promise<void>;
}

const continuations: { value: Continuation; label: string }[] = [
  { value: "none", label: "as the scenario starts" },
  { value: "up", label: "where its neighbour ended, upwards" },
  { value: "down", label: "where its neighbour ended, downwards" },
  { value: "both", label: "up, then down: both branches" },
];

/** Asks for a sweep of one or two fields; every fault stands at its field, and nothing typed is lost. */
export function SweepBuilder({ scenario, onRun }: SweepBuilderProps) {
  const [draft, setDraft] = useState<SweepDraft>(() => sweepDraftOf(scenario));
  const fields = useMemo(() => exploreFields(scenario), [scenario]);
  const { plan, faults } = planOf(draft, scenario);
  const seconds = secondsOf(draft, scenario);
  const set = (change: Partial<SweepDraft>): void => setDraft((old) => ({ ...old, ...change }));
  const faultAt = (path: string): string | undefined => faults.find((fault) => fault.path.startsWith(path))?.message;
  const axisProps = (i: number, axis: AxisDraft, put: (axis: AxisDraft) => void) => ({
    axis,
    fields,
    faultAt: (member: string) => faultAt(`axes[${i}].${member}`),
    onChange: put,
    onField: (path: string) => {
      const field = fields.find((each) => each.path === path);
      const spacing = axis.spacing === "listed" ? "listed" : usualSpacing(path);
      if (field) put(axisDraftOf(field, scenario, spacing, Number(axis.count) || 12));
    },
  });
  return (
    <AskingForm
      act="Run the sweep"
      faults={"message" in seconds ? [...faults, { path: "seconds", message: seconds.message }] : faults}
      isPlaced={(path) => /^axes\[[01]\]\.|^continuation$|^seconds$/.test(path)}
      {...(plan && { remark: `${cellsOf(plan)} cells` })}
      onRun={
        plan && "value" in seconds ? () => onRun({ plan, seconds: seconds.value }, sweepTitle(plan, scenario)) : null
      }
    >
      <AxisForm name="Across" {...axisProps(0, draft.first, (first) => set({ first }))} />
      {draft.second ? (
        <div>
          <AxisForm name="Up" {...axisProps(1, draft.second, (second) => set({ second }))} />
          <Button className="mt-3" onClick={() => set({ second: null })}>
            Vary one field only
          </Button>
        </div>
      ) : (
        <Button
          className="self-start"
          onClick={() => {
            const other = fields.find(({ path }) => path !== draft.first.path);
            if (other) set({ second: axisDraftOf(other, scenario, usualSpacing(other.path), 12) });
          }}
        >
          Vary a second field
        </Button>
      )}
      <HowRun draft={draft} scenario={scenario} set={set} fault={faultAt("continuation")} />
      <QuantityChoice
        label="Kept of each cell"
        fixed="stickFraction"
        chosen={draft.quantities}
        onChange={(quantities) => set({ quantities })}
      />
    </AskingForm>
  );
}

interface HowRunProps {
  draft: SweepDraft;
  scenario: Scenario;
  set: (change: Partial<SweepDraft>) => void;
  fault: string | undefined;
}

/** Where each cell starts, how long it runs, and what follows what is varied. */
function HowRun({ draft, scenario, set, fault }: HowRunProps) {
  const seconds = secondsOf(draft, scenario);
  return (
    <div className="flex flex-wrap items-start gap-x-8 gap-y-4">
      <SelectField
        label="Each cell starts"
        choices={continuations}
        value={draft.continuation}
        error={fault}
        onChange={(event) => set({ continuation: event.target.value as Continuation })}
      />
      <TypedNumber
        label="Each run lasts"
        typed={draft.seconds}
        measure={timeMeasure(scenario)}
        error={"message" in seconds ? seconds.message : undefined}
        onChange={(typed) => set({ seconds: typed })}
      />
      <div className="flex flex-col gap-2 desk:pt-8">
        {canKeepFrictionRatio(draft, scenario) && (
          <Checkbox
            label="Keep the ratio of static to kinetic friction"
            checked={draft.keepsFrictionRatio}
            onChange={(event) => set({ keepsFrictionRatio: event.target.checked })}
          />
        )}
        {canKeepDampingRatio(draft, scenario) && (
          <Checkbox
            label="Keep the damping ratio"
            checked={draft.keepsDampingRatio}
            onChange={(event) => set({ keepsDampingRatio: event.target.checked })}
          />
        )}
      </div>
    </div>
  );
}

const cellsOf = (plan: SweepPlan): string =>
  formatNumber(
    tileSizes(plan).reduce((sum, each) => sum + each, 0),
    9,
  );
