import type { ExcitationTerm } from "./excitation-term.ts";
import { level, piecewise } from "./piecewise.ts";
import { startField } from "./shared-fields.ts";
import { stillTerm } from "./still-term.ts";

export interface Step {
  kind: "step";
  value: number;
  start: number;
}

export const step: ExcitationTerm<"step", Step> = {
  kind: "step",
  label: "Step",
  summary: "comes on at an instant and stays",
  places: ["force"],
  sentence: { force: "A force of {value} acts from {start} on" },
  fields: [{ key: "value", label: "Value", dimension: "force", initial: 10 }, startField],
  source: "by definition",
  faults: () => [],
  compile: ({ value, start }) => ({ ...stillTerm, ...piecewise([level(-Infinity, 0), level(start, value)]) }),
};
