import type { Bounds } from "../../field.ts";
import type { QuantityName } from "../../scenario/quantity-names.ts";
import type { Scenario } from "../../scenario/scenario.ts";
import type { Exploring, RunFigures, RunReply } from "../asking.ts";
import { lengthened } from "./long-enough.ts";
import { valueBetween } from "./search-values.ts";
import type { Flip, ThresholdEnd } from "./threshold.ts";

/** One field varied one way: what is run at a value, and whether the run meets what is asked. */
export interface Line {
  /** What is run; or why there is nothing to run at this value. */
  readonly scenarioAt: (value: number) => Scenario | { readonly reason: string };
  /** Null where the run cannot be judged. */
  readonly isMet: (figures: RunFigures) => boolean | null;
  readonly bounds: Bounds;
  /** How wide the whole search is. */
  readonly range: number;
}

/** A value of a line to be run. */
export interface Probe {
  readonly line: Line;
  readonly value: number;
}

/** Two values of a line, the target met at one and not at the other. */
export interface Bracket extends Flip {
  readonly line: Line;
}

/** Counts runs over a whole search. */
export class RunCount {
  done = 0;
  constructor(private expected: number) {}

  get total(): number {
    return Math.max(this.expected, this.done);
  }

  expect(more: number): void {
    this.expected = this.done + more;
  }
}

const noQuantities: readonly QuantityName[] = [];

/** Runs probes as one batch; those that come out too short are run again for longer until they can be judged. */
export function* runProbes(probes: readonly Probe[], count: RunCount): Exploring<ThresholdEnd[]> {
  const made = probes.map(({ line, value }) => line.scenarioAt(value));
  const scenarios = made.map((one) => ("reason" in one ? null : one));
  const replies: RunReply[] = made.map((one) => ("reason" in one ? one : { reason: "" }));
  let open = scenarios.flatMap((scenario, i) => (scenario === null ? [] : [i]));
  while (open.length > 0) {
    const runs = open.map((i) => ({ scenario: scenarios[i] as Scenario, quantities: noQuantities }));
    const answered = yield { runs, done: count.done, total: count.total };
    count.done += runs.length;
    open.forEach((i, k) => (replies[i] = answered[k]));
    open = open.filter((i) => {
      const longer = longerThan(scenarios[i] as Scenario, replies[i]);
      if (longer !== null) scenarios[i] = longer;
      return longer !== null;
    });
  }
  return probes.map(({ line, value }, i) => ({
    value,
    reply: judged(replies[i]),
    isMet: metBy(line, replies[i]),
    scenario: scenarios[i],
  }));
}

const isTooShort = (reply: RunReply): boolean => !("reason" in reply) && reply.outcome === "too-short";

function longerThan(scenario: Scenario, reply: RunReply): Scenario | null {
  if ("reason" in reply || reply.outcome !== "too-short") return null;
  return lengthened(scenario, reply.nextBreakAway ?? 0);
}

/** A run that is too short however long it lasts is not judged. */
function judged(reply: RunReply): RunReply {
  return isTooShort(reply) ? { reason: "The run is too short to be judged, and cannot be made longer." } : reply;
}

function metBy(line: Line, reply: RunReply): boolean | null {
  return "reason" in reply || isTooShort(reply) ? null : line.isMet(reply);
}

/** True where the target is known to be met: what cannot be judged is not. */
export const isKnownMet = ({ isMet }: ThresholdEnd): boolean => isMet === true;

/** The neighbours between which a line's target starts or ceases to be met. @param ends by rising value */
export function bracketsOf(line: Line, ends: readonly ThresholdEnd[]): Bracket[] {
  return ends
    .slice(1)
    .flatMap((above, i) => (isKnownMet(ends[i]) === isKnownMet(above) ? [] : [{ line, below: ends[i], above }]));
}

/** Halves brackets, a run for each at a time, until all are as close as people read numbers. */
export function* refine(brackets: readonly Bracket[], count: RunCount): Exploring<Bracket[]> {
  const all = [...brackets];
  for (;;) {
    const next = all.flatMap((bracket, i) => {
      const value = valueBetween(bracket.below.value, bracket.above.value, bracket.line.range, bracket.line.bounds);
      return value === null ? [] : [{ i, line: bracket.line, value }];
    });
    if (next.length === 0) return all;
    const ends = yield* runProbes(next, count);
    next.forEach(({ i }, k) => {
      const isBelow = isKnownMet(ends[k]) === isKnownMet(all[i].below);
      all[i] = isBelow ? { ...all[i], below: ends[k] } : { ...all[i], above: ends[k] };
    });
  }
}
