import { TextField } from "../../components/text-field.tsx";

interface FigureFieldProps {
  label: string;
  value: string;
  error?: string;
  help?: string;
  /** Digits it has room for are the browser's own choice unless told: "w-24". */
  className?: string;
  isWhole?: boolean;
  onChange: (text: string) => void;
}

/** A number without a unit, as it is typed. */
export function FigureField({ className = "w-24", isWhole, onChange, ...rest }: FigureFieldProps) {
  return (
    <TextField
      {...rest}
      className={className}
      isFigure
      inputMode={isWhole ? "numeric" : "text"}
      onChange={(event) => onChange(event.target.value)}
    />
  );
}
