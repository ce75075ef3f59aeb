import { Checkbox } from "../../../components/choices.tsx";
import { useDraftContext } from "../draft/draft-context.ts";
import { FormColumn, FormColumns } from "./form-column.tsx";
import { NumberField } from "./number-field.tsx";

export function StartForm() {
  const { draft, dispatch } = useDraftContext();
  return (
    <FormColumns>
      <FormColumn title="Start">
        <NumberField path="initial.displacement" />
        <NumberField path="initial.velocity" />
      </FormColumn>
      <FormColumn title="Span">
        <NumberField path="span.seconds" />
        <Checkbox
          label="End when it rests for good"
          help="once all inputs are constant"
          checked={draft.sheet.wanted.span.untilRest}
          onChange={(event) => dispatch({ type: "set", path: "span.untilRest", value: event.currentTarget.checked })}
        />
        <NumberField path="span.maxEvents" />
        <NumberField path="span.maxWork" />
      </FormColumn>
      <FormColumn title="Settling of a move">
        <NumberField path="settleBand" empty={null} />
        <p className="text-13 text-quiet">Left empty, no settle time is counted.</p>
      </FormColumn>
    </FormColumns>
  );
}
