import { Button } from "../../../components/button.tsx";
import { FieldError } from "../../../components/field.tsx";
import type { ExploreField } from "../explore-field.ts";
import { FieldChoice } from "../field-choice.tsx";
import { FigureField } from "../figure-field.tsx";
import type { CorrelationDraft } from "./correlation-draft.ts";

interface CorrelationsFormProps {
  correlations: readonly CorrelationDraft[];
  /** The values that scatter one by one. */
  inputs: readonly ExploreField[];
  /** The sentence at a member: "[1].value"; of the list alone where it is empty. */
  faultAt: (member: string) => string | undefined;
  onChange: (correlations: CorrelationDraft[]) => void;
}

/** Rank correlations between values that scatter one by one, a pair each. */
export function CorrelationsForm({ correlations, inputs, faultAt, onChange }: CorrelationsFormProps) {
  const put = (at: number, change: Partial<CorrelationDraft>): void =>
    onChange(correlations.map((each, i) => (i === at ? { ...each, ...change } : each)));
  const together = faultAt("");
  return (
    <>
      {correlations.map((correlation, i) => (
        <fieldset key={i} className="flex min-w-0 flex-wrap items-start gap-x-4 gap-y-4">
          <legend className="sr-only">Rank correlation {i + 1}</legend>
          <FieldChoice
            label="Goes together"
            fields={inputs}
            value={correlation.first}
            error={faultAt(`[${i}].first`)}
            onChange={(first) => put(i, { first })}
          />
          <FieldChoice
            label="with"
            fields={inputs}
            value={correlation.second}
            error={faultAt(`[${i}].second`)}
            onChange={(second) => put(i, { second })}
          />
          <FigureField
            label="rank correlation"
            className="w-36"
            value={correlation.text}
            error={faultAt(`[${i}].value`)}
            onChange={(text) => put(i, { text })}
          />
          <Button
            className="mt-[29px]"
            aria-label={`Leave out rank correlation ${i + 1}`}
            onClick={() => onChange(correlations.filter((_, k) => k !== i))}
          >
            Leave it out
          </Button>
        </fieldset>
      ))}
      {together && <FieldError>{together}</FieldError>}
    </>
  );
}
