import {
  checkTolerancePlan,
  type CheckedTolerance,
  type Distribution,
  type QuantityName,
  type Scenario,
} from "@restband/solver";
import { exploreFields, type ExploreField } from "../explore-field.ts";
import { readTyped, typedOf, type Typed } from "../typed-number.tsx";

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
  readonly inputs: readonly InputDraft[];
  /** Rank correlation of the first two inputs; empty for none. */
  readonly correlation: string;
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
    correlation: "",
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

/** What is typed as a plan, or every fault at its path. */
export function studyPlanOf(draft: StudyDraft, scenario: Scenario): CheckedTolerance {
  const fields = exploreFields(scenario);
  const correlation = Number(draft.correlation.replace(",", "."));
  return checkTolerancePlan(
    {
      format: "restband-tolerance/1",
      inputs: draft.inputs.map((input) => ({ path: input.path, distribution: distributionOf(input, fields) })),
      correlations:
        draft.correlation.trim() === "" || draft.inputs.length < 2 ? [] : [{ first: 0, second: 1, value: correlation }],
      joint: [],
      links: {},
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
