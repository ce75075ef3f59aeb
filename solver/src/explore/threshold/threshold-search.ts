import { checkScenario } from "../../scenario/check-scenario.ts";
import { numericField } from "../../scenario/numeric-fields.ts";
import type { Records } from "../../scenario/scenario.ts";
import type { Exploring, RunFigures } from "../asking.ts";
import { defaultLinks, withValues } from "../links.ts";
import { analyticThresholds } from "./analytic-thresholds.ts";
import { longEnough, wholePeriodsLong } from "./long-enough.ts";
import { bracketsOf, isKnownMet, refine, RunCount, runProbes, type Line } from "./probes.ts";
import { scanValues } from "./search-values.ts";
import { startedFrom, startsFor } from "./starts.ts";
import type { Flip, StartedSearch, StartKind, Target, Threshold, ThresholdQuestion } from "./threshold.ts";

const defaultPoints = 24;
/** Halvings of a bracket, as a rule, from the coarse scan to five digits. */
const halvings = 14;

/**
 * Searches the values of a field from which on a target is met: a coarse scan, then every flip found is halved to five
 * digits, both ends run. Outcomes are searched from each start there is (see `startsFor`), limits from the scenario's own.
 *
 * Throws RangeError where the path names no number of the scenario, or low is not below high.
 */
export function* thresholdSearch(question: ThresholdQuestion, records?: Records): Exploring<Threshold> {
  const { scenario, path, low, high, target, points = defaultPoints } = question;
  const field = numericField(scenario, path);
  if (field === undefined) throw new RangeError(`this scenario has no number called ${JSON.stringify(path)}`);
  if (!(low < high)) throw new RangeError(`a search goes from a lower to a higher value, not from ${low} to ${high}`);
  const values = scanValues(low, high, points, field);
  const starts: StartKind[] = target.kind === "outcome" ? startsFor(scenario, path, records) : ["scenario"];
  const lines = starts.map((start) => lineOf(question, start, records));
  const count = new RunCount(starts.length * (values.length + halvings));
  const ends = yield* runProbes(
    lines.flatMap((line) => values.map((value) => ({ line, value }))),
    count,
  );
  const scans = lines.map((_, i) => ends.slice(i * values.length, (i + 1) * values.length));
  const brackets = lines.flatMap((line, i) => bracketsOf(line, scans[i]));
  count.expect(brackets.length * halvings);
  const refined = yield* refine(brackets, count);
  const searches = starts.map((start, i): StartedSearch => ({
    start,
    flips: refined.filter(({ line }) => line === lines[i]).map(({ below, above }) => ({ below, above })),
    low: scans[i][0],
    high: scans[i][values.length - 1],
  }));
  const found = { path, label: field.label, dimension: field.dimension, searches, ...answerOf(searches) };
  return { ...found, analytic: analyticThresholds(question, searches, records) };
}

function lineOf(question: ThresholdQuestion, start: StartKind, records: Records | undefined): Line {
  const { scenario, path, low, high, target, links = defaultLinks(scenario, [path]) } = question;
  const field = numericField(scenario, path);
  const isFed = startsFor(scenario, path, records).includes("steady-sliding");
  return {
    bounds: field ?? {},
    range: high - low,
    isMet: (figures) => isMet(isFed ? withGrowth(target) : target, figures),
    scenarioAt: (value) => {
      const { scenario: moved, faults } = checkScenario(withValues(scenario, [[path, value]], links));
      if (moved === null) return { reason: faults[0].message };
      const started = startedFrom(moved, start, records);
      if (started === null) return { reason: "There is no steady sliding at this value." };
      const lasting = longEnough(started, records);
      return start === "steady-sliding" ? wholePeriodsLong(lasting) : lasting;
    },
  };
}

/** Under a feed or on a belt a swing that grows is stick–slip to come: who wants none wants no growth either. */
function withGrowth(target: Target): Target {
  if (target.kind !== "outcome" || !target.outcomes.includes("stick-slip")) return target;
  return { ...target, outcomes: [...target.outcomes, "growing"] };
}

/** Whether a run meets a target; null where it cannot be judged. */
function isMet(target: Target, { outcome, limits }: RunFigures): boolean | null {
  if (target.kind === "outcome") return outcome === null ? null : target.outcomes.includes(outcome) === target.isWanted;
  if (target.kind === "limit") return limits[target.limit].kept;
  if (limits.some(({ kept }) => kept === false)) return false;
  return limits.some(({ kept }) => kept === null) ? null : true;
}

type Answer = Pick<Threshold, "answer" | "safeSide" | "dependsOnStart" | "outOfReach">;

function answerOf(searches: readonly StartedSearch[]): Answer {
  const nothing = { answer: null, safeSide: null } as const;
  if (searches.every(({ flips }) => flips.length === 0)) {
    const met = searches.map(({ low }) => isKnownMet(low));
    const outOfReach = met.every(Boolean) ? "met-everywhere" : met.some(Boolean) ? null : "met-nowhere";
    return { ...nothing, dependsOnStart: outOfReach === null, outOfReach };
  }
  const side = searches.every(({ high }) => isKnownMet(high))
    ? "above"
    : searches.every(({ low }) => isKnownMet(low))
      ? "below"
      : null;
  if (side === null) return { ...nothing, dependsOnStart: searches.length > 1, outOfReach: null };
  const own = searches.map(({ flips }) => (side === "above" ? flips.at(-1) : flips[0]));
  const flips = own.filter((flip) => flip !== undefined);
  const answer = flips.reduce((safest, flip) => (isSafer(flip, safest, side) ? flip : safest));
  const dependsOnStart = own.some((flip) => flip === undefined || !isClose(flip[side].value, answer[side].value));
  return { answer, safeSide: side, dependsOnStart, outOfReach: null };
}

const isSafer = (flip: Flip, than: Flip, side: "above" | "below"): boolean =>
  side === "above" ? flip.above.value > than.above.value : flip.below.value < than.below.value;

const isClose = (a: number, b: number): boolean => Math.abs(a - b) <= 2e-4 * Math.max(Math.abs(a), Math.abs(b));
