import type { SweepAxis, SweepPlan } from "./sweep-plan.ts";

/** The values of an axis in order, both ends exactly as given. */
export function axisValues(axis: SweepAxis): number[] {
  if (axis.spacing === "listed") return [...axis.values];
  const { spacing, from, to, count } = axis;
  const last = count - 1;
  const valueAt = (i: number) =>
    spacing === "log" ? from * (to / from) ** (i / last) : from + ((to - from) * i) / last;
  return Array.from({ length: count }, (_, i) => (i === last ? to : valueAt(i)));
}

/** Cells along each axis; 1 for a second that is not there. */
export function sizesOf({ axes }: SweepPlan): [number, number] {
  const [first, second] = axes.map((axis) => (axis.spacing === "listed" ? axis.values.length : axis.count));
  return [first, second ?? 1];
}

/** How many cells a sweep has; with continuation both ways, those of both branches. */
export function cellCount(plan: SweepPlan): number {
  const [first, second] = sizesOf(plan);
  return first * second * (plan.continuation === "both" ? 2 : 1);
}

/** Where a cell stands: its place along each axis, and whether it belongs to the way down. */
export function cellPlace(plan: SweepPlan, index: number): { places: [number, number]; isDown: boolean } {
  const [first, second] = sizesOf(plan);
  const inBranch = index % (first * second);
  return {
    places: [inBranch % first, Math.floor(inBranch / first)],
    isDown: plan.continuation === "down" || index >= first * second,
  };
}

/** The value of each axis in a cell. */
export function cellValues(plan: SweepPlan, index: number): number[] {
  const { places } = cellPlace(plan, index);
  return plan.axes.map((axis, i) => axisValues(axis)[places[i]]);
}
