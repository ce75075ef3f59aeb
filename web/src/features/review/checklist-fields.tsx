import type { Decision } from "@restband/api/contract";
import { FieldError } from "../../components/field.tsx";

type Answer = Decision["checklist"][number]["answer"];

const answers: readonly { value: Answer; label: string }[] = [
  { value: "yes", label: "yes" },
  { value: "no", label: "no" },
  { value: "not-applicable", label: "does not apply" },
];

interface ChecklistFieldsProps {
  points: readonly string[];
  given: ReadonlyMap<string, Answer>;
  /** Said where an answer is missing. */
  error?: string;
  onAnswer: (point: string, answer: Answer) => void;
}

/** The points a project wants looked at, each to be answered. */
export function ChecklistFields({ points, given, error, onAnswer }: ChecklistFieldsProps) {
  return (
    <div>
      <h3 className="mb-1 text-15 font-semibold">Checklist</h3>
      <ul className="border-t border-edge">
        {points.map((point) => (
          <li key={point} className="border-b border-line">
            <fieldset className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1 py-2">
              <legend className="float-left mr-auto min-w-0 max-w-(--measure) wrap-anywhere">{point}</legend>
              <div className="flex flex-wrap gap-x-4 text-13">
                {answers.map(({ value, label }) => (
                  <label key={value} className="hit flex items-center gap-1.5">
                    <input
                      type="radio"
                      name={point}
                      checked={given.get(point) === value}
                      onChange={() => onAnswer(point, value)}
                      className="size-4 accent-slip"
                    />
                    {label}
                  </label>
                ))}
              </div>
            </fieldset>
          </li>
        ))}
      </ul>
      {error && <FieldError>{error}</FieldError>}
    </div>
  );
}
