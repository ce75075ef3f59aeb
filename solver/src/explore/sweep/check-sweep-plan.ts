import type { Field } from "../../field.ts";
import { isNumberOf } from "../../scenario/reading.ts";
import type { Fault, Scenario } from "../../scenario/scenario.ts";
import { numberSentence, quoted } from "../../scenario/sentences.ts";
import type { z } from "../../scenario/zod.ts";
import { defaultLinks, linkFaults } from "../links.ts";
import { shapeFaults } from "../shape-faults.ts";
import { numericField } from "../../scenario/numeric-fields.ts";
import { mostLimitFaults } from "../cells/most-limit-faults.ts";
import { mostCellsOf } from "./tiles.ts";
import { mostCells, type SweepAxis, type SweepPlan, sweepPlanSchema } from "./sweep-plan.ts";

/** A plan, or every fault of it. */
export type CheckedSweep = { readonly plan: SweepPlan; readonly faults: [] } | { plan: null; faults: Fault[] };

/**
 * Checks anything for being a sweep of a checked scenario. `links` may be left out: the default ones are then written out
 * (see `defaultLinks`); so may `continuation`, which is then `none`. Faults come all at once, each at its path
 * (`axes[0].to`) with a sentence. Never throws.
 */
export function checkSweepPlan(input: unknown, scenario: Scenario): CheckedSweep {
  const completed = withDefaults(input, scenario);
  const parsed = sweepPlanSchema.safeParse(completed);
  const faults = sweepFaults(completed, parsed.success ? [] : parsed.error.issues, scenario);
  return parsed.success && faults.length === 0 ? { plan: parsed.data, faults: [] } : { plan: null, faults };
}

function withDefaults(input: unknown, scenario: Scenario): unknown {
  if (typeof input !== "object" || input === null || Array.isArray(input)) return input;
  const { axes } = input as { axes?: unknown };
  const paths = (Array.isArray(axes) ? (axes as unknown[]) : []).map((axis) => (axis as SweepAxis | null)?.path ?? "");
  return { continuation: "none", links: defaultLinks(scenario, paths), ...input };
}

type Issues = readonly z.core.$ZodIssue[];

/** Every fault of a plan, in words: `issues` are what is wrong with its shape. */
function sweepFaults(input: unknown, issues: Issues, scenario: Scenario): Fault[] {
  if (issues.length > 0) return shapeFaults(issues);
  const plan = input as SweepPlan;
  const varied = plan.axes.map(({ path }) => path);
  return [
    ...plan.axes.flatMap((axis, i) => below(`axes[${i}]`, axisFaults(axis, scenario))),
    ...sameTwice(varied),
    ...sizeFaults(plan),
    ...linkFaults(plan.links, scenario, varied),
    ...mostLimitFaults("A sweep", scenario),
  ];
}

const below = (path: string, faults: readonly Fault[]) =>
  faults.map((one) => ({ ...one, path: `${path}.${one.path}` }));

function sameTwice(paths: readonly string[]): Fault[] {
  if (paths.length < 2 || paths[0] !== paths[1]) return [];
  return [
    { path: "axes[1].path", message: "The second field is the same as the first. Choose another, or sweep one." },
  ];
}

function axisFaults(axis: SweepAxis, scenario: Scenario): Fault[] {
  const field = numericField(scenario, axis.path);
  if (field === undefined)
    return [{ path: "path", message: `This scenario has no number called ${quoted(axis.path)}.` }];
  return axis.spacing === "listed" ? listFaults(axis.values, field) : rangeFaults(axis, field);
}

function listFaults(values: readonly number[], field: Field): Fault[] {
  if (values.length === 0) return [{ path: "values", message: "The list is empty. Give at least one value." }];
  return values.flatMap((value, i) => [
    ...boundFaults(`values[${i}]`, value, field),
    ...(values.indexOf(value) < i ? [{ path: `values[${i}]`, message: `${value} stands in the list already.` }] : []),
  ]);
}

function rangeFaults({ spacing, from, to, count }: Exclude<SweepAxis, { spacing: "listed" }>, field: Field): Fault[] {
  const ends = [...boundFaults("from", from, field), ...boundFaults("to", to, field)];
  const faults: Fault[] = [];
  if (from === to) faults.push({ path: "to", message: `The range is empty: it starts and ends at ${from}.` });
  if (from > to) faults.push({ path: "to", message: `The range is reversed: it starts at ${from} and ends at ${to}.` });
  if (spacing === "log" && from * to <= 0)
    faults.push({ path: "from", message: "Equal ratios need two ends of one sign, neither of them 0." });
  if (count < 2) faults.push({ path: "count", message: `A range needs at least 2 values; it is ${count}.` });
  if (field.integer && from < to && ends.length === 0 && !stepsAreWhole(from, to, count, spacing))
    faults.push({
      path: "count",
      message: `${field.label} takes whole numbers: choose a count that steps by them, or a list.`,
    });
  return [...ends, ...faults];
}

const stepsAreWhole = (from: number, to: number, count: number, spacing: string) =>
  spacing === "linear" && Number.isInteger((to - from) / (count - 1));

function boundFaults(path: string, value: number, field: Field): Fault[] {
  return isNumberOf({ ...field, integer: false }, value) && (!field.integer || Number.isInteger(value))
    ? []
    : [{ path, message: numberSentence(field, value) }];
}

function sizeFaults(plan: SweepPlan): Fault[] {
  const { axes, continuation } = plan;
  const mostContinued = mostCellsOf(plan);
  const counts = axes.map((axis) => (axis.spacing === "listed" ? axis.values.length : axis.count));
  const branches = continuation === "both" ? 2 : 1;
  const cells = branches * counts.reduce((product, count) => product * count, 1);
  if (cells > mostCells)
    return [{ path: "axes", message: `A sweep has at most ${mostCells} cells; these are ${cells}.` }];
  if (continuation !== "none" && axes.some(({ path }) => path.startsWith("initial.")))
    return [
      { path: "continuation", message: "Cells that follow one another have no start of their own to be varied." },
    ];
  if (continuation !== "none" && counts[0] > mostContinued)
    return [
      {
        path: "continuation",
        message: `Cells follow each other along at most ${mostContinued} values; there are ${counts[0]}.`,
      },
    ];
  return [];
}
