import { formula, measures, textbook } from "../formula/formula.ts";
import { lengthOf } from "../formula/lengths.ts";
import type { Transmission } from "./transmission.ts";

/**
 * A pinion on a rack or a pulley in a belt: n = 1 / r, rad/m.
 * @param radius r on which it rolls, m
 */
export const pinionRatio = ({ radius }: Record<"radius", number>): number => 1 / radius;

export const pinion: Transmission = {
  ...formula({
    key: "pinion",
    label: "a pinion or pulley",
    givens: [lengthOf("radius", "Rolling radius", "r")],
    result: { symbol: "n", measure: measures.number },
    expression: "1 / {radius}",
    source: textbook,
    value: pinionRatio,
  }),
  front: "linear",
  behind: "angular",
};
