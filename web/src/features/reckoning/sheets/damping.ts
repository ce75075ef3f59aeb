import type { Motion } from "../../../format/unit.ts";
import { measures, textbook, type Given } from "../formula/formula.ts";
import { way, type Sheet } from "./way.ts";

/** ζ = δ / √(4π² + δ²), the damping ratio of a linear body whose successive peaks fall by exp(δ). */
export const ratioFromDecrement = (decrement: number): number =>
  decrement / Math.sqrt(4 * Math.PI ** 2 + decrement ** 2);

/** c = 2 ζ √(k m), N·s/m (or N·m·s/rad): ζ times the critical damping. */
export const dampingFromRatio = ({
  ratio,
  stiffness,
  inertia,
}: Record<"ratio" | "stiffness" | "inertia", number>): number => 2 * ratio * Math.sqrt(stiffness * inertia);

/**
 * δ = ln(x_0 / x_n) / n, the logarithmic decrement between two peaks of a decay.
 * @param first x_0 and last x_n, peaks to the same side, same unit, x_0 > x_n > 0
 * @param cycles n between them
 */
export const decrementFromPeaks = ({ first, last, cycles }: Record<"first" | "last" | "cycles", number>): number =>
  Math.log(first / last) / cycles;

export const decrementGiven: Given<"decrement"> = {
  key: "decrement",
  label: "Logarithmic decrement",
  symbol: "δ",
  measure: measures.number,
  minimum: 0,
};

/** Two peaks of a decay and how far apart they are. */
export const peakGivens = (motion: Motion): readonly Given<"first" | "last" | "cycles">[] => [
  {
    key: "first",
    label: "First peak",
    symbol: "x_0",
    measure: { dimension: "displacement", motion },
    exclusiveMinimum: 0,
    help: "from the middle of the motion",
  },
  {
    key: "last",
    label: "Last peak",
    symbol: "x_n",
    measure: { dimension: "displacement", motion },
    exclusiveMinimum: 0,
    help: "to the same side",
  },
  { key: "cycles", label: "Cycles between them", symbol: "n", measure: measures.number, minimum: 1, integer: true },
];

/** A decay falls. */
export const peakFault = ({ first, last }: { readonly first: number; readonly last: number }) =>
  last < first ? null : { key: "last" as const, message: "A decay falls: enter less than the first peak." };

const ownGivens = (motion: Motion): readonly Given<"stiffness" | "inertia">[] => [
  {
    key: "stiffness",
    label: "Stiffness",
    symbol: "k",
    measure: { dimension: "stiffness", motion },
    exclusiveMinimum: 0,
    from: ({ body }) => body.stiffness,
  },
  {
    key: "inertia",
    label: motion === "linear" ? "Mass" : "Moment of inertia",
    symbol: motion === "linear" ? "m" : "J",
    measure: { dimension: "inertia", motion },
    exclusiveMinimum: 0,
    from: ({ body }) => body.inertia,
  },
];

/** The viscous damping of a body of this kind. */
export function damping(motion: Motion): Sheet {
  const result = { symbol: "c", measure: { dimension: "damping", motion } } as const;
  const own = ownGivens(motion);
  const ratio: Given<"ratio"> = {
    key: "ratio",
    label: "Damping ratio",
    symbol: "ζ",
    measure: measures.number,
    minimum: 0,
  };
  return {
    ways: [
      way({
        key: "peaks",
        label: "from two peaks of a decay",
        givens: [...peakGivens(motion), ...own],
        result,
        expression:
          "2 · √({stiffness} · {inertia}) · (ln({first} / {last}) / {cycles}) / √(4 · π^2 + (ln({first} / {last}) / {cycles})^2)",
        source: textbook,
        value: (values) => dampingFromRatio({ ...values, ratio: ratioFromDecrement(decrementFromPeaks(values)) }),
        fault: peakFault,
      }),
      way({
        key: "decrement",
        label: "from a logarithmic decrement",
        givens: [decrementGiven, ...own],
        result,
        expression: "2 · √({stiffness} · {inertia}) · {decrement} / √(4 · π^2 + {decrement}^2)",
        source: textbook,
        value: (values) => dampingFromRatio({ ...values, ratio: ratioFromDecrement(values.decrement) }),
      }),
      way({
        key: "ratio",
        label: "from a share of critical",
        givens: [ratio, ...own],
        presets: [
          {
            label: "Kind of structure",
            options: [
              { label: "continuous metal, middle of 2 to 4 %", values: { ratio: 0.03 } },
              { label: "with joints, middle of 3 to 7 %", values: { ratio: 0.05 } },
            ],
          },
        ],
        result,
        expression: "2 · {ratio} · √({stiffness} · {inertia})",
        source: `${textbook}; shares after a table quoting Adams and Askenazi`,
        value: dampingFromRatio,
      }),
    ],
    caution:
      "Dry friction makes a motion decay too, by equal steps where viscous damping takes equal shares. Where the decrement grows along a decay, part of it is friction: counted here and in the contact it counts twice.",
  };
}
