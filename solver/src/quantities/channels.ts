import type { Channel } from "../motion/survey.ts";
import type { State } from "../motion/state.ts";
import type { Problem } from "../scenario/problem.ts";
import { isFed } from "./drive.ts";

/** The force of spring, damper and solid damping between base and body, N: k d + k3 d³ + c ḋ + S. */
const driveForce = ({ stiffness, cubic, viscous }: Problem) => {
  return ({ d, stretchRate, solid }: State) => (stiffness + cubic * d * d) * d + viscous * stretchRate + solid;
};

/** What crosses the mount: k d + k3 d³ + (c + c_h) ḋ, N. */
const transmittedForce = ({ stiffness, cubic, viscous, solid }: Problem) => {
  const damping = viscous + solid.viscous;
  return ({ d, stretchRate }: State) => (stiffness + cubic * d * d) * d + damping * stretchRate;
};

/** |needed f|/(μs N r) while stuck; −1 while slipping and where there is nothing to hold with. */
const holdShare = ({ law, radius }: Problem) => {
  const grip = law.atRest * radius;
  return ({ phase, f, normal }: State) => (phase === 0 && grip * normal > 0 ? Math.abs(f) / (grip * normal) : -1);
};

/** What the base puts in, W: −(drive force)·ẏ; in relative motion −m ÿ ḋ. */
const basePower = (problem: Problem): Channel => {
  if (problem.isRelative) return (s) => -problem.inertia * s.baseAcceleration * s.stretchRate;
  const force = driveForce(problem);
  return (s) => -force(s) * s.baseVelocity;
};

const square = (channel: Channel): Channel => {
  return (s) => channel(s) ** 2;
};

/** The channels quantities and the ledger read, as functions of the state of one problem; SI. A new one is one line here. */
export function channelsOf(problem: Problem) {
  return {
    displacement: (s: State) => s.x,
    velocity: (s: State) => s.v,
    acceleration: (s: State) => s.a,
    /** d. */
    deflection: (s: State) => s.d,
    deflectionSquared: (s: State) => s.d * s.d,
    /** x, or d where the base feeds: what amplitude, mean and trend are told of. */
    excursion: isFed(problem) ? (s: State) => s.d : (s: State) => s.x,
    /** v_r, and |v_r|. */
    slip: (s: State) => s.slip,
    slipSpeed: (s: State) => Math.abs(s.slip),
    /** y. */
    base: (s: State) => s.base,
    driveForce: driveForce(problem),
    driveForceSquared: square(driveForce(problem)),
    transmittedForce: transmittedForce(problem),
    holdShare: holdShare(problem),
    forcePower: (s: State) => s.force * s.v,
    basePower: basePower(problem),
    weightPower: (s: State) => problem.weight * s.v,
    counterfacePower: (s: State) => s.f * s.counterfaceVelocity,
    /** −f v_r: what the contact turns into heat. */
    frictionPower: (s: State) => -s.f * s.slip,
    viscousPower: (s: State) => problem.viscous * s.stretchRate * s.stretchRate,
    solidPower: (s: State) => s.solid * s.stretchRate,
  } as const satisfies Record<string, Channel>;
}

export type Channels = ReturnType<typeof channelsOf>;
export type ChannelName = keyof Channels;
