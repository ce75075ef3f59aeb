import { useState } from "react";
import { TextField } from "../../components/text-field.tsx";
import { sayInput } from "../../format/format-quantity.ts";
import { parseTyped } from "../../format/parse-typed.ts";
import type { Measure } from "../../format/unit.ts";
import { unitFor } from "../../format/units.ts";

const measure: Measure = { dimension: "slidingVelocity", motion: "linear" };

interface SmoothedVelocityProps {
  /** v_0, m/s. */
  value: number;
  onChange: (value: number) => void;
}

/** The velocity of a smoothed friction law, asked for beside what such a law would report; what cannot be read changes nothing. */
export function SmoothedVelocity({ value, onChange }: SmoothedVelocityProps) {
  const [typed, setTyped] = useState(() => sayInput(value, measure));
  const fault = faultOf(typed, value);
  const change = (text: string): void => {
    setTyped(text);
    const reading = parseTyped(text, measure, unitFor(value, measure));
    if (reading.kind === "value" && reading.value > 0) onChange(reading.value);
  };
  return (
    <TextField
      className="mt-3 max-w-72"
      label="Velocity of the smoothed law"
      isFigure
      value={typed}
      error={fault}
      help="v₀ of F tanh(v/v₀), as a smoothed run used it."
      onChange={(event) => change(event.target.value)}
    />
  );
}

function faultOf(typed: string, value: number): string | undefined {
  const reading = parseTyped(typed, measure, unitFor(value, measure));
  if (reading.kind !== "value") return reading.message;
  return reading.value > 0 ? undefined : "The velocity is above zero.";
}
