import { formula, measures, textbook } from "../formula/formula.ts";
import type { Transmission } from "./transmission.ts";

export const gears: Transmission = {
  ...formula({
    key: "gears",
    label: "gears",
    givens: [
      {
        key: "ratio",
        label: "Ratio",
        symbol: "i",
        measure: measures.number,
        exclusiveMinimum: 0,
        help: "turns behind per turn in front: 10 for a motor behind a 10:1 reducer",
      },
    ],
    result: { symbol: "n", measure: measures.number },
    expression: "{ratio}",
    source: textbook,
    caveat: "Losses and backlash are left out.",
    value: ({ ratio }) => ratio,
  }),
  front: "angular",
  behind: "angular",
};
