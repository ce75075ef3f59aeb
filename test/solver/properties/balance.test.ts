import fc from "fast-check";
import { compileProblem, needsAdaptive, type Energy, type Scenario } from "@restband/solver";
import { expect, test } from "vitest";
import { energyChannels } from "../../../solver/src/energy.ts";
import { judge, type Judgement } from "../../../solver/src/judge.ts";
import { runAdaptive } from "../../../solver/src/motion/adaptive/run-adaptive.ts";
import { runExact } from "../../../solver/src/motion/exact/run-exact.ts";
import type { Motion } from "../../../solver/src/motion/motion.ts";
import { emptyState, type State } from "../../../solver/src/motion/state.ts";
import { survey } from "../../../solver/src/motion/survey.ts";
import { integrandsOf } from "../../../solver/src/quantities/channels.ts";
import { anyScenario } from "../../support/any-scenario.ts";
import { largestOf } from "../../support/ledger.ts";
import { propertyRuns, propertyTimeout } from "../../support/property-runs.ts";

const shareOf = ({ method }: Motion): number => (method === "exact" ? 2 ** -50 : 1e-9);
const ends = ["rest", "time", "max-events", "max-work"];

function motionOf(scenario: Scenario): Motion {
  const problem = compileProblem(scenario);
  return needsAdaptive(scenario) === null ? runExact(problem) : runAdaptive(problem);
}

/** What the contact has turned into heat by the end of each segment, J, and the most heat that any has had to do with. */
function heats(motion: Motion): { sofar: number; gross: number }[] {
  const heat = ({ f, slip }: State): number => -f * slip;
  const told: { sofar: number; gross: number }[] = [];
  let [sofar, gross] = [0, 0];
  for (let i = 0; i < motion.count; i++) {
    const { integral, gross: size } = piece(motion, i, heat);
    sofar += integral;
    gross += size;
    told.push({ sofar, gross });
  }
  return told;
}

function piece(motion: Motion, i: number, heat: (state: State) => number): { integral: number; gross: number } {
  const [from, to] = [motion.from(i), motion.to(i)];
  if (!(to > from)) return { integral: 0, gross: 0 };
  // a hair inside, so that only this segment is gone over
  const inside = survey(motion, from, from + (to - from) * (1 - 1e-12), [], [heat]);
  return { integral: inside.integral(heat), gross: inside.gross(heat) };
}

/** The first fault in words, null without one. */
function dissipationFault(motion: Motion): string | null {
  const told = heats(motion);
  const nothing = leftOpen(motion, shareOf(motion));
  for (const [i, { sofar, gross }] of told.entries()) {
    const before = i > 0 ? told[i - 1].sofar : 0;
    // bristles give back what they have stored, never more: all they took so far counts
    const gained = motion.problem.law.bristle === undefined ? sofar - before : sofar;
    if (gained < -1e-9 * gross - nothing) return `segment ${i}: the contact gives ${-gained} J of ${gross}`;
  }
  return null;
}

function finiteFault(motion: Motion, { quantities, energy }: Judgement): string | null {
  const state = emptyState();
  for (let i = 0; i < motion.count; i++) {
    for (const share of [0, 0.5, 1]) {
      motion.read(i, motion.from(i) + share * (motion.to(i) - motion.from(i)), state);
      if (!Object.values(state).every(Number.isFinite)) return `segment ${i}: ${JSON.stringify(state)}`;
    }
  }
  const numbers = [...Object.values(quantities), ...Object.values<number>({ ...energy })];
  return numbers.every((one) => one === null || Number.isFinite(one)) ? null : "a quantity is not finite";
}

/**
 * To §7's share of the largest entry, and of all that has come and gone what the method leaves of each swing: rounding of the
 * clock, or the tolerance of a step. What is tiny beside its base or its grip is known to a share of those only.
 */
function ledgerFault(motion: Motion, energy: Energy): string | null {
  const channels = integrandsOf(motion.problem);
  const powers = energyChannels.map((name) => channels[name]);
  const told = survey(motion, 0, motion.end, [], powers);
  const moved = powers.reduce((sum, power) => sum + told.gross(power), heldAtStart(motion));
  if (motion.ended === "max-work") return null; // a softening spring has let the body run away
  const [share, swing] = motion.method === "exact" ? [1e-9, 1e-11] : [1e-6, 1e-8];
  const allowed = share * largestOf(energy) + swing * moved + leftOpen(motion, shareOf(motion));
  return Math.abs(energy.residual) <= allowed ? null : `residual ${energy.residual}, allowed ${allowed}`;
}

/** The energies that v = ḋ + ẏ and f leave open, each known to a share of the larger part, J. */
function leftOpen(motion: Motion, share: number): number {
  const state = emptyState();
  let [own, base, grip] = [0, 0, 0];
  for (let i = 0; i < motion.count; i++) {
    for (const place of [0, 0.3, 0.5, 0.8, 1]) {
      motion.read(i, motion.from(i) + place * (motion.to(i) - motion.from(i)), state);
      own = Math.max(own, Math.abs(state.v));
      base = Math.max(base, Math.abs(state.baseVelocity));
      grip = Math.max(grip, motion.problem.law.atRest * motion.problem.radius * state.normal);
    }
  }
  const { inertia } = motion.problem;
  // the speed that the grip alone would give in the time the motion takes: what an integrated v_r is kept to a share of
  if (motion.method === "adaptive") own += (grip * motion.end) / (25 * inertia);
  return share * own * (inertia * base + grip * motion.end) + inertia * (share * base) ** 2;
}

/** m v²/2 + k d²/2, J. */
function heldAtStart(motion: Motion): number {
  const { inertia, stiffness } = motion.problem;
  const state = emptyState();
  motion.read(0, 0, state);
  return (inertia * state.v ** 2 + stiffness * state.d ** 2) / 2;
}

function faultOf(scenario: Scenario): string | null {
  const motion = motionOf(scenario);
  if (!ends.includes(motion.ended)) return `ended by ${motion.ended}`;
  if (motion.events.length - 2 > scenario.span.maxEvents + 1) return `${motion.events.length} events`;
  if (motion.ended === "time" && motion.end !== scenario.span.seconds) return `ended at ${motion.end}`;
  const judged = judge(motion, { energy: true });
  return finiteFault(motion, judged) ?? dissipationFault(motion) ?? ledgerFault(motion, judged.energy!);
}

test(
  "every run ends within its caps, in finite numbers; friction never gives energy; the ledger closes",
  () => {
    fc.assert(
      fc.property(anyScenario, (scenario) => {
        expect(faultOf(scenario)).toBeNull();
      }),
      propertyRuns,
    );
  },
  propertyTimeout,
);
