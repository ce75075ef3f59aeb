import { classNames } from "../../../components/class-names.ts";
import { controlClass, FieldError } from "../../../components/field.tsx";
import type { ExploreField } from "../explore-field.ts";
import { unitOf, withEntry, type JointDraft } from "./joint-draft.ts";

interface CovarianceMatrixProps {
  draft: JointDraft;
  fields: readonly ExploreField[];
  faultAt: (member: string) => string | undefined;
  onChange: (draft: JointDraft) => void;
}

/** The lower half of a matrix to be typed: its upper half is the same. */
export function CovarianceMatrix({ draft, fields, faultAt, onChange }: CovarianceMatrixProps) {
  const names = draft.members.map(({ path }) => fields.find((field) => field.path === path)?.name ?? path);
  const units = draft.members.map((member) => unitOf(member, fields).label);
  const isCovariance = draft.form === "covariance";
  const labelOf = (i: number, j: number): string => {
    if (i === j) return isCovariance ? `Variance of ${names[i]}` : `Deviation of ${names[i]}`;
    return `${isCovariance ? "Covariance" : "Correlation"} of ${names[i]} and ${names[j]}`;
  };
  return (
    <div className="max-w-full overflow-x-auto">
      <table className="border-collapse text-15">
        <caption className="sr-only">
          {isCovariance ? "Covariance" : "Deviations on the diagonal, correlations below"}
        </caption>
        <thead>
          <tr>
            <td />
            {names.map((name) => (
              <th key={name} scope="col" className="px-2 pb-1 text-left text-13 font-semibold text-quiet">
                {name}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {draft.entries.map((row, i) => (
            <tr key={names[i]}>
              <th scope="row" className="py-3 pr-2 text-left align-top leading-[1.2] font-normal">
                {names[i]}
              </th>
              {row.map((text, j) => (
                <td key={names[j]} className="px-2 py-1 align-top">
                  <Entry
                    label={labelOf(i, j)}
                    unit={entryUnit(draft.form, units, i, j)}
                    text={text}
                    fault={faultAt(`covariance[${i}][${j}]`)}
                    onChange={(next) => onChange(withEntry(draft, [i, j], next))}
                  />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

interface EntryProps {
  label: string;
  unit: string;
  text: string;
  fault: string | undefined;
  onChange: (text: string) => void;
}

function Entry({ label, unit, text, fault, onChange }: EntryProps) {
  return (
    <>
      <span className="flex items-center gap-2">
        <input
          aria-label={unit === "" ? label : `${label}, ${unit}`}
          aria-invalid={fault ? true : undefined}
          autoComplete="off"
          spellCheck={false}
          className={classNames(controlClass, "figures w-28!")}
          value={text}
          onChange={(event) => onChange(event.target.value)}
        />
        <span className="text-13 whitespace-nowrap text-quiet">{unit}</span>
      </span>
      {fault && <FieldError>{fault}</FieldError>}
    </>
  );
}

/** The unit of an entry, made of those of the two means; a correlation has none. */
function entryUnit(form: JointDraft["form"], units: readonly string[], i: number, j: number): string {
  if (form === "correlations") return i === j ? units[i] : "";
  if (units[i] === units[j]) return /^\p{L}*$/u.test(units[i]) ? `${units[i]}${units[i] && "²"}` : `(${units[i]})²`;
  return [units[i], units[j]].filter((unit) => unit !== "").join(" × ");
}
