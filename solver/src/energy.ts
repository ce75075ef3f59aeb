import { emptyState, type State } from "./motion/state.ts";
import type { IntegrandName } from "./quantities/channels.ts";
import type { Reading } from "./quantities/reading.ts";
import type { Energy } from "./result.ts";
import type { Problem } from "./scenario/problem.ts";

/** Entries of the ledger that are time integrals of a power. */
const powers = {
  workForce: "forcePower",
  workBase: "basePower",
  workWeight: "weightPower",
  workCounterface: "counterfacePower",
  heatContact: "contactHeat",
  heatViscous: "viscousHeat",
  heatSolid: "solidHeat",
} as const satisfies Partial<Record<keyof Energy, IntegrandName>>;

/** The channels the ledger integrates over the whole run. */
export const energyChannels: readonly IntegrandName[] = Object.values(powers);

/**
 * The energy ledger of a run, J: what force, base, weight and counterface put in; what contact, damper and solid damping
 * turn into heat; what motion and spring hold more at the end than at the start. Each entry is worked out on its own, none
 * from the others: the residual, work − heat − change, is what they leave unexplained and tells how well the run was
 * computed. In relative motion (acceleration record) kinetic energy is m ḋ²/2 and workBase −∫ m ÿ ḋ dt.
 */
export function energyOf(reading: Reading): Energy {
  // 0 + keeps an entry that has no part in the run from being −0.
  const integral = (entry: keyof typeof powers) => 0 + reading.whole.integral(powers[entry]);
  const entries = {
    workForce: integral("workForce"),
    workBase: integral("workBase"),
    workWeight: integral("workWeight"),
    workCounterface: integral("workCounterface"),
    heatContact: integral("heatContact"),
    heatViscous: integral("heatViscous"),
    heatSolid: integral("heatSolid"),
    ...changesOf(reading),
  };
  return { ...entries, residual: residualOf(entries) };
}

function changesOf({ problem, motion }: Reading): Pick<Energy, "changeKinetic" | "changeStored"> {
  const [start, end] = [emptyState(), emptyState()];
  motion.read(0, motion.from(0), start);
  motion.read(motion.count - 1, motion.end, end);
  return {
    changeKinetic: (problem.inertia * (end.v - start.v) * (end.v + start.v)) / 2,
    changeStored: stored(problem, end) - stored(problem, start),
  };
}

/** k d²/2 + k3 d⁴/4, J. */
function stored({ stiffness, cubic }: Problem, { d }: State): number {
  return (d * d * (2 * stiffness + cubic * d * d)) / 4;
}

function residualOf(e: Omit<Energy, "residual">): number {
  const work = e.workForce + e.workBase + e.workWeight + e.workCounterface;
  const heat = e.heatContact + e.heatViscous + e.heatSolid;
  return work - heat - (e.changeKinetic + e.changeStored);
}
