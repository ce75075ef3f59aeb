import { judge } from "./judge.ts";
import { runAdaptive } from "./motion/adaptive/run-adaptive.ts";
import { runExact } from "./motion/exact/run-exact.ts";
import type { Motion } from "./motion/motion.ts";
import { emptyState } from "./motion/state.ts";
import type { Refusal, SimulateOptions } from "./options.ts";
import type { MotionEvent, Result } from "./result.ts";
import { sampleMotion, valuesAt } from "./samples.ts";
import { compileProblem } from "./scenario/compile-problem.ts";
import type { Problem } from "./scenario/problem.ts";
import type { Scenario } from "./scenario/scenario.ts";
import { needsAdaptive } from "./scenario/needs-adaptive.ts";
import { unsupported } from "./scenario/unsupported.ts";
import { solverVersion } from "./version.ts";

const defaultSamples = 2001;

/**
 * Runs a checked scenario (see `checkScenario`) and computes what is asked of it: by the exact method where it applies,
 * else by the adaptive one, unless `options.method` says which.
 *
 * @returns the result, all numbers finite; or a refusal naming the field where this version has no method for it. A run
 * that cannot go on is no refusal: `ended` says why, and the motion so far is returned.
 */
export function simulate(scenario: Scenario, options: SimulateOptions = {}): Result | Refusal {
  const { method = "auto", records } = options;
  const reason = needsAdaptive(scenario);
  const fault = unsupported(scenario, records) ?? (method === "exact" ? reason : null);
  if (fault !== null) return { error: { ...fault, faults: [fault] } };
  const isExact = method === "exact" || (method === "auto" && reason === null);
  return simulateProblem(compileProblem(scenario, records), isExact, options);
}

/**
 * Runs a problem compiled from a checked scenario: what `simulate` does once all is checked, for those who run very many.
 * @param isExact by the exact method, which must apply (see `needsAdaptive`), else by the adaptive one
 */
export function simulateProblem(problem: Problem, isExact: boolean, options: SimulateOptions): Result {
  const { progress, tolerance } = options;
  return describe(isExact ? runExact(problem, progress) : runAdaptive(problem, progress, tolerance), options);
}

/** What a run says, whatever the method that made it. */
function describe(motion: Motion, options: SimulateOptions): Result {
  const judged = judge(motion, { quantities: options.quantities, energy: options.energy ?? true });
  const points = options.samples ?? defaultSamples;
  const result: Result = {
    format: "restband-result/1",
    method: motion.method,
    solverVersion,
    ended: motion.ended,
    ...judged,
    events: options.events === false ? [] : eventsOf(motion),
    samples: points > 0 ? sampleMotion(motion, points) : null,
    ...(options.at === undefined ? {} : { at: valuesAt(motion, options.at) }),
  };
  motion.release();
  return result;
}

function eventsOf(motion: Motion): MotionEvent[] {
  const state = emptyState();
  return motion.events.map(({ t, kind, segment }) => {
    motion.read(segment, t, state);
    return { t, kind, x: state.x, v: state.v, f: state.f };
  });
}
