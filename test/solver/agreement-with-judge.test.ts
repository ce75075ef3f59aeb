import { simulate, type MotionEvent, type Result, type Scenario } from "@restband/solver";
import { describe, expect, test } from "vitest";
import { judge, type JudgedRun } from "../support/judge.ts";
import { driveNames, randomScenario } from "../support/random-scenario.ts";

/*
 * 300 drawn scenarios of every kind the exact method covers, each run by the solver and by the judge at h, h/2 and h/4. Where
 * the judge agrees with itself, outcome and events must be the same; and the judge must come closer to the solver as its step
 * shrinks.
 */

const each = 12;
const instants = 199;

interface Comparison {
  seed: number;
  /** Whether the judge's three runs have one outcome and the same events. */
  isClear: boolean;
  judged: string;
  solved: string;
  /** The largest |x| apart at the instants, over the run's largest |x|, at h, h/2 and h/4. */
  distances: number[];
}

function compare(seed: number): Comparison {
  const scenario = randomScenario(seed);
  const { seconds } = scenario.span;
  const at = Array.from({ length: instants }, (_, i) => (seconds * (i + 1)) / (instants + 1));
  const result = solve(scenario, at);
  const h = stepFor(scenario);
  const runs = [h, h / 2, h / 4].map((step) => judge(scenario, step, at));
  const accounts = runs.map(({ outcome, events }) => account(outcome, events));
  const size = runs[2].x.reduce((most, x) => Math.max(most, Math.abs(x)), 0) || 1;
  return {
    seed,
    isClear: accounts.every((one) => one === accounts[2]),
    judged: accounts[2],
    solved: account(result.outcome, result.events),
    distances: runs.map((run) => Math.max(...positions(run, at).map((x, i) => Math.abs(x - result.at!.x[i]))) / size),
  };
}

function solve(scenario: Scenario, at: number[]): Result {
  const result = simulate(scenario, { samples: 0, at });
  if ("error" in result) throw new Error(`${result.error.path}: ${result.error.message}`);
  return result;
}

/** A five-hundredth of the shortest period in play, s. */
function stepFor({ body, force, base }: Scenario): number {
  const natural = Math.sqrt(body.stiffness / body.inertia) / (2 * Math.PI);
  return 1 / Math.max(natural, ...[...force, ...base].map((term) => ("hz" in term ? term.hz : 0))) / 500;
}

const account = (outcome: string | null, events: readonly Pick<MotionEvent, "kind">[]): string =>
  [outcome, ...events.map(({ kind }) => kind).filter((kind) => kind !== "start" && kind !== "end")].join(" ");

function positions({ t, x }: JudgedRun, at: number[]): number[] {
  const found: number[] = [];
  for (let i = 0; found.length < at.length; i++) if (t[i] === at[found.length]) found.push(x[i]);
  return found;
}

const comparisons = driveNames.flatMap((name, kind) =>
  Array.from({ length: each }, (_, i) => ({ name, ...compare(kind + i * driveNames.length) })),
);

describe("the solver and the judge", () => {
  test.each(driveNames)("see the same outcome and events: %s", (name) => {
    const clear = comparisons.filter((one) => one.name === name && one.isClear);
    expect(clear.length).toBeGreaterThanOrEqual(each / 2);
    for (const { seed, judged, solved } of clear) expect(`${seed}: ${solved}`).toBe(`${seed}: ${judged}`);
  });

  test("are 300 comparisons of 25 kinds, few of them unclear to the judge", () => {
    expect(comparisons).toHaveLength(300);
    expect(comparisons.filter(({ isClear }) => isClear).length).toBeGreaterThanOrEqual(280);
  });

  test("come together as the judge's step shrinks, with its first power or faster", () => {
    const moving = comparisons.filter(({ isClear, distances }) => isClear && distances[0] > 1e-9);
    const gains = moving.map(({ distances }) => Math.log2(distances[0] / distances[2]) / 2);
    expect(gains.reduce((sum, gain) => sum + gain, 0) / gains.length).toBeGreaterThan(1);
    for (const { seed, distances } of moving) expect(distances[2], `seed ${seed}`).toBeLessThan(0.01);
  });
});
