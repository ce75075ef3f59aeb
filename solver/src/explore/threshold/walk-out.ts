import { checkScenario } from "../../scenario/check-scenario.ts";
import { numericField, type NumericField } from "../../scenario/numeric-fields.ts";
import type { Records, Scenario } from "../../scenario/scenario.ts";
import type { Exploring, RunFigures } from "../asking.ts";
import { defaultLinks, withValues, type Links } from "../links.ts";
import { longEnough } from "./long-enough.ts";
import { isKnownMet, refine, type Bracket, type Line, type RunCount, runProbes } from "./probes.ts";
import type { ThresholdEnd } from "./threshold.ts";

/** Values of one field from the one entered outwards, the nearest first. */
export interface Walk {
  readonly field: NumericField;
  readonly line: Line;
  readonly values: readonly number[];
}

/** How far a walk went: the last value like the one entered, and where that changes. */
export interface Walked {
  readonly walk: Walk;
  readonly last: ThresholdEnd;
  readonly bracket: Bracket | null;
}

const stepsADecade = 12;
const furthest = 10;
/** Where a damping of 0 begins to count: shares of critical damping. */
const dampingShares = { least: 1e-4, most: 1 };

/**
 * Both ways from the number entered, to a tenth and to ten times of it; a damping of 0 up to the critical one. None of any
 * other 0, which has no size to measure by, and of whole numbers.
 */
export function walksOf(scenario: Scenario, path: string, line: Line): Walk[] {
  const field = numericField(scenario, path);
  if (field === undefined || field.integer) return [];
  return outwards(scenario, field)
    .filter((values) => values.length > 0)
    .map((values) => ({ field, line: { ...line, range: Math.abs(values[values.length - 1] - field.value) }, values }));
}

function outwards(scenario: Scenario, { path, value }: NumericField): number[][] {
  const powers = Array.from({ length: stepsADecade }, (_, i) => furthest ** ((i + 1) / stepsADecade));
  const critical = criticalDamping(scenario);
  if (value !== 0)
    return [powers.map((power) => rounded(value / power)), powers.map((power) => rounded(value * power))];
  if (path !== "body.viscous" || critical === 0) return [];
  const { least, most } = dampingShares;
  const shares = Array.from(
    { length: 2 * stepsADecade + 1 },
    (_, i) => least * (most / least) ** (i / (2 * stepsADecade)),
  );
  return [shares.map((share) => rounded(share * critical))];
}

const rounded = (value: number): number => Number(value.toPrecision(5));

/** 2√(km); 0 without a spring. */
export const criticalDamping = ({ body }: Scenario): number => 2 * Math.sqrt(body.stiffness * body.inertia);

/** What follows a field in a walk: kinetic friction goes alone, static friction takes kinetic along in the ratio entered. */
export const linksOf = (scenario: Scenario, path: string): Links =>
  path === "contact.law.kinetic" ? {} : defaultLinks(scenario, [path]);

/** The line of one field of a scenario, the others as entered. */
export function lineThrough(
  scenario: Scenario,
  path: string,
  isMet: (figures: RunFigures) => boolean | null,
  records?: Records,
): Line {
  return {
    bounds: {},
    range: 0,
    isMet,
    scenarioAt: (value) => {
      const { scenario: moved, faults } = checkScenario(withValues(scenario, [[path, value]], linksOf(scenario, path)));
      return moved === null ? { reason: faults[0].message } : longEnough(moved, records);
    },
  };
}

/** Goes out along all walks a step at a time, each until something differs from `entered`, and halves where it does. */
export function* walkOut(walks: readonly Walk[], entered: ThresholdEnd, count: RunCount): Exploring<Walked[]> {
  const ends = walks.map(({ field }): ThresholdEnd[] => [{ ...entered, value: field.value }]);
  const isOpen = (i: number, step: number) =>
    step < walks[i].values.length && isLike(ends[i][ends[i].length - 1], entered);
  for (let step = 0; walks.some((_, i) => isOpen(i, step)); step++) {
    const open = walks.flatMap((_, i) => (isOpen(i, step) ? [i] : []));
    const found = yield* runProbes(
      open.map((i) => ({ line: walks[i].line, value: walks[i].values[step] })),
      count,
    );
    open.forEach((i, k) => ends[i].push(found[k]));
  }
  const changed = walks.flatMap(({ line }, i) => {
    const [before, last] = ends[i].slice(-2);
    return last === undefined || isLike(last, entered) ? [] : [{ i, bracket: between(line, before, last) }];
  });
  const refined = yield* refine(
    changed.map(({ bracket }) => bracket),
    count,
  );
  return walks.map((walk, i) => {
    const bracket = refined[changed.findIndex((one) => one.i === i)] ?? null;
    const own =
      bracket === null ? ends[i][ends[i].length - 1] : isLike(bracket.below, entered) ? bracket.below : bracket.above;
    return { walk, last: own, bracket };
  });
}

const isLike = (end: ThresholdEnd, entered: ThresholdEnd): boolean => isKnownMet(end) === isKnownMet(entered);

const between = (line: Line, a: ThresholdEnd, b: ThresholdEnd): Bracket =>
  a.value < b.value ? { line, below: a, above: b } : { line, below: b, above: a };
