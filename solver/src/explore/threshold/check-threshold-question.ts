import type { Outcome } from "../../result.ts";
import { numericField } from "../../scenario/numeric-fields.ts";
import { isNumberOf } from "../../scenario/reading.ts";
import type { Fault, Scenario } from "../../scenario/scenario.ts";
import { numberSentence, quoted } from "../../scenario/sentences.ts";
import { z } from "../../scenario/zod.ts";
import { linkFaults, linksSchema } from "../links.ts";
import { shapeFaults } from "../shape-faults.ts";
import { cellOutcomes } from "../cells/cell-row.ts";
import type { Target, ThresholdQuestion } from "./threshold.ts";

/** A question without its scenario: what is stored and typed. */
export type ThresholdPlan = Omit<ThresholdQuestion, "scenario">;

const outcomes: readonly [Outcome, ...Outcome[]] = cellOutcomes;

const targetSchema: z.ZodType<Target> = z.discriminatedUnion("kind", [
  z.strictObject({ kind: z.literal("outcome"), outcomes: z.array(z.enum(outcomes)).min(1), isWanted: z.boolean() }),
  z.strictObject({ kind: z.literal("limit"), limit: z.int() }),
  z.strictObject({ kind: z.literal("limits") }),
]);

/** The shape of a question alone. */
export const thresholdPlanSchema: z.ZodType<ThresholdPlan> = z.strictObject({
  path: z.string(),
  low: z.number(),
  high: z.number(),
  target: targetSchema,
  links: linksSchema.optional(),
  points: z.int().min(3).max(1000).optional(),
});

/** A question, or every fault of it. */
export type CheckedThreshold =
  { readonly question: ThresholdQuestion; readonly faults: [] } | { question: null; faults: Fault[] };

/** Checks anything for being a question about a checked scenario, all faults at once, each at its path. Never throws. */
export function checkThresholdQuestion(input: unknown, scenario: Scenario): CheckedThreshold {
  const parsed = thresholdPlanSchema.safeParse(input);
  const faults = parsed.success ? questionFaults(parsed.data, scenario) : shapeFaults(parsed.error.issues);
  if (!parsed.success || faults.length > 0) return { question: null, faults };
  return { question: { ...parsed.data, scenario }, faults: [] };
}

function questionFaults(plan: ThresholdPlan, scenario: Scenario): Fault[] {
  const { path, low, high, target, links } = plan;
  const field = numericField(scenario, path);
  if (field === undefined) return [{ path: "path", message: `This scenario has no number called ${quoted(path)}.` }];
  const ends = Object.entries({ low, high }).flatMap(([end, value]) =>
    isNumberOf(field, value) ? [] : [{ path: end, message: numberSentence(field, value) }],
  );
  const range =
    low < high ? [] : [{ path: "high", message: `The search goes up from ${low}; its high end is ${high}.` }];
  return [...ends, ...range, ...targetFaults(target, scenario), ...(links ? linkFaults(links, scenario, [path]) : [])];
}

function targetFaults(target: Target, { limits }: Scenario): Fault[] {
  if (target.kind === "outcome") return [];
  if (limits.length === 0)
    return [{ path: "target", message: "The scenario has no limits. Set one, or search an outcome." }];
  if (target.kind === "limits" || limits[target.limit] !== undefined) return [];
  return [
    {
      path: "target.limit",
      message: `The scenario has ${limits.length} limits, from 0; there is no limit ${target.limit}.`,
    },
  ];
}
