import { termOf, type TermKind } from "@restband/solver";
import { Button } from "../../../components/button.tsx";
import { SelectField } from "../../../components/select.tsx";
import { addTerm, raiseItem, removeItem, setTermKind, type Place } from "../changes.ts";
import { useDraftContext } from "../draft/draft-context.ts";
import { kindsFor } from "../sentence/drive-sentence.ts";
import { ChoiceField } from "./choice-field.tsx";
import { FormColumn, FormColumns } from "./form-column.tsx";
import { NumberField } from "./number-field.tsx";
import { RowsField } from "./rows-field.tsx";

export function DriveForm() {
  const { draft } = useDraftContext();
  return (
    <FormColumns>
      <PlaceColumn place="base" title="Motion of the far end of the spring, summed" />
      <PlaceColumn place="force" title="Forces on the body, summed" />
      {draft.sheet.wanted.motion === "linear" && (
        <FormColumn title="The ways">
          <NumberField path="incline" />
        </FormColumn>
      )}
    </FormColumns>
  );
}

function PlaceColumn({ place, title }: { place: Place; title: string }) {
  const { draft, dispatch } = useDraftContext();
  const { wanted } = draft.sheet;
  return (
    <FormColumn title={title}>
      {wanted[place].length === 0 && (
        <p className="text-quiet">{place === "base" ? "It stands still." : "None acts."}</p>
      )}
      {wanted[place].map((term, i) => (
        <TermFields key={`${place}${i}${term.kind}`} place={place} index={i} />
      ))}
      <SelectField
        label={place === "base" ? "Add a motion" : "Add a force"}
        choices={[{ value: "", label: "Choose a kind" }, ...kindChoices(kindsFor(wanted, place))]}
        value=""
        onChange={(event) =>
          event.currentTarget.value && dispatch(addTerm(place, event.currentTarget.value as TermKind))
        }
      />
    </FormColumn>
  );
}

const kindChoices = (kinds: ReturnType<typeof kindsFor>) => kinds.map(({ kind, label }) => ({ value: kind, label }));

function TermFields({ place, index }: { place: Place; index: number }) {
  const { draft, dispatch } = useDraftContext();
  const { wanted } = draft.sheet;
  const kind = termOf(wanted[place][index].kind);
  const path = `${place}[${index}]`;
  const fault = draft.faults.find((each) => each.path === path || each.path === `${path}.kind`)?.message;
  const name = `${kind.label}, ${index + 1} of ${wanted[place].length}`;
  return (
    <div role="group" aria-label={name} className="flex flex-col gap-4 border-b border-line pb-4">
      <SelectField
        label={`Kind ${index + 1}`}
        help={kind.summary}
        error={fault}
        choices={kindChoices(kindsFor(wanted, place))}
        value={kind.kind}
        onChange={(event) => dispatch(setTermKind(place, index, event.currentTarget.value as TermKind))}
      />
      {kind.choices?.map((choice) => (
        <ChoiceField key={choice.key} path={`${path}.${choice.key}`} choice={choice} />
      ))}
      {kind.fields.map(({ key, optional }) => (
        <NumberField key={key} path={`${path}.${key}`} empty={optional ? "none" : undefined} />
      ))}
      {kind.rows && <RowsField path={path} rows={kind.rows} />}
      <div className="flex flex-wrap gap-2">
        {index > 0 && <Button onClick={() => dispatch(raiseItem(place, index))}>Move up</Button>}
        <Button onClick={() => dispatch(removeItem(place, index))}>Remove</Button>
      </div>
    </div>
  );
}
