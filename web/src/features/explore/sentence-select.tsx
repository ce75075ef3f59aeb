import type { Choice } from "../../components/select.tsx";

interface SentenceSelectProps {
  label: string;
  choices: readonly Choice[];
  value: string;
  onChange: (value: string) => void;
}

/** A native select laid over its own word: it wraps and is underlined like the words around it. */
export function SentenceSelect({ label, choices, value, onChange }: SentenceSelectProps) {
  const shown = choices.find((choice) => choice.value === value)?.label ?? value;
  return (
    <span className="relative inline-block rounded-[2px] focus-within:outline-2 focus-within:outline-offset-2 focus-within:outline-slip">
      <span
        aria-hidden="true"
        className="font-semibold underline decoration-slip decoration-2 underline-offset-[5px] hover:decoration-[3px]"
      >
        {shown}
      </span>
      <select
        aria-label={label}
        className="absolute inset-0 w-full cursor-pointer appearance-none bg-raised text-15 text-ink opacity-0"
        value={value}
        onChange={(event) => onChange(event.currentTarget.value)}
      >
        {choices.map((choice) => (
          <option key={choice.value} value={choice.value}>
            {choice.label}
          </option>
        ))}
      </select>
    </span>
  );
}
