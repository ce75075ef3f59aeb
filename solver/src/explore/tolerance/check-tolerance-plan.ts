import { choleskyOf } from "../../numerics/cholesky.ts";
import type { Fault, Scenario } from "../../scenario/scenario.ts";
import { quoted } from "../../scenario/sentences.ts";
import type { z } from "../../scenario/zod.ts";
import { defaultLinks, linkFaults } from "../links.ts";
import { mostLimitFaults } from "../cells/most-limit-faults.ts";
import { shapeFaults } from "../shape-faults.ts";
import { scoreCorrelations } from "./rank-order.ts";
import { numericField } from "../../scenario/numeric-fields.ts";
import {
  type Distribution,
  type JointInput,
  type RankCorrelation,
  type TolerancePlan,
  correlationMatrix,
  tolerancePlanSchema,
  variedPaths,
} from "./tolerance-plan.ts";

/** A plan, or every fault of it. */
export type CheckedTolerance = { readonly plan: TolerancePlan; readonly faults: [] } | { plan: null; faults: Fault[] };

/**
 * Checks anything for being a tolerance study of a checked scenario. `correlations`, `joint`, `links`, `quantities` may be
 * left out (none; links the default ones), and `sampling` (Latin hypercube). Faults come all at once, each at its path
 * with a sentence. Never throws.
 */
export function checkTolerancePlan(input: unknown, scenario: Scenario): CheckedTolerance {
  const completed = completedPlan(input, scenario);
  const parsed = tolerancePlanSchema.safeParse(completed);
  const faults = toleranceFaults(completed, parsed.success ? [] : parsed.error.issues, scenario);
  return parsed.success && faults.length === 0 ? { plan: parsed.data, faults: [] } : { plan: null, faults };
}

function completedPlan(input: unknown, scenario: Scenario): unknown {
  if (typeof input !== "object" || input === null || Array.isArray(input)) return input;
  const lists = { inputs: [], correlations: [], joint: [], quantities: [] };
  const whole = { ...lists, links: {}, sampling: "latin-hypercube", ...input };
  // only a plan of the right shape tells what it varies
  const { success, data } = tolerancePlanSchema.safeParse(whole);
  return success && !("links" in input) ? { ...whole, links: defaultLinks(scenario, variedPaths(data)) } : whole;
}

type Issues = readonly z.core.$ZodIssue[];

/** Every fault of a plan, in words: `issues` are what is wrong with its shape. */
function toleranceFaults(input: unknown, issues: Issues, scenario: Scenario): Fault[] {
  if (issues.length > 0) return shapeFaults(issues);
  const plan = input as TolerancePlan;
  const varied = variedPaths(plan);
  return [
    ...pathFaults(plan, scenario),
    ...plan.inputs.flatMap(({ distribution }, i) =>
      below(`inputs[${i}].distribution`, distributionFaults(distribution)),
    ),
    ...plan.joint.flatMap((joint, i) => below(`joint[${i}]`, jointFaults(joint))),
    ...correlationFaults(plan),
    ...linkFaults(plan.links, scenario, varied),
    ...mostLimitFaults("A study", scenario),
  ];
}

const below = (path: string, faults: readonly Fault[]) =>
  faults.map((one) => ({ ...one, path: `${path}.${one.path}` }));

function pathFaults({ inputs, joint }: TolerancePlan, scenario: Scenario): Fault[] {
  const places = [
    ...inputs.map(({ path }, i) => ({ path, at: `inputs[${i}].path` })),
    ...joint.flatMap(({ paths }, i) => paths.map((path, j) => ({ path, at: `joint[${i}].paths[${j}]` }))),
  ];
  if (places.length === 0)
    return [{ path: "inputs", message: "Nothing scatters. Give at least one value a distribution." }];
  return places.flatMap(({ path, at }, i) => {
    const field = numericField(scenario, path);
    if (field === undefined) return [{ path: at, message: `This scenario has no number called ${quoted(path)}.` }];
    if (field.integer) return [{ path: at, message: `${field.label} is a whole number and cannot scatter.` }];
    const isTwice = places.findIndex((other) => other.path === path) < i;
    return isTwice ? [{ path: at, message: `${field.label} scatters already.` }] : [];
  });
}

function distributionFaults(distribution: Distribution): Fault[] {
  const faults: Fault[] = [];
  const add = (path: string, message: string) => faults.push({ path, message });
  if ("deviation" in distribution && !(distribution.deviation > 0))
    add("deviation", `The standard deviation must be more than 0; it is ${distribution.deviation}.`);
  if ("low" in distribution && !(distribution.low < distribution.high))
    add("high", `The high end must be above the low end, ${distribution.low}; it is ${distribution.high}.`);
  if (distribution.kind === "triangular" && faults.length === 0) {
    const { low, likeliest, high } = distribution;
    if (likeliest < low || likeliest > high)
      add("likeliest", `The likeliest value lies between ${low} and ${high}; it is ${likeliest}.`);
  }
  if (distribution.kind === "truncated" && faults.length === 0 && !reaches(distribution))
    add("low", "Between these ends lies next to nothing of the distribution: they are more than 8 deviations away.");
  return faults;
}

/** The ends leave enough of the distribution to draw from. */
const reaches = ({ mean, deviation, low, high }: Extract<Distribution, { kind: "truncated" }>) =>
  low < mean + 8 * deviation && high > mean - 8 * deviation;

function jointFaults({ paths, means, covariance }: JointInput): Fault[] {
  const n = paths.length;
  if (n === 0) return [{ path: "paths", message: "A joint distribution needs at least one value." }];
  if (means.length !== n) return [{ path: "means", message: `There are ${n} values and ${means.length} means.` }];
  if (covariance.length !== n || covariance.some((row) => row.length !== n))
    return [{ path: "covariance", message: `The covariance of ${n} values has ${n} rows of ${n} numbers.` }];
  if (covariance.some((row, i) => row.some((value, j) => value !== covariance[j][i])))
    return [{ path: "covariance", message: "A covariance is symmetric: row i, column j equals row j, column i." }];
  const negative = covariance.findIndex((row, i) => !(row[i] > 0));
  if (negative >= 0)
    return [{ path: `covariance[${negative}][${negative}]`, message: "A variance must be more than 0." }];
  if (choleskyOf(covariance) === null) return [{ path: "covariance", message: impossible(covariance) }];
  return [];
}

/** Why no values scatter so: two that go together more closely than fully, else all at once. */
function impossible(covariance: JointInput["covariance"]): string {
  for (let i = 0; i < covariance.length; i++)
    for (let j = 0; j < i; j++) {
      const correlation = covariance[i][j] / Math.sqrt(covariance[i][i] * covariance[j][j]);
      if (Math.abs(correlation) >= 1)
        return `No values scatter like this: a covariance must be positive definite. Value ${i + 1} and value ${j + 1} would correlate by ${correlation.toPrecision(3)}; less than 1 is possible.`;
    }
  return "No values scatter like this: a covariance must be positive definite. Each two of them could stand, all together cannot.";
}

function correlationFaults({ inputs, correlations }: TolerancePlan): Fault[] {
  const single = correlations.flatMap(({ first, second, value }, i) => {
    const path = `correlations[${i}]`;
    const isPair = [first, second].every((at) => at >= 0 && at < inputs.length) && first !== second;
    if (!isPair)
      return [{ path, message: "A correlation joins two of the inputs, by their place in the list from 0." }];
    if (!(Math.abs(value) < 1))
      return [{ path: `${path}.value`, message: `A rank correlation lies between -1 and 1; it is ${value}.` }];
    const isTwice = correlations.findIndex((other) => isSamePair(other, { first, second })) < i;
    return isTwice ? [{ path: `${path}.second`, message: "These two have a correlation already." }] : [];
  });
  if (single.length > 0 || correlations.length === 0) return single;
  if (choleskyOf(scoreCorrelations(correlationMatrix(inputs.length, correlations))) !== null) return [];
  return [{ path: "correlations", message: "These correlations cannot all hold at once." }];
}

type Pair = Pick<RankCorrelation, "first" | "second">;

const isSamePair = (a: Pair, b: Pair): boolean =>
  (a.first === b.first && a.second === b.second) || (a.first === b.second && a.second === b.first);
