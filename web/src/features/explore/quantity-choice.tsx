import { quantities, type QuantityName } from "@restband/solver";
import { Checkbox } from "../../components/choices.tsx";

const MOST_QUANTITIES = 16;

interface QuantityChoiceProps {
  label: string;
  /** Always among them. */
  fixed?: QuantityName;
  chosen: readonly QuantityName[];
  onChange: (chosen: QuantityName[]) => void;
}

/** Which quantities are kept of each run besides outcome and limits. */
export function QuantityChoice({ label, fixed, chosen, onChange }: QuantityChoiceProps) {
  const isFull = chosen.length >= MOST_QUANTITIES;
  return (
    <details>
      <summary className="link w-fit text-15">
        {label}: {chosen.length === 1 ? "1 quantity" : `${chosen.length} quantities`}
      </summary>
      <div className="mt-3 grid gap-x-6 gap-y-1.5 desk:grid-cols-3">
        {quantities.map(({ name, label: words }) => (
          <Checkbox
            key={name}
            label={words}
            checked={chosen.includes(name)}
            disabled={name === fixed || (isFull && !chosen.includes(name))}
            onChange={(event) =>
              onChange(event.target.checked ? [...chosen, name] : chosen.filter((each) => each !== name))
            }
          />
        ))}
      </div>
    </details>
  );
}
