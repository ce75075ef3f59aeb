import { counterfaceChoice, frictionLaws, lawOf, normalForce } from "@restband/solver";
import { Checkbox, RadioChoices } from "../../../components/choices.tsx";
import { say } from "../../../format/format-quantity.ts";
import { setLaw, setRipple } from "../changes.ts";
import { useDraftContext } from "../draft/draft-context.ts";
import { ChoiceField } from "./choice-field.tsx";
import { FormColumn, FormColumns } from "./form-column.tsx";
import { NumberField } from "./number-field.tsx";
import { RowsField } from "./rows-field.tsx";

export function ContactForm() {
  return (
    <FormColumns>
      <LawColumn />
      <FrictionColumn />
      <PressingColumn />
    </FormColumns>
  );
}

function LawColumn() {
  const { draft, dispatch } = useDraftContext();
  return (
    <FormColumn title="Friction law and counterface">
      <RadioChoices
        label="Friction law"
        choices={frictionLaws.map(({ model, label, summary }) => ({ value: model, label, remark: summary }))}
        value={draft.sheet.wanted.contact.law.model}
        onChange={(model) => dispatch(setLaw(model))}
      />
      <ChoiceField path="contact.counterface" choice={counterfaceChoice} />
    </FormColumn>
  );
}

function FrictionColumn() {
  const { draft } = useDraftContext();
  const law = lawOf(draft.sheet.wanted.contact.law.model);
  return (
    <FormColumn title="Friction">
      {law.fields.map(({ key }) => (
        <NumberField key={key} path={`contact.law.${key}`} />
      ))}
      {law.rows && <RowsField path="contact.law" rows={law.rows} />}
      {law.model === "none" && <p className="text-15 text-quiet">Without friction there is nothing to enter.</p>}
      <p className="text-13 text-quiet">Source of the law: {law.source}.</p>
    </FormColumn>
  );
}

function PressingColumn() {
  const { draft, dispatch } = useDraftContext();
  const { wanted } = draft.sheet;
  const { normal } = wanted.contact;
  const together = normalForce(draft.inForce);
  const { preload, faces } = draft.inForce.contact.normal;
  const force = (value: number): string => say(value, { dimension: "pressing", motion: wanted.motion }, { digits: 5 });
  return (
    <FormColumn title="What presses the faces together">
      <NumberField path="contact.normal.preload" />
      <NumberField path="contact.normal.faces" />
      {wanted.motion === "angular" && <NumberField path="contact.radius" />}
      {wanted.motion === "linear" && (
        <Checkbox
          label="Its weight presses too"
          help={normal.weight ? `adds ${force(together - faces * preload)}` : undefined}
          checked={normal.weight}
          onChange={(event) =>
            dispatch({ type: "set", path: "contact.normal.weight", value: event.currentTarget.checked })
          }
        />
      )}
      <p>
        Together <span className="figures font-semibold">{force(together)}</span>
      </p>
      <Checkbox
        label="The pressing force ripples"
        checked={normal.ripple !== null}
        onChange={(event) => dispatch(setRipple(event.currentTarget.checked))}
      />
      <NumberField path="contact.normal.ripple.amplitude" />
      <NumberField path="contact.normal.ripple.hz" />
      <NumberField path="contact.normal.ripple.phase" />
    </FormColumn>
  );
}
