import type { Scenario, TolerancePlan } from "@restband/solver";
import { useMemo, useState } from "react";
import { Button } from "../../../components/button.tsx";
import { Checkbox } from "../../../components/choices.tsx";
import { SelectField } from "../../../components/select.tsx";
import { AskingForm } from "../asking-form.tsx";
import { exploreFields, type ExploreField } from "../explore-field.ts";
import { FigureField } from "../figure-field.tsx";
import { QuantityChoice } from "../quantity-choice.tsx";
import { freePairs } from "./correlation-draft.ts";
import { CorrelationsForm } from "./correlations-form.tsx";
import { InputForm } from "./input-form.tsx";
import { jointDraftOf } from "./joint-draft.ts";
import { JointForm } from "./joint-form.tsx";
import {
  canKeepFrictionRatio,
  inputDraftOf,
  scatteredPaths,
  studyDraftOf,
  studyPlanOf,
  withInputs,
  type InputDraft,
  type StudyDraft,
} from "./study-draft.ts";
import { studyTitle } from "./study-title.ts";

interface StudyBuilderProps {
  scenario: Scenario;
  onRun: (plan: TolerancePlan, title: string) => Promise<void>;
}

/** Asks for a tolerance study; every fault stands at its field, and nothing typed is lost. */
export function StudyBuilder({ scenario, onRun }: StudyBuilderProps) {
  const [draft, setDraft] = useState<StudyDraft>(() => studyDraftOf(scenario));
  const { plan, faults } = studyPlanOf(draft, scenario);
  const set = (change: Partial<StudyDraft>): void => setDraft((old) => ({ ...old, ...change }));
  const faultAt = (path: string): string | undefined => faults.find((fault) => fault.path === path)?.message;
  return (
    <AskingForm
      act="Run the study"
      faults={faults}
      isPlaced={(path) => placed.test(path)}
      onRun={plan && (() => onRun(plan, studyTitle(plan, scenario)))}
    >
      <WhatScatters draft={draft} scenario={scenario} faultAt={faultAt} setDraft={setDraft} />
      <div className="flex flex-wrap items-start gap-x-4 gap-y-4">
        <FigureField
          label="Draws"
          className="w-28"
          isWhole
          value={draft.runs}
          error={faultAt("runs")}
          onChange={(runs) => set({ runs })}
        />
        <SelectField
          label="drawn as"
          choices={samplings}
          value={draft.sampling}
          onChange={(event) => set({ sampling: event.target.value as StudyDraft["sampling"] })}
        />
        <FigureField
          label="Seed"
          isWhole
          value={draft.seed}
          error={faultAt("seed")}
          onChange={(seed) => set({ seed })}
        />
        {canKeepFrictionRatio(draft, scenario) && (
          <div className="desk:pt-8">
            <Checkbox
              label="Keep the ratio of static to kinetic friction"
              checked={draft.keepsFrictionRatio}
              onChange={(event) => set({ keepsFrictionRatio: event.target.checked })}
            />
          </div>
        )}
      </div>
      <QuantityChoice
        label="Described besides those of limits"
        chosen={draft.quantities}
        onChange={(quantities) => set({ quantities })}
      />
    </AskingForm>
  );
}

/** Faults that stand at a field of theirs. */
const placed =
  /^(inputs\[\d+\]\.(path|distribution\.\w+)|runs|seed|correlations(\[\d+\]\.(first|second|value))?|joint\[\d+\]\.(paths\[\d+\]|means\[\d+\]|covariance(\[\d+\]\[\d+\])?|source))$/;

const samplings = [
  { value: "latin-hypercube", label: "a Latin hypercube" },
  { value: "random", label: "plain random numbers" },
];

interface WhatScattersProps {
  draft: StudyDraft;
  scenario: Scenario;
  faultAt: (path: string) => string | undefined;
  setDraft: (change: (old: StudyDraft) => StudyDraft) => void;
}

/** The values that scatter one by one, how two of them go together, and those that scatter by a covariance. */
function WhatScatters({ draft, scenario, faultAt, setDraft }: WhatScattersProps) {
  const fields = useMemo(() => exploreFields(scenario), [scenario]);
  const { inputs, correlations, joint } = draft;
  const set = (change: Partial<StudyDraft>): void => setDraft((old) => ({ ...old, ...change }));
  const scattered = scatteredPaths(draft);
  const free = likelyFirst(fields.filter(({ path }) => !scattered.includes(path)));
  const pairs = freePairs(inputs, correlations);
  return (
    <>
      <Inputs
        scenario={scenario}
        fields={fields}
        inputs={inputs}
        isLast={scattered.length === 1}
        faultAt={faultAt}
        onChange={(next) => setDraft((old) => withInputs(old, next))}
      />
      {inputs.length > 1 && (
        <CorrelationsForm
          correlations={correlations}
          inputs={inputs.flatMap(({ path }) => fields.find((field) => field.path === path) ?? [])}
          faultAt={(member) => faultAt(`correlations${member}`)}
          onChange={(next) => set({ correlations: next })}
        />
      )}
      {joint.map((each, i) => (
        <JointForm
          key={i}
          draft={each}
          fields={fields}
          free={free}
          faultAt={(member) => faultAt(`joint[${i}].${member}`)}
          onChange={(next) => set({ joint: joint.map((other, k) => (k === i ? next : other)) })}
          onRemove={() => set({ joint: joint.filter((_, k) => k !== i) })}
        />
      ))}
      <div className="flex flex-wrap gap-3">
        {free.length > 0 && (
          <Button onClick={() => set({ inputs: [...inputs, inputDraftOf(free[0], scenario, "uniform")] })}>
            Let another value scatter
          </Button>
        )}
        {pairs.length > 0 && (
          <Button onClick={() => set({ correlations: [...correlations, { ...pairs[0], text: "0.5" }] })}>
            Let two of them go together
          </Button>
        )}
        {free.length > 1 && (
          <Button onClick={() => set({ joint: [...joint, jointDraftOf(free.slice(0, 2))] })}>
            Let values scatter by a covariance
          </Button>
        )}
      </div>
    </>
  );
}

/** What is something before what is nothing, the machine before how it starts and how long it is looked at. */
const likelyFirst = (fields: readonly ExploreField[]): ExploreField[] =>
  [...fields].sort((a, b) => Number(isLikely(b)) - Number(isLikely(a)));

const isLikely = ({ path, value }: ExploreField): boolean => value !== 0 && !/^(initial|span)\./.test(path);

interface InputsProps {
  scenario: Scenario;
  fields: readonly ExploreField[];
  inputs: readonly InputDraft[];
  /** Nothing else scatters: it cannot be left out. */
  isLast: boolean;
  faultAt: (path: string) => string | undefined;
  onChange: (inputs: InputDraft[]) => void;
}

function Inputs({ scenario, fields, inputs, isLast, faultAt, onChange }: InputsProps) {
  const put = (i: number, input: InputDraft): void => onChange(inputs.map((each, k) => (k === i ? input : each)));
  const fieldOf = (path: string) => fields.find((field) => field.path === path) ?? fields[0];
  return (
    <>
      {inputs.map((input, i) => (
        <InputForm
          key={i}
          input={input}
          fields={fields}
          faultAt={(member) => faultAt(`inputs[${i}].${member}`)}
          onField={(path) => put(i, inputDraftOf(fieldOf(path), scenario, input.kind))}
          onKind={(kind) => put(i, inputDraftOf(fieldOf(input.path), scenario, kind))}
          onChange={(next) => put(i, next)}
          {...(!isLast && { onRemove: () => onChange(inputs.filter((_, k) => k !== i)) })}
        />
      ))}
    </>
  );
}
