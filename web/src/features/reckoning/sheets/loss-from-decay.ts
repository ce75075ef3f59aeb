import type { Motion } from "../../../format/unit.ts";
import { measures } from "../formula/formula.ts";
import { decrementFromPeaks, decrementGiven, peakFault, peakGivens } from "./damping.ts";
import { way, type Sheet } from "./way.ts";

const result = { symbol: "η", measure: measures.number };
const source = "δ ≈ πη for small η, textbook, from memory";
const caveat = "For light damping: at η 0.2 the decrement of a body with a constant loss per cycle is 3.5 % above πη.";

/** η = δ / π, the loss factor whose loss per cycle gives this decrement, for small η. */
export const lossFromDecrement = (decrement: number): number => decrement / Math.PI;

/** The loss factor of the spring of a body of this kind. */
export const lossFromDecay = (motion: Motion): Sheet => ({
  ways: [
    way({
      key: "peaks",
      label: "from two peaks of a decay",
      givens: peakGivens(motion),
      result,
      expression: "ln({first} / {last}) / ({cycles} · π)",
      source,
      caveat,
      value: (values) => lossFromDecrement(decrementFromPeaks(values)),
      fault: peakFault,
    }),
    way({
      key: "decrement",
      label: "from a logarithmic decrement",
      givens: [decrementGiven],
      result,
      expression: "{decrement} / π",
      source,
      caveat,
      value: ({ decrement }) => lossFromDecrement(decrement),
    }),
  ],
  caution: "A decay without dry friction: in a contact that rubs the decrement grows as the motion dies away.",
});
