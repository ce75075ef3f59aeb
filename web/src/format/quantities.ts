import { quantities, type Quantity } from "@restband/solver";
import type { Measure, Motion } from "./unit.ts";

/** Quantities that are shares of a time, read as percentages. */
const shares: ReadonlySet<string> = new Set(["stickFraction", "cycleStickFraction", "holdUse"]);

/** A quantity by its name; undefined where there is none. */
export const quantityNamed = (name: string | undefined): Quantity | undefined =>
  quantities.find((quantity) => quantity.name === name);

export const isShare = (name: string | undefined): boolean => name !== undefined && shares.has(name);

/** What a quantity measures on a kind of body; a plain number where the name is not known. */
export const measureOfQuantity = (name: string, motion: Motion): Measure => ({
  dimension: quantityNamed(name)?.dimension ?? "none",
  motion,
  isShare: isShare(name),
});
