import { purposes, solidDampings, solidOf } from "@restband/solver";
import { RadioChoices } from "../../../components/choices.tsx";
import { SelectField } from "../../../components/select.tsx";
import { TextField } from "../../../components/text-field.tsx";
import { setMotion, setSolid } from "../changes.ts";
import { useDraftContext } from "../draft/draft-context.ts";
import { purposeWords } from "../sentence/body-sentence.ts";
import { ChoiceField } from "./choice-field.tsx";
import { FormColumn, FormColumns } from "./form-column.tsx";
import { NumberField } from "./number-field.tsx";

export function BodyForm() {
  return (
    <FormColumns>
      <WhatItIs />
      <FormColumn title="Body and spring">
        <NumberField path="body.inertia" />
        <NumberField path="body.stiffness" />
        <NumberField path="body.cubic" />
        <NumberField path="body.viscous" />
      </FormColumn>
      <SolidColumn />
    </FormColumns>
  );
}

function WhatItIs() {
  const { draft, dispatch } = useDraftContext();
  const { title, purpose, motion } = draft.sheet.wanted;
  const fault = draft.faults.find(({ path }) => path === "title")?.message;
  return (
    <FormColumn title="What it is">
      <TextField
        label="Title"
        value={title}
        error={fault}
        onChange={(event) => dispatch({ type: "set", path: "title", value: event.currentTarget.value })}
        onBlur={() => dispatch({ type: "settle" })}
      />
      <SelectField
        label="Purpose"
        help="Decides which cautions are shown; no result depends on it."
        choices={purposes.map((value) => ({ value, label: purposeWords[value] }))}
        value={purpose}
        onChange={(event) => dispatch({ type: "set", path: "purpose", value: event.currentTarget.value })}
      />
      <RadioChoices
        label="Motion"
        choices={[
          { value: "linear", label: "Straight", remark: "along a guide" },
          { value: "angular", label: "Turning", remark: "about an axis" },
        ]}
        value={motion}
        onChange={(chosen) => dispatch(setMotion(chosen))}
      />
    </FormColumn>
  );
}

function SolidColumn() {
  const { draft, dispatch } = useDraftContext();
  const kind = solidOf(draft.sheet.wanted.solid.model);
  return (
    <FormColumn title="Solid damping of the spring">
      <RadioChoices
        label="Model"
        choices={solidDampings.map(({ model, label, summary }) => ({ value: model, label, remark: summary }))}
        value={kind.model}
        onChange={(model) => dispatch(setSolid(model))}
      />
      {kind.fields.map(({ key }) => (
        <NumberField key={key} path={`solid.${key}`} />
      ))}
      {kind.choices?.map((choice) => (
        <ChoiceField key={choice.key} path={`solid.${choice.key}`} choice={choice} />
      ))}
    </FormColumn>
  );
}
