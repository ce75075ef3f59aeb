import { formula, measures, textbook } from "../formula/formula.ts";
import type { Transmission } from "./transmission.ts";

/**
 * Turns a straight motion into a turn: n = 2π / p, rad/m.
 * @param lead p, travel per turn, m: pitch times starts
 */
export const leadRatio = ({ lead }: Record<"lead", number>): number => (2 * Math.PI) / lead;

export const lead: Transmission = {
  ...formula({
    key: "lead",
    label: "a screw",
    givens: [
      {
        key: "lead",
        label: "Lead",
        symbol: "p",
        measure: measures.length,
        unit: "mm",
        exclusiveMinimum: 0,
        help: "travel per turn: pitch times starts",
      },
    ],
    result: { symbol: "n", measure: measures.number },
    expression: "2 · π / {lead}",
    source: textbook,
    value: leadRatio,
  }),
  front: "linear",
  behind: "angular",
};
