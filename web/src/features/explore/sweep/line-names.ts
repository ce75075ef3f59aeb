import type { LimitLine, LineSide, Outcome, Scenario } from "@restband/solver";
import { quantityNamed } from "../../../format/quantities.ts";
import { outcomeWords } from "../../../format/outcomes.ts";
import type { Shown } from "./shown.ts";

/** Lines drawn thick: where smooth sliding ends, and where a limit breaks. The others part two outcomes like any. */
export const isThick = ({ between }: LimitLine): boolean =>
  between.some((side) => side === "smooth-sliding" || side === "kept");

/** What a line is called on the map: thick ones have a name, what the others part is named beside them. */
export function lineName(line: LimitLine, shown: Shown, { limits }: Scenario): string | null {
  if (shown.kind === "limit") return `limit of the ${quantityName(limits[shown.limit].quantity)}`;
  return isThick(line) ? "limit of smooth sliding" : null;
}

const quantityName = (quantity: string): string => (quantityNamed(quantity)?.label ?? quantity).toLowerCase();

/** A side of a line in a word or two. */
export const sideWords = (side: LineSide): string =>
  side === "kept" || side === "broken" ? side : outcomeWords[side satisfies Outcome];
