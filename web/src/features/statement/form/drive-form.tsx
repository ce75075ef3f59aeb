import { termOf, type TermKind } from "@restband/solver";
import { Button } from "../../../components/button.tsx";
import { SelectField } from "../../../components/select.tsx";
import type { SwitchedOff } from "@restband/api/contract";
import { addTerm, setTermKind, type Place } from "../changes.ts";
import { useDraftContext } from "../draft/draft-context.ts";
import { kindsFor, sayTerm } from "../sentence/drive-sentence.ts";
import { raiseTerm, removeTerm, switchOff, switchOn, termRows } from "../terms.ts";
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
  const { wanted, off } = draft.sheet;
  const rows = termRows(wanted, off, place);
  return (
    <FormColumn title={title}>
      {wanted[place].length === 0 && (
        <p className="text-quiet">{place === "base" ? "It stands still." : "None acts."}</p>
      )}
      {rows.map((row, position) =>
        row.isOn ? (
          <TermFields
            key={`${position}${wanted[place][row.index].kind}`}
            place={place}
            index={row.index}
            position={position}
            count={rows.length}
          />
        ) : (
          <OffTerm key={`${position} off`} off={row.off} position={position} count={rows.length} />
        ),
      )}
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

interface TermFieldsProps {
  place: Place;
  /** Where it stands in the scenario. */
  index: number;
  /** Where it stands among the terms of its place, those switched off counted too. */
  position: number;
  count: number;
}

function TermFields({ place, index, position, count }: TermFieldsProps) {
  const { draft, dispatch } = useDraftContext();
  const { wanted } = draft.sheet;
  const kind = termOf(wanted[place][index].kind);
  const path = `${place}[${index}]`;
  const fault = draft.faults.find((each) => each.path === path || each.path === `${path}.kind`)?.message;
  const name = `${kind.label}, ${position + 1} of ${count}`;
  return (
    <div role="group" aria-label={name} className="flex flex-col gap-4 border-b border-line pb-4">
      <SelectField
        label={`Kind ${position + 1}`}
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
        <Button onClick={() => dispatch(switchOff(place, position))}>Switch off</Button>
        <Order place={place} position={position} />
      </div>
    </div>
  );
}

/** A term that is switched off: told, and brought back or taken away. */
function OffTerm({ off, position, count }: { off: SwitchedOff; position: number; count: number }) {
  const { draft, dispatch } = useDraftContext();
  const { place, term, units } = off;
  const name = `${termOf(term.kind).label}, ${position + 1} of ${count}, off`;
  return (
    <div role="group" aria-label={name} className="flex flex-col gap-3 border-b border-line pb-4">
      <p className="text-15 text-quiet">
        <s>{sayTerm(draft.sheet.wanted, place, term, units)}</s> (off)
      </p>
      <div className="flex flex-wrap gap-2">
        <Button onClick={() => dispatch(switchOn(place, position))}>Switch on</Button>
        <Order place={place} position={position} />
      </div>
    </div>
  );
}

function Order({ place, position }: { place: Place; position: number }) {
  const { dispatch } = useDraftContext();
  return (
    <>
      {position > 0 && <Button onClick={() => dispatch(raiseTerm(place, position))}>Move up</Button>}
      <Button onClick={() => dispatch(removeTerm(place, position))}>Remove</Button>
    </>
  );
}
