import { quantities } from "@restband/solver";
import { Button } from "../../../components/button.tsx";
import { SelectField } from "../../../components/select.tsx";
import { addLimit, raiseItem, removeItem, setLimitQuantity } from "../changes.ts";
import { useDraftContext } from "../draft/draft-context.ts";
import { ABSENT } from "../entry/use-number-entry.ts";
import { FormColumn, FormColumns } from "./form-column.tsx";
import { NumberField } from "./number-field.tsx";

const choices = quantities.map(({ name, label }) => ({ value: name, label }));

export function LimitsForm() {
  const { draft, dispatch } = useDraftContext();
  return (
    <FormColumns>
      {draft.sheet.wanted.limits.map((limit, i) => (
        <LimitFields key={`${i}${limit.quantity}`} index={i} />
      ))}
      <FormColumn title="Another limit">
        <SelectField
          label="On which quantity"
          choices={[{ value: "", label: "Choose a quantity" }, ...choices]}
          value=""
          onChange={(event) => event.currentTarget.value && dispatch(addLimit(event.currentTarget.value, 0))}
        />
      </FormColumn>
    </FormColumns>
  );
}

function LimitFields({ index }: { index: number }) {
  const { draft, dispatch } = useDraftContext();
  const { quantity } = draft.sheet.wanted.limits[index];
  const described = quantities.find(({ name }) => name === quantity);
  const path = `limits[${index}]`;
  const fault = draft.faults.find((each) => each.path === path || each.path === `${path}.quantity`)?.message;
  return (
    <FormColumn title={`Limit ${index + 1}`}>
      <SelectField
        label="Quantity"
        help={described?.meaning}
        error={fault}
        choices={choices}
        value={quantity}
        onChange={(event) => dispatch(setLimitQuantity(index, event.currentTarget.value))}
      />
      <NumberField path={`${path}.min`} label="At least" empty={ABSENT} />
      <NumberField path={`${path}.max`} label="At most" empty={ABSENT} />
      <div className="flex flex-wrap gap-2">
        {index > 0 && <Button onClick={() => dispatch(raiseItem("limits", index))}>Move up</Button>}
        <Button onClick={() => dispatch(removeItem("limits", index))}>Remove</Button>
      </div>
    </FormColumn>
  );
}
