import type { Fault, JointInput } from "@restband/solver";
import { formatExactly } from "../../../format/format-number.ts";
import { parseNumber } from "../../../format/parse-number.ts";
import { toSi, type Unit } from "../../../format/unit.ts";
import { unitByLabel, unitFor } from "../../../format/units.ts";
import type { ExploreField } from "../explore-field.ts";
import { readTyped, typedOf, type Typed } from "../typed-number.tsx";
import type { FitReading } from "./fit-reading.ts";

/** Values that scatter together, as they are typed. */
export interface JointDraft {
  readonly members: readonly { readonly path: string; readonly mean: Typed }[];
  /** How their scatter is told: by deviations and correlations, or by the covariance itself. */
  readonly form: "correlations" | "covariance";
  /** The lower half of the matrix, row i with i + 1 entries, in the units of the means; on its diagonal deviations or variances. */
  readonly entries: readonly (readonly string[])[];
  readonly source: string;
}

/** Share of the value that a deviation starts from. */
const UNTOLD = 0.05;

/** Two or more values about what is entered, each by a twentieth, not yet correlated. */
export const jointDraftOf = (fields: readonly ExploreField[]): JointDraft => ({
  members: fields.map((field) => ({ path: field.path, mean: typedOf(field.value, field.measure) })),
  form: "correlations",
  entries: fields.map((field, i) => rowOf(field, i)),
  source: "",
});

function rowOf(field: ExploreField, i: number): string[] {
  const { factor } = unitFor(field.value, field.measure);
  const deviation = (Math.abs(field.value) * UNTOLD) / factor || 1;
  return [...Array.from({ length: i }, () => "0"), formatExactly(Number(deviation.toPrecision(3)))];
}

export const withMember = (draft: JointDraft, field: ExploreField): JointDraft => ({
  ...draft,
  members: [...draft.members, { path: field.path, mean: typedOf(field.value, field.measure) }],
  entries: [...draft.entries, rowOf(field, draft.members.length)],
});

export const withoutMember = (draft: JointDraft, at: number): JointDraft => ({
  ...draft,
  members: draft.members.filter((_, i) => i !== at),
  entries: draft.entries.flatMap((row, i) => (i === at ? [] : [row.filter((_, j) => j !== at)])),
});

export const withEntry = (draft: JointDraft, [i, j]: readonly [number, number], text: string): JointDraft => ({
  ...draft,
  entries: draft.entries.map((row, k) => (k === i ? row.map((each, l) => (l === j ? text : each)) : row)),
});

/** The same scatter told the other way; entries that cannot be read stay as they are typed. */
export function withForm(draft: JointDraft, form: JointDraft["form"]): JointDraft {
  const read = draft.entries.map((row) => row.map((text) => parseNumber(text.trim())));
  const numbers = read.map((row) => row.map((each) => (each && "value" in each ? each.value : NaN)));
  if (form === draft.form || numbers.flat().some(Number.isNaN)) return { ...draft, form };
  const deviations = numbers.map((row, i) => (draft.form === "covariance" ? Math.sqrt(row[i]) : row[i]));
  const entries = numbers.map((row, i) =>
    row.map((value, j) => {
      const product = deviations[i] * deviations[j];
      const other =
        form === "covariance" ? (i === j ? product : value * product) : i === j ? deviations[i] : value / product;
      return Number.isFinite(other) ? formatExactly(Number(other.toPrecision(9))) : draft.entries[i][j];
    }),
  );
  return { ...draft, form, entries };
}

/** The same draft with what a fit found. A fit of a measurement comes in here, typed, pasted or by itself. */
export const withFit = (draft: JointDraft, { estimates, covariance }: FitReading): JointDraft => ({
  ...draft,
  form: "covariance",
  members: draft.members.map(({ path, mean }, i) => ({ path, mean: { ...mean, text: formatExactly(estimates[i]) } })),
  entries: draft.entries.map((row, i) => row.map((_, j) => formatExactly(covariance[i][j]))),
});

/** What is typed as a joint input; `faults` where a number cannot be read, each below `at`. */
export function jointOf(
  draft: JointDraft,
  fields: readonly ExploreField[],
  at: string,
): { joint: JointInput; faults: Fault[] } {
  const faults: Fault[] = [];
  const means = draft.members.map(({ path, mean }, i) => {
    const field = fields.find((each) => each.path === path);
    const read = field ? readTyped(mean, field.measure) : { message: "" };
    if ("value" in read) return read.value;
    faults.push({ path: `${at}.means[${i}]`, message: read.message });
    return NaN;
  });
  const entries = draft.entries.map((row, i) =>
    row.map((text, j) => {
      const read = entryOf(text, draft.form, i === j);
      if ("value" in read) return read.value;
      faults.push({ path: `${at}.covariance[${i}][${j}]`, message: read.message });
      return NaN;
    }),
  );
  const factors = draft.members.map((member) => toSi(1, unitOf(member, fields)));
  const source = draft.source.trim();
  const joint = {
    paths: draft.members.map(({ path }) => path),
    means,
    covariance: covarianceOf(entries, draft.form, factors),
    ...(source === "" ? {} : { source }),
  };
  return { joint, faults };
}

function entryOf(text: string, form: JointDraft["form"], isDiagonal: boolean): { value: number } | { message: string } {
  const read = parseNumber(text.trim());
  if (!read || !("value" in read)) return { message: text.trim() === "" ? "A number is missing." : "Not a number." };
  if (form === "covariance") return read;
  if (isDiagonal) return read.value > 0 ? read : { message: "More than 0." };
  return Math.abs(read.value) < 1 ? read : { message: "Between −1 and 1." };
}

/** The whole matrix in SI. */
function covarianceOf(
  entries: readonly (readonly number[])[],
  form: JointDraft["form"],
  factors: readonly number[],
): number[][] {
  const half = (i: number, j: number): number => {
    const entry = entries[i][j];
    const inUnits = form === "covariance" ? entry : i === j ? entry * entry : entry * entries[i][i] * entries[j][j];
    return inUnits * factors[i] * factors[j];
  };
  return entries.map((_, i) => entries.map((__, j) => (i >= j ? half(i, j) : half(j, i))));
}

export function unitOf({ path, mean }: JointDraft["members"][number], fields: readonly ExploreField[]): Unit {
  const measure = fields.find((each) => each.path === path)?.measure ?? { dimension: "none", motion: "linear" };
  return unitByLabel(measure, mean.unit) ?? unitFor(0, measure);
}
