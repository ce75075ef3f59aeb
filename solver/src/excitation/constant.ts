import type { ExcitationTerm } from "./excitation-term.ts";
import { level, piecewise } from "./piecewise.ts";
import { stillTerm } from "./still-term.ts";

export interface Constant {
  kind: "constant";
  value: number;
}

export const constant: ExcitationTerm<"constant", Constant> = {
  kind: "constant",
  label: "Constant",
  summary: "the same all the time",
  places: ["force", "base"],
  sentence: {
    force: "A constant force of {value} acts",
    base: "The far end of the spring is held at {value}",
  },
  fields: [{ key: "value", label: "Value", dimension: "force", initial: 10, initialOnBase: 0.001 }],
  source: "by definition",
  faults: () => [],
  compile: ({ value }) => ({ ...stillTerm, ...piecewise([level(-Infinity, value)]), nature: "constant" }),
};
