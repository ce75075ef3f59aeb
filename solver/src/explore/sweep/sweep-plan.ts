import { quantityNames, type QuantityName } from "../../scenario/quantity-names.ts";
import { z } from "../../scenario/zod.ts";
import { linksSchema, type Links } from "../links.ts";
import { mostQuantities } from "../cells/cell-row.ts";

/** The values one field takes, in order: from–to in `count` steps, evenly or by equal ratios, or listed. SI. */
export type SweepAxis =
  | {
      readonly path: string;
      readonly spacing: "linear" | "log";
      readonly from: number;
      readonly to: number;
      readonly count: number;
    }
  | { readonly path: string; readonly spacing: "listed"; readonly values: readonly number[] };

/**
 * Whether each cell starts from its neighbour's end state: `none`, every cell from the scenario's start; `up`, along the
 * first axis from its first value on; `down`, from its last; `both`, the one after the other, two branches of all cells.
 */
export type Continuation = "none" | "up" | "down" | "both";

/**
 * One or two fields varied together. Cells are numbered with the first axis running fastest: cell i holds value
 * i mod n₁ of the first axis and ⌊i/n₁⌋ of the second. With `both` the cells of the way down follow those of the way up.
 */
export interface SweepPlan {
  readonly format: "restband-sweep/1";
  readonly axes: readonly SweepAxis[];
  readonly links: Links;
  /** Kept of each cell besides outcome and limits, at most 29. */
  readonly quantities: readonly QuantityName[];
  readonly continuation: Continuation;
}

export const mostCells = 250_000;

const axisSchema = z.union([
  z.strictObject({
    path: z.string(),
    spacing: z.enum(["linear", "log"]),
    from: z.number(),
    to: z.number(),
    count: z.int().min(1).max(mostCells),
  }),
  z.strictObject({ path: z.string(), spacing: z.literal("listed"), values: z.array(z.number()).max(mostCells) }),
]);

/** The shape of a plan alone; `checkSweepPlan` judges it beside its scenario. */
export const sweepPlanSchema: z.ZodType<SweepPlan> = z.strictObject({
  format: z.literal("restband-sweep/1"),
  axes: z.array(axisSchema).min(1).max(2),
  links: linksSchema,
  quantities: z.array(z.enum(quantityNames)).max(mostQuantities),
  continuation: z.enum(["none", "up", "down", "both"]),
});
