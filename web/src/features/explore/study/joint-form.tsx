import { Button } from "../../../components/button.tsx";
import { FieldError } from "../../../components/field.tsx";
import { SelectField } from "../../../components/select.tsx";
import { TextField } from "../../../components/text-field.tsx";
import type { ExploreField } from "../explore-field.ts";
import { FieldChoice } from "../field-choice.tsx";
import { TypedNumber, typedOf } from "../typed-number.tsx";
import { CovarianceMatrix } from "./covariance-matrix.tsx";
import { withFit, withForm, withMember, withoutMember, type JointDraft } from "./joint-draft.ts";
import { PasteFit } from "./paste-fit.tsx";

interface JointFormProps {
  draft: JointDraft;
  fields: readonly ExploreField[];
  /** Numbers that nothing scatters yet. */
  free: readonly ExploreField[];
  /** The sentence at a member: "means[1]", "covariance[1][0]". */
  faultAt: (member: string) => string | undefined;
  onChange: (draft: JointDraft) => void;
  onRemove: () => void;
}

const FEWEST = 2;

/** Values that scatter together: means, and how they scatter; typed, or pasted as a fit leaves them. */
export function JointForm({ draft, fields, free, faultAt, onChange, onRemove }: JointFormProps) {
  const { members } = draft;
  const put = (at: number, member: JointDraft["members"][number]): void =>
    onChange({ ...draft, members: members.map((each, i) => (i === at ? member : each)) });
  const impossible = faultAt("covariance");
  return (
    <fieldset className="flex min-w-0 flex-col gap-4 border-l-4 border-line pl-4">
      <legend className="sr-only">Values that scatter together</legend>
      {members.map((member, i) => (
        <div key={member.path} className="flex flex-wrap items-start gap-x-4 gap-y-4">
          <FieldChoice
            label={i === 0 ? "Scatter together" : "with"}
            fields={fields}
            value={member.path}
            error={faultAt(`paths[${i}]`)}
            onChange={(path) => {
              const field = fields.find((each) => each.path === path);
              if (field) put(i, { path, mean: typedOf(field.value, field.measure) });
            }}
          />
          <TypedNumber
            label="mean"
            typed={member.mean}
            measure={fields.find(({ path }) => path === member.path)?.measure ?? fields[0].measure}
            onChange={(mean) => put(i, { ...member, mean })}
          />
          {members.length > FEWEST && (
            <Button className="mt-[29px]" onClick={() => onChange(withoutMember(draft, i))}>
              Leave it out
            </Button>
          )}
        </div>
      ))}
      {free.length > 0 && (
        <Button className="self-start" onClick={() => onChange(withMember(draft, free[0]))}>
          Let another go with them
        </Button>
      )}
      <SelectField
        label="How they scatter is told by"
        className="w-72 max-w-full"
        choices={[
          { value: "correlations", label: "deviations and correlations" },
          { value: "covariance", label: "their covariance" },
        ]}
        value={draft.form}
        onChange={(event) => onChange(withForm(draft, event.target.value as JointDraft["form"]))}
      />
      <CovarianceMatrix draft={draft} fields={fields} faultAt={faultAt} onChange={onChange} />
      {impossible && <FieldError>{impossible}</FieldError>}
      <PasteFit count={members.length} onFit={(fit) => onChange(withFit(draft, fit))} />
      <TextField
        label="Source"
        className="w-96 max-w-full"
        help="Where these numbers come from; it stands with the study."
        maxLength={200}
        value={draft.source}
        error={faultAt("source")}
        onChange={(event) => onChange({ ...draft, source: event.target.value })}
      />
      <Button className="self-start" onClick={onRemove}>
        Leave all of them out
      </Button>
    </fieldset>
  );
}
