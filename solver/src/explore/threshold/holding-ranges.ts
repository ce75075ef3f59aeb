import { variablePaths } from "../../scenario/numeric-fields.ts";
import type { Records, Scenario } from "../../scenario/scenario.ts";
import type { Exploring, RunFigures } from "../asking.ts";
import type { HoldingEnd, HoldingRange } from "./holding-range.ts";
import { longEnough } from "./long-enough.ts";
import { RunCount, runProbes } from "./probes.ts";
import { lineThrough, walkOut, walksOf, type Walked } from "./walk-out.ts";

/** What is worth knowing of every scenario: friction, pressing, damping and feed. */
const usual = [
  /^contact\.law\.(?:static|kinetic)$/,
  /^contact\.normal\.preload$/,
  /^body\.viscous$/,
  /^contact\.counterface\.velocity$/,
  /^base\[\d+\]\.(?:rate|speed)$/,
];
const runsExpected = 100;

/** The fields whose holding range is of interest: those known as ranges, else the usual ones. */
export function holdingPaths(scenario: Scenario): string[] {
  const paths = variablePaths(scenario);
  const known = paths.filter((path) => {
    const origin = Object.hasOwn(scenario.origins, path) ? scenario.origins[path] : {};
    return "low" in origin || "high" in origin;
  });
  return known.length > 0 ? known : paths.filter((path) => usual.some((pattern) => pattern.test(path)));
}

/**
 * How far each of some fields may go alone before the outcome or the verdict of a limit changes, between a tenth and ten
 * times of what is entered. Fields without a range to search (a preload of 0) are left out.
 */
export function* holdingRanges(
  scenario: Scenario,
  paths: readonly string[] = holdingPaths(scenario),
  records?: Records,
): Exploring<HoldingRange[]> {
  const count = new RunCount(runsExpected);
  const asEntered = { ...lineThrough(scenario, "", () => true), scenarioAt: () => longEnough(scenario, records) };
  const [entered] = yield* runProbes([{ line: asEntered, value: NaN }], count);
  if ("reason" in entered.reply) return [];
  const figures = entered.reply;
  const isSame = (other: RunFigures) => changeBetween(figures, other) === null;
  const walks = paths.flatMap((path) => walksOf(scenario, path, lineThrough(scenario, path, isSame, records)));
  const walked = yield* walkOut(walks, entered, count);
  return paths.flatMap((path) =>
    rangeOf(
      walked.filter(({ walk }) => walk.field.path === path),
      figures,
    ),
  );
}

function rangeOf(walked: readonly Walked[], entered: RunFigures): HoldingRange[] {
  if (walked.length === 0) return [];
  const { path, label, dimension, value } = walked[0].walk.field;
  const ends = walked.map((one) => endOf(one, entered));
  const still: HoldingEnd = { value, flip: null, change: null };
  return [
    {
      path,
      label,
      dimension,
      entered: value,
      low: ends.find((end) => end.value < value || (end.flip !== null && end.flip.above.value === value)) ?? still,
      high: ends.find((end) => end.value > value || (end.flip !== null && end.flip.below.value === value)) ?? still,
    },
  ];
}

function endOf({ last, bracket }: Walked, entered: RunFigures): HoldingEnd {
  if (bracket === null) return { value: last.value, flip: null, change: null };
  const { below, above } = bracket;
  const { reply } = below === last ? above : below;
  return {
    value: last.value,
    flip: { below, above },
    change: "reason" in reply ? null : changeBetween(entered, reply),
  };
}

/** What differs between two runs: the outcome, else the first verdict; null where nothing does. */
function changeBetween(entered: RunFigures, other: RunFigures): HoldingEnd["change"] {
  if (entered.outcome !== other.outcome) return { kind: "outcome" };
  const limit = entered.limits.findIndex(({ kept }, i) => kept !== other.limits[i].kept);
  return limit < 0 ? null : { kind: "limit", limit };
}
