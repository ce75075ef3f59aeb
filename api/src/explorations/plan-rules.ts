import {
  cellCount,
  checkSweepPlan,
  checkTolerancePlan,
  type Fault,
  numericField,
  rowLength,
  type Scenario,
  studyRows,
  tileCells,
  tileCount,
  z,
} from "@restband/solver";
import { refusedContent } from "../errors.ts";
import { faultsOf } from "../middleware/zod-faults.ts";
import type { explorationDraftSchema, ExplorationKind } from "./explorations-schema.ts";

type Draft = Pick<z.output<typeof explorationDraftSchema>, "kind" | "plan" | "tileCells" | "cellValues">;

const sweepSchema = z.strictObject({ sweep: z.unknown(), seconds: z.number().positive().max(1e7) });
const studySchema = z.strictObject({ study: z.unknown() });
const searchSchema = z.strictObject({ path: z.string(), low: z.number(), high: z.number(), target: z.string() });

/**
 * A plan has to be one of its scenario, and the rows that are to come have to be those of the plan: whoever opens it reads
 * them by it. Returns the plan with what may be left out written out.
 * @throws Refusal 422 with every faulty field, under `plan`
 */
export function demandPlan(draft: Draft, scenario: Scenario): Draft["plan"] {
  const { plan, faults } = rules[draft.kind](draft, scenario);
  if (faults.length > 0) throw refusedContent("refused-plan", faults);
  return plan;
}

interface Checked {
  readonly plan: Draft["plan"];
  readonly faults: readonly Fault[];
}

const rules: Record<ExplorationKind, (draft: Draft, scenario: Scenario) => Checked> = {
  sweep({ plan, ...rows }, scenario) {
    const { data, error } = sweepSchema.safeParse(plan);
    if (!data) return refused("plan", faultsOf(error));
    const checked = checkSweepPlan(data.sweep, scenario);
    if (!checked.plan) return refused("plan.sweep", checked.faults);
    const sweep = checked.plan;
    const sizes = Array.from({ length: tileCount(sweep) }, (_, tile) => tileCells(sweep, tile).length);
    const isOfSizes = sizes.length === rows.tileCells.length && sizes.every((size, i) => size === rows.tileCells[i]);
    const faults = rowFaults(rows, { isOfSizes, cells: cellCount(sweep), values: rowLength(sweep) });
    return { plan: { ...plan, sweep }, faults };
  },

  study({ plan, ...rows }, scenario) {
    const { data, error } = studySchema.safeParse(plan);
    if (!data) return refused("plan", faultsOf(error));
    const checked = checkTolerancePlan(data.study, scenario);
    if (!checked.plan) return refused("plan.study", checked.faults);
    const { plan: study } = checked;
    const { runs } = study;
    const isOfSizes = rows.tileCells.reduce((sum, each) => sum + each, 0) === runs;
    const faults = rowFaults(rows, { isOfSizes, cells: runs, values: rowLength(studyRows(study, scenario)) });
    return { plan: { study }, faults };
  },

  search({ plan }, scenario) {
    const { data, error } = searchSchema.safeParse(plan);
    if (!data) return refused("plan", faultsOf(error));
    const { path, low, high } = data;
    const faults = [
      ...(numericField(scenario, path) ? [] : [{ path: "plan.path", message: "This scenario has no such number." }]),
      ...(low < high ? [] : [{ path: "plan.high", message: `A search goes from ${low} up, not to ${high}.` }]),
    ];
    return { plan, faults };
  },
};

interface Expected {
  /** True where the tiles are cut as the plan has it. */
  readonly isOfSizes: boolean;
  readonly cells: number;
  /** Numbers of a row. */
  readonly values: number;
}

function rowFaults({ cellValues }: Pick<Draft, "cellValues">, { isOfSizes, cells, values }: Expected): Fault[] {
  return [
    ...(isOfSizes ? [] : [{ path: "tileCells", message: `These are not the tiles of a plan of ${cells} cells.` }]),
    ...(cellValues === values
      ? []
      : [{ path: "cellValues", message: `A row of this plan has ${values} numbers, not ${cellValues}.` }]),
  ];
}

function refused(root: string, faults: readonly Fault[]): Checked {
  return { plan: {}, faults: faults.map((one) => ({ ...one, path: one.path === "" ? root : `${root}.${one.path}` })) };
}
