import { formula, measures, textbook } from "../formula/formula.ts";
import { lengthOf } from "../formula/lengths.ts";
import type { Transmission } from "./transmission.ts";

/**
 * A lever with its pivot anywhere: n = b / a.
 * @param arm b from the pivot to what is behind, m
 * @param bodyArm a from the pivot to where the body acts, m
 */
export const leverRatio = ({ arm, bodyArm }: Record<"arm" | "bodyArm", number>): number => arm / bodyArm;

export const lever: Transmission = {
  ...formula({
    key: "lever",
    label: "a lever",
    givens: [lengthOf("arm", "Arm to these members", "b"), lengthOf("bodyArm", "Arm towards the body", "a")],
    result: { symbol: "n", measure: measures.number },
    expression: "{arm} / {bodyArm}",
    source: textbook,
    caveat: "For small angles; the lever itself is stiff and without mass.",
    value: leverRatio,
  }),
  front: "linear",
  behind: "linear",
};

/** What acts on an arm of a turning body: n = r, m/rad. */
export const arm: Transmission = {
  ...formula({
    key: "arm",
    label: "an arm or rim",
    givens: [lengthOf("radius", "Distance from the axis", "r", "square to the direction it acts in")],
    result: { symbol: "n", measure: measures.number },
    expression: "{radius}",
    source: textbook,
    caveat: "For small angles.",
    value: ({ radius }) => radius,
  }),
  front: "angular",
  behind: "linear",
};
