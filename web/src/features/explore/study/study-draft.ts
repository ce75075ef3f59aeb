import {
  checkTolerancePlan,
  defaultLinks,
  type CheckedTolerance,
  type Distribution,
  type QuantityName,
  type Scenario,
} from "@restband/solver";
import { exploreFields, type ExploreField } from "../explore-field.ts";
import { readTyped, typedOf, type Typed } from "../typed-number.tsx";
import { correlationsOf, stillStanding, type CorrelationDraft } from "./correlation-draft.ts";
import { jointOf, type JointDraft } from "./joint-draft.ts";

export type DistributionKind = Distribution["kind"];

/** The numbers of each distribution, by the names the plan gives them, with what the form calls them. */
export const distributionMembers: Record<DistributionKind, readonly { key: string; label: string }[]> = {
  uniform: [
    { key: "low", label: "from" },
    { key: "high", label: "to" },
  ],
  normal: [
    { key: "mean", label: "mean" },
    { key: "deviation", label: "deviation" },
  ],
  truncated: [
    { key: "mean", label: "mean" },
    { key: "deviation", label: "deviation" },
    { key: "low", label: "cut at" },
    { key: "high", label: "and at" },
  ],
  triangular: [
    { key: "low", label: "from" },
    { key: "likeliest", label: "likeliest" },
    { key: "high", label: "to" },
  ],
};

/** A value that scatters, as it is typed. */
export interface InputDraft {
  readonly path: string;
  readonly kind: DistributionKind;
  /** By the names of `distributionMembers`. */
  readonly numbers: Readonly<Record<string, Typed>>;
}

export interface StudyDraft {
  /** Values that scatter one by one, and the rank correlations among them. */
  readonly inputs: readonly InputDraft[];
  readonly correlations: readonly CorrelationDraft[];
  /** Values that scatter together by a covariance. */
  readonly joint: readonly JointDraft[];
  /** Where one friction coefficient scatters the other keeps its ratio. */
  readonly keepsFrictionRatio: boolean;
  readonly runs: string;
  readonly seed: string;
  readonly sampling: "latin-hypercube" | "random";
  readonly quantities: readonly QuantityName[];
}

/** Half the width of a range nobody has told, as a share of the value. */
const UNTOLD = 0.2;

/** The values known as ranges; where none is, the friction, by a fifth each way. */
export function studyDraftOf(scenario: Scenario): StudyDraft {
  const fields = exploreFields(scenario);
  const known = fields.filter(({ path }) => rangeIn(scenario, path) !== null);
  const friction = fields.filter(({ path }) => path === "contact.law.static" || path === "contact.law.kinetic");
  const chosen = known.length > 0 ? known : friction.length > 0 ? friction : fields.slice(0, 1);
  return {
    inputs: chosen.map((field) => inputDraftOf(field, scenario, "uniform")),
    correlations: [],
    joint: [],
    keepsFrictionRatio: true,
    runs: "2000",
    seed: "1",
    sampling: "latin-hypercube",
    quantities: [],
  };
}

/** The range that the origin of a value tells, SI. */
function rangeIn({ origins }: Scenario, path: string): { low: number; high: number } | null {
  const origin = Object.hasOwn(origins, path) ? origins[path] : null;
  return origin?.low !== undefined && origin.high !== undefined ? { low: origin.low, high: origin.high } : null;
}

export function inputDraftOf(field: ExploreField, scenario: Scenario, kind: DistributionKind): InputDraft {
  const room = Math.abs(field.value) * UNTOLD || 1;
  const { low, high } = rangeIn(scenario, field.path) ?? { low: field.value - room, high: field.value + room };
  const numbers: Record<string, number> = {
    low,
    high,
    mean: (low + high) / 2,
    // Two deviations each way: common practice where a range is told and no distribution.
    deviation: (high - low) / 4,
    likeliest: Math.min(high, Math.max(low, field.value)),
  };
  const members = distributionMembers[kind];
  return {
    path: field.path,
    kind,
    numbers: Object.fromEntries(members.map(({ key }) => [key, typedOf(numbers[key], field.measure)])),
  };
}

/** The paths of all that scatters. */
export const scatteredPaths = ({ inputs, joint }: StudyDraft): string[] => [
  ...inputs.map(({ path }) => path),
  ...joint.flatMap(({ members }) => members.map(({ path }) => path)),
];

/** The draft with other inputs: a correlation whose value scatters no more goes with it. */
export const withInputs = (draft: StudyDraft, inputs: readonly InputDraft[]): StudyDraft => ({
  ...draft,
  inputs,
  correlations: stillStanding(
    draft.correlations,
    inputs.map(({ path }) => path),
  ),
});

export const canKeepFrictionRatio = (draft: StudyDraft, scenario: Scenario): boolean =>
  Object.keys(defaultLinks(scenario, scatteredPaths(draft))).length > 0;

/** What is typed as a plan, or every fault at its path. Numbers that cannot be read are told before all else. */
export function studyPlanOf(draft: StudyDraft, scenario: Scenario): CheckedTolerance {
  const fields = exploreFields(scenario);
  const paths = draft.inputs.map(({ path }) => path);
  const correlated = correlationsOf(draft.correlations, paths);
  const joint = draft.joint.map((each, i) => jointOf(each, fields, `joint[${i}]`));
  const unread = [...correlated.faults, ...joint.flatMap(({ faults }) => faults)];
  if (unread.length > 0) return { plan: null, faults: unread };
  return checkTolerancePlan(
    {
      format: "restband-tolerance/1",
      inputs: draft.inputs.map((input) => ({ path: input.path, distribution: distributionOf(input, fields) })),
      correlations: correlated.correlations,
      joint: joint.map((each) => each.joint),
      links: draft.keepsFrictionRatio ? defaultLinks(scenario, scatteredPaths(draft)) : {},
      seed: wholeOf(draft.seed),
      runs: wholeOf(draft.runs),
      sampling: draft.sampling,
      quantities: draft.quantities,
    },
    scenario,
  );
}

function distributionOf({ path, kind, numbers }: InputDraft, fields: readonly ExploreField[]): object {
  const measure = fields.find((field) => field.path === path)?.measure;
  const entries = Object.entries(numbers).map(([key, typed]) => {
    const read = measure ? readTyped(typed, measure) : { message: "" };
    return [key, "value" in read ? read.value : NaN] as const;
  });
  return { kind, ...Object.fromEntries(entries) };
}

const wholeOf = (text: string): number => (/^-?\d+$/.test(text.trim()) ? Number(text) : NaN);
