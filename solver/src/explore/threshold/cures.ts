import { variablePaths } from "../../scenario/numeric-fields.ts";
import type { Records, Scenario } from "../../scenario/scenario.ts";
import type { Exploring } from "../asking.ts";
import { withValues } from "../links.ts";
import type { Cure, Cures } from "./cure.ts";
import { longEnough } from "./long-enough.ts";
import { isKnownMet, RunCount, runProbes } from "./probes.ts";
import { criticalDamping, lineThrough, linksOf, walkOut, walksOf, type Walked } from "./walk-out.ts";

/** What a designer can change: friction, pressing, damping, spring, mass, and how fast the base or the belt runs. */
const changeable = [
  /^contact\.law\.(?:static|kinetic)$/,
  /^contact\.normal\.preload$/,
  /^body\.(?:viscous|stiffness|inertia)$/,
  /^solid\.lossFactor$/,
  /^contact\.counterface\.velocity$/,
  /^base\[\d+\]\.(?:rate|speed|acceleration)$/,
];
const runsExpected = 200;

/**
 * For a limit that is not kept as entered: what change of one field alone keeps it, for each field a designer can change,
 * the smallest change first. Searched between a tenth and ten times of what is entered.
 *
 * @param limit its place in the scenario; throws RangeError where there is none
 */
export function* curesOf(scenario: Scenario, limit: number, records?: Records): Exploring<Cures> {
  if (scenario.limits[limit] === undefined) throw new RangeError(`this scenario has no limit ${limit}`);
  const paths = variablePaths(scenario).filter((path) => changeable.some((pattern) => pattern.test(path)));
  const lineOf = (path: string) => lineThrough(scenario, path, ({ limits }) => limits[limit].kept, records);
  const walks = paths.flatMap((path) => walksOf(scenario, path, lineOf(path)));
  const count = new RunCount(runsExpected);
  const asEntered = { ...lineOf(""), scenarioAt: () => longEnough(scenario, records) };
  const [entered] = yield* runProbes([{ line: asEntered, value: NaN }], count);
  if (isKnownMet(entered)) return { limit, isBroken: false, cures: [], withoutCure: [] };
  const walked = yield* walkOut(walks, entered, count);
  const cures = paths.flatMap((path) => {
    const own = walked
      .filter(({ walk }) => walk.field.path === path)
      .flatMap((one) => cureOf(scenario, limit, one) ?? []);
    return own.sort((a, b) => a.size - b.size).slice(0, 1);
  });
  return {
    limit,
    isBroken: true,
    cures: cures.sort((a, b) => a.size - b.size),
    withoutCure: paths
      .filter((path) => !cures.some((cure) => cure.path === path))
      .flatMap((path) => searched(path, walked)),
  };
}

function cureOf(scenario: Scenario, limit: number, { walk, bracket }: Walked): Cure | null {
  if (bracket === null) return null;
  const { path, label, dimension, value: entered } = walk.field;
  const { below, above } = bracket;
  const { value, reply } = isKnownMet(below) ? below : above;
  const others = "reason" in reply ? [] : reply.limits.filter((_, i) => i !== limit);
  return {
    path,
    label,
    dimension,
    entered,
    value,
    size: entered === 0 ? value / criticalDamping(scenario) : Math.abs(Math.log(value / entered)),
    flip: { below, above },
    keepsOthers: others.every(({ kept }) => kept === true),
    scenario: withValues(scenario, [[path, value]], linksOf(scenario, path)),
  };
}

function searched(path: string, walked: readonly Walked[]): Cures["withoutCure"] {
  const own = walked.filter(({ walk }) => walk.field.path === path);
  if (own.length === 0) return [];
  const { field } = own[0].walk;
  const values = own.flatMap(({ walk }) => [field.value, ...walk.values]);
  return [{ path, label: field.label, low: Math.min(...values), high: Math.max(...values) }];
}
