import {
  checkSweepPlan,
  defaultLinks,
  type CheckedSweep,
  type Continuation,
  type Fault,
  type Links,
  type QuantityName,
  type Scenario,
} from "@restband/solver";
import { say } from "../../../format/format-quantity.ts";
import { quantityNamed } from "../../../format/quantities.ts";
import type { ExploreField } from "../explore-field.ts";
import { exploreField, exploreFields, likeliestField, rangeAround } from "../explore-field.ts";
import { readTyped, typedOf, type Typed } from "../typed-number.tsx";
import type { Measure } from "../../../format/unit.ts";

export type Spacing = "linear" | "log" | "listed";

/** One field of a sweep as it is typed. */
export interface AxisDraft {
  readonly path: string;
  readonly spacing: Spacing;
  readonly from: Typed;
  readonly to: Typed;
  readonly count: string;
  /** Values with blanks or semicolons between them, in the unit of `from`. */
  readonly list: string;
}

export interface SweepDraft {
  readonly first: AxisDraft;
  readonly second: AxisDraft | null;
  /** The damping follows stiffness and mass so that ζ stays. */
  readonly keepsDampingRatio: boolean;
  /** Where one friction coefficient is varied the other keeps its ratio. */
  readonly keepsFrictionRatio: boolean;
  readonly continuation: Continuation;
  readonly quantities: readonly QuantityName[];
  /** How long each run lasts. */
  readonly seconds: Typed;
}

export const timeMeasure = (scenario: Scenario): Measure => ({ dimension: "time", motion: scenario.motion });

/** Share of a disturbance that is left when its decay is called settled. */
const LEFT = 0.01;
const PERIODS = 40;

/**
 * How long to run each cell unless told otherwise: as the scenario says; past a feed or on a belt until what the start has
 * stirred up is gone, where damping tells how long that is.
 */
export function suggestedSeconds(scenario: Scenario): number {
  const { body, span, base, contact } = scenario;
  const isSliding = base.some(({ kind }) => kind === "ramp") || typeof contact.counterface === "object";
  if (!isSliding || !(body.stiffness > 0)) return span.seconds;
  const omega = Math.sqrt(body.stiffness / body.inertia);
  const decay = body.viscous / (2 * body.inertia);
  const least =
    (2 * Math.PI * PERIODS) / omega + (decay > 0 ? Math.min(-Math.log(LEFT) / decay, (2000 * Math.PI) / omega) : 0);
  const step = 10 ** Math.floor(Math.log10(least));
  return Math.max(span.seconds, step * ([1, 2, 5, 10].find((digit) => digit * step >= least) ?? 10));
}

/** Kept of each cell whatever else is asked: the share of time stuck draws the cell. */
const always: readonly QuantityName[] = ["stickFraction"];
const alsoLikely: readonly QuantityName[] = ["peakVelocity", "amplitude", "slipVelocityPeak"];

/** A sweep to start from: the friction across, what drives the body up. */
export function sweepDraftOf(scenario: Scenario): SweepDraft {
  const fields = exploreFields(scenario);
  const up = likeliestField(fields);
  const frictionAt = (key: string): ExploreField | undefined =>
    fields.find(({ path }) => path === `contact.law.${key}`);
  const friction = frictionAt("kinetic") ?? frictionAt("static");
  const across = friction && friction.path !== up?.path ? friction : (up ?? fields[0]);
  const limits = scenario.limits.flatMap(({ quantity }) => (quantityNamed(quantity) ? [quantity as QuantityName] : []));
  return {
    first: axisDraftOf(across, scenario, usualSpacing(across.path), 16),
    second: up && up.path !== across.path ? axisDraftOf(up, scenario, usualSpacing(up.path), 14) : null,
    keepsDampingRatio: false,
    keepsFrictionRatio: true,
    continuation: "none",
    quantities: [...new Set([...always, ...limits, ...alsoLikely])],
    seconds: typedOf(suggestedSeconds(scenario), timeMeasure(scenario)),
  };
}

/** Frictions, starts and slopes are looked at evenly; what may be many times as much, in equal ratios. */
export const usualSpacing = (path: string): Spacing =>
  /^(contact\.law\.|initial\.|incline)/.test(path) ? "linear" : "log";

export function axisDraftOf(field: ExploreField, scenario: Scenario, spacing: Spacing, count: number): AxisDraft {
  const isFriction = field.path.startsWith("contact.law.") && field.dimension === "none" && field.value <= 1;
  const around = isFriction ? { low: 0.02, high: 0.4 } : rangeAround(field, scenario);
  const low = spacing === "linear" || around.low > 0 || around.high < 0 ? around.low : around.high / 1000;
  return {
    path: field.path,
    spacing: around.low < 0 && around.high > 0 ? "linear" : spacing,
    from: typedOf(low, field.measure),
    to: typedOf(around.high, field.measure),
    count: String(count),
    list: "",
  };
}

/** How long each run lasts, s; or what is wrong with it. What cannot be read is told by its own field. */
export function secondsOf({ seconds }: SweepDraft, scenario: Scenario): { value: number } | { message: string } {
  const read = readTyped(seconds, timeMeasure(scenario));
  if ("message" in read) return read;
  const { maximum = Infinity } = exploreField(scenario, "span.seconds") ?? {};
  if (!(read.value > 0)) return { message: "A run lasts longer than nothing." };
  if (read.value <= maximum) return read;
  return { message: `A run lasts ${say(maximum, timeMeasure(scenario))} at most.` };
}

/** What is typed as a plan, or every fault at its path. Numbers that cannot be read are told by their own field. */
export function planOf(draft: SweepDraft, scenario: Scenario): CheckedSweep {
  const drafts = [draft.first, ...(draft.second ? [draft.second] : [])];
  const axes = drafts.map((axis) => axisOf(axis, scenario));
  const varied = drafts.map(({ path }) => path);
  const unread = drafts.flatMap((axis, i) => unreadOf(axis, scenario, `axes[${i}]`));
  if (unread.length > 0) return { plan: null, faults: unread };
  return checkSweepPlan(
    {
      format: "restband-sweep/1",
      axes,
      links: linksOf(draft, scenario, varied),
      quantities: [...new Set([...always, ...draft.quantities])],
      continuation: draft.continuation,
    },
    scenario,
  );
}

function linksOf(draft: SweepDraft, scenario: Scenario, varied: readonly string[]): Links {
  const ratio = draft.keepsFrictionRatio ? defaultLinks(scenario, varied) : {};
  return draft.keepsDampingRatio && canKeepDampingRatio(draft, scenario)
    ? { ...ratio, "body.viscous": { keep: "dampingRatio" } }
    : ratio;
}

/** Where stiffness or mass is varied and the damping is not. */
export function canKeepDampingRatio({ first, second }: SweepDraft, { body }: Scenario): boolean {
  const varied = [first.path, second?.path];
  const isMoved = varied.includes("body.stiffness") || varied.includes("body.inertia");
  return isMoved && !varied.includes("body.viscous") && body.stiffness > 0 && body.viscous > 0;
}

export const canKeepFrictionRatio = ({ first, second }: SweepDraft, scenario: Scenario): boolean =>
  Object.keys(defaultLinks(scenario, second ? [first.path, second.path] : [first.path])).length > 0;

/** What of an axis cannot be read as numbers at all, each at its field. */
function unreadOf({ path, spacing, from, to, count, list }: AxisDraft, scenario: Scenario, at: string): Fault[] {
  const measure = exploreField(scenario, path)?.measure;
  if (!measure) return [];
  const readings: [string, Typed][] =
    spacing === "listed"
      ? valuesIn(list).map((text) => ["values", { text, unit: from.unit }])
      : [
          ["from", from],
          ["to", to],
        ];
  const faults = readings.flatMap(([member, typed]) => {
    const read = readTyped(typed, measure);
    return "message" in read ? [{ path: `${at}.${member}`, message: read.message }] : [];
  });
  const isCounted = spacing === "listed" || /^\d+$/.test(count.trim());
  return isCounted
    ? faults
    : [...faults, { path: `${at}.count`, message: "How many values? A whole number, 2 or more." }];
}

const valuesIn = (list: string): string[] => list.split(/[\s;]+/).filter((text) => text !== "");

function axisOf(axis: AxisDraft, scenario: Scenario): object {
  const measure = exploreField(scenario, axis.path)?.measure;
  const number = (typed: Typed): number => {
    const read = measure ? readTyped(typed, measure) : { message: "" };
    return "value" in read ? read.value : NaN;
  };
  if (axis.spacing === "listed") {
    const values = valuesIn(axis.list).map((text) => number({ text, unit: axis.from.unit }));
    return { path: axis.path, spacing: "listed", values };
  }
  return {
    path: axis.path,
    spacing: axis.spacing,
    from: number(axis.from),
    to: number(axis.to),
    count: Number(axis.count),
  };
}
