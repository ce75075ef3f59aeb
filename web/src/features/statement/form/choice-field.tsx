import type { Choice } from "@restband/solver";
import { SelectField } from "../../../components/select.tsx";
import { setWord } from "../changes.ts";
import { useDraftContext } from "../draft/draft-context.ts";
import { readPath } from "../path.ts";
import { NumberField } from "./number-field.tsx";

/** A member with a fixed list of words; a word that carries a number brings its field along. */
export function ChoiceField({ path, choice }: { path: string; choice: Choice }) {
  const { draft, dispatch } = useDraftContext();
  const stored = readPath(draft.sheet.wanted, path);
  const { label, options } = choice;
  const chosen =
    options.find(({ value, field }) => (field ? typeof stored === "object" : stored === value)) ?? options[0];
  const fault = draft.faults.find((each) => each.path === path)?.message;
  return (
    <>
      <SelectField
        label={label}
        error={fault}
        choices={options}
        value={chosen.value}
        onChange={(event) => {
          const option = options.find(({ value }) => value === event.currentTarget.value);
          if (option) dispatch(setWord(path, option));
        }}
      />
      {chosen.field && <NumberField path={`${path}.${chosen.field.key}`} />}
    </>
  );
}
