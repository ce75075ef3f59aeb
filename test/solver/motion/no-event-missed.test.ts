import fc from "fast-check";
import { expect, test } from "vitest";
import { compileProblem } from "../../../solver/src/scenario/compile-problem.ts";
import { runExact } from "../../../solver/src/motion/exact/run-exact.ts";
import type { Motion } from "../../../solver/src/motion/motion.ts";
import { emptyState, type State } from "../../../solver/src/motion/state.ts";
import { hardScenario } from "../../support/hard-scenario.ts";

const runs = Number(process.env.RESTBAND_PROPERTY_RUNS ?? 400);
const looks = 40;

interface Scale {
  length: number;
  slip: number;
  force: number;
}

/** Largest |v_r| and largest force of the run: what "zero" is measured against. */
function scaleOf(motion: Motion): Scale {
  const state = emptyState();
  const scale = { length: 1e-290, slip: 1e-290, force: 1e-290 };
  for (let i = 0; i < motion.count; i++) {
    for (let n = 0; n <= 10; n++) {
      motion.read(i, motion.from(i) + ((motion.to(i) - motion.from(i)) * n) / 10, state);
      const { problem } = motion;
      const spring = problem.stiffness * Math.abs(state.d) + problem.viscous * Math.abs(state.stretchRate);
      scale.length = Math.max(scale.length, Math.abs(state.x), Math.abs(state.d), Math.abs(state.base));
      scale.slip = Math.max(scale.slip, Math.abs(state.slip), Math.abs(state.baseVelocity), Math.abs(state.v));
      scale.force = Math.max(scale.force, Math.abs(state.f), Math.abs(state.force), spring);
    }
  }
  return scale;
}

/**
 * Brute force: inside every slip v_r keeps its sign, inside every stick friction stays within ±μs N r, wherever one looks;
 * position and velocity go on without a jump from segment to segment. Gives the first fault in words, null without one.
 */
export function faultOf(motion: Motion): string | null {
  const scale = scaleOf(motion);
  const state = emptyState();
  for (let i = 0; i < motion.count; i++) {
    const from = motion.from(i);
    const to = motion.to(i);
    if (!(to >= from)) return `segment ${i} ends before it starts`;
    for (let n = 0; n <= looks; n++) {
      motion.read(i, from + ((to - from) * n) / looks, state);
      const fault = faultAt(motion, state, scale);
      if (fault !== null) return `segment ${i}, look ${n}: ${fault}`;
    }
    const fault = i + 1 < motion.count ? jumpAt(motion, i + 1, state, scale) : null;
    if (fault !== null) return fault;
  }
  return null;
}

function faultAt(motion: Motion, state: State, scale: Scale): string | null {
  const { law, radius } = motion.problem;
  if (!Object.values(state).every(Number.isFinite)) return `not finite: ${JSON.stringify(state)}`;
  const over = Math.abs(state.f) - law.atRest * state.normal * radius;
  if (state.phase === 0 && over > 1e-9 * scale.force) return `friction ${over} N over what can be held`;
  const back = -state.slip * state.phase;
  return back > 1e-9 * scale.slip ? `slips back at ${back} m/s` : null;
}

function jumpAt(motion: Motion, next: number, state: State, scale: Scale): string | null {
  const { x, v } = state;
  motion.read(next, motion.from(next), state);
  if (Math.abs(state.v - v) > 1e-9 * scale.slip) return `ẋ jumps from ${v} to ${state.v} into segment ${next}`;
  // a corner's own time is rounded: what moves then may be off by its speed times that
  const clock = 1e-15 * motion.end * scale.slip;
  const isFar = Math.abs(state.x - x) > 1e-11 * scale.length + clock;
  return isFar ? `x jumps from ${x} to ${state.x} into segment ${next}` : null;
}

test("no event is missed and nothing jumps, wherever one looks", () => {
  fc.assert(
    fc.property(hardScenario, (scenario) => {
      expect(faultOf(runExact(compileProblem(scenario)))).toBeNull();
    }),
    { numRuns: runs, seed: Number(process.env.RESTBAND_SEED ?? 20261201), endOnFailure: true },
  );
}, 300_000);
