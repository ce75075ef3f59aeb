import type { Scenario, TolerancePlan } from "@restband/solver";
import { useMemo, useState } from "react";
import { Button } from "../../../components/button.tsx";
import { ErrorNote } from "../../../components/error-note.tsx";
import { FieldError } from "../../../components/field.tsx";
import { SelectField } from "../../../components/select.tsx";
import { TextField } from "../../../components/text-field.tsx";
import { exploreFields } from "../explore-field.ts";
import { QuantityChoice } from "../quantity-choice.tsx";
import { InputForm } from "./input-form.tsx";
import { inputDraftOf, studyDraftOf, studyPlanOf, type InputDraft, type StudyDraft } from "./study-draft.ts";
import { studyTitle } from "./study-title.ts";

interface StudyBuilderProps {
  scenario: Scenario;
  onRun: (plan: TolerancePlan, title: string) => Promise<void>;
}

/** Asks for a tolerance study; every fault stands at its field, and nothing typed is lost. */
export function StudyBuilder({ scenario, onRun }: StudyBuilderProps) {
  const [draft, setDraft] = useState<StudyDraft>(() => studyDraftOf(scenario));
  const [run, setRun] = useState<{ isTried: boolean; isBusy: boolean; failure: string | null }>({
    isTried: false,
    isBusy: false,
    failure: null,
  });
  const { plan, faults } = studyPlanOf(draft, scenario);
  const set = (change: Partial<StudyDraft>): void => setDraft((old) => ({ ...old, ...change }));
  const faultAt = (path: string): string | undefined => faults.find((fault) => fault.path.startsWith(path))?.message;
  const general = faults.filter(({ path }) => !/^(inputs\[|runs|seed|correlations)/.test(path));

  const begin = async (): Promise<void> => {
    if (!plan || run.isBusy) return setRun((old) => ({ ...old, isTried: true }));
    setRun({ isTried: true, isBusy: true, failure: null });
    try {
      await onRun(plan, studyTitle(plan, scenario));
      setRun({ isTried: true, isBusy: false, failure: null });
    } catch (error) {
      setRun({ isTried: true, isBusy: false, failure: error instanceof Error ? error.message : String(error) });
    }
  };
  return (
    <form
      className="flex flex-col gap-6"
      onSubmit={(event) => {
        event.preventDefault();
        void begin();
      }}
    >
      <Inputs scenario={scenario} inputs={draft.inputs} faultAt={faultAt} onChange={(inputs) => set({ inputs })} />
      <div className="flex flex-wrap items-start gap-x-4 gap-y-4">
        <TextField
          label="Draws"
          className="w-28"
          isFigure
          inputMode="numeric"
          value={draft.runs}
          error={faultAt("runs")}
          onChange={(event) => set({ runs: event.target.value })}
        />
        <SelectField
          label="drawn as"
          choices={[
            { value: "latin-hypercube", label: "a Latin hypercube" },
            { value: "random", label: "plain random numbers" },
          ]}
          value={draft.sampling}
          onChange={(event) => set({ sampling: event.target.value as StudyDraft["sampling"] })}
        />
        <TextField
          label="Seed"
          className="w-24"
          isFigure
          inputMode="numeric"
          value={draft.seed}
          error={faultAt("seed")}
          onChange={(event) => set({ seed: event.target.value })}
        />
        {draft.inputs.length > 1 && (
          <TextField
            label="Rank correlation of the first two"
            className="w-64"
            isFigure
            help="Between −1 and 1; empty for none."
            value={draft.correlation}
            error={faultAt("correlations")}
            onChange={(event) => set({ correlation: event.target.value })}
          />
        )}
      </div>
      <QuantityChoice
        label="Described besides those of limits"
        chosen={draft.quantities}
        onChange={(quantities) => set({ quantities })}
      />
      {run.isTried && general.map(({ message }) => <FieldError key={message}>{message}</FieldError>)}
      {run.failure && <ErrorNote>{run.failure}</ErrorNote>}
      <div className="flex flex-wrap items-center gap-4">
        <Button type="submit" kind="primary" isBusy={run.isBusy}>
          Run the study
        </Button>
        {!plan && (
          <span className="text-13 text-quiet">
            {faults.length} field{faults.length === 1 ? "" : "s"} to put right
          </span>
        )}
      </div>
    </form>
  );
}

interface InputsProps {
  scenario: Scenario;
  inputs: readonly InputDraft[];
  faultAt: (path: string) => string | undefined;
  onChange: (inputs: InputDraft[]) => void;
}

function Inputs({ scenario, inputs, faultAt, onChange }: InputsProps) {
  const fields = useMemo(() => exploreFields(scenario), [scenario]);
  const put = (i: number, input: InputDraft): void => onChange(inputs.map((each, k) => (k === i ? input : each)));
  const fieldOf = (path: string) => fields.find((field) => field.path === path) ?? fields[0];
  const free = fields.find(({ path }) => inputs.every((input) => input.path !== path));
  return (
    <>
      {inputs.map((input, i) => (
        <InputForm
          key={input.path}
          input={input}
          fields={fields}
          faultAt={(member) => faultAt(`inputs[${i}].${member}`)}
          onField={(path) => put(i, inputDraftOf(fieldOf(path), scenario, input.kind))}
          onKind={(kind) => put(i, inputDraftOf(fieldOf(input.path), scenario, kind))}
          onChange={(next) => put(i, next)}
          {...(inputs.length > 1 && { onRemove: () => onChange(inputs.filter((_, k) => k !== i)) })}
        />
      ))}
      {free && (
        <Button className="self-start" onClick={() => onChange([...inputs, inputDraftOf(free, scenario, "uniform")])}>
          Let another value scatter
        </Button>
      )}
    </>
  );
}
