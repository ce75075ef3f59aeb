import type { Motion } from "../motion/motion.ts";
import { survey, type Channel, type Survey } from "../motion/survey.ts";
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

const frictionPower = ({ f, slip }: State) => -f * slip;

const square = (channel: Channel): Channel => {
  return (s) => channel(s) ** 2;
};

/** Channels of which extremes are read (and integrals), as functions of the state of one problem; SI. A new one is one line. */
export function channelsOf(problem: Problem) {
  return {
    displacement: (s: State) => s.x,
    velocity: (s: State) => s.v,
    acceleration: (s: State) => s.a,
    /** d. */
    deflection: (s: State) => s.d,
    /** x, or d where the base feeds: what amplitude, mean and trend are told of. */
    excursion: isFed(problem) ? (s: State) => s.d : (s: State) => s.x,
    /** v_r. */
    slip: (s: State) => s.slip,
    driveForce: driveForce(problem),
    transmittedForce: transmittedForce(problem),
    holdShare: holdShare(problem),
    /** −f v_r: what the contact turns into heat. */
    frictionPower,
  } as const satisfies Record<string, Channel>;
}

/** Channels of which only integrals and means are read: squares, rates of travel, powers. A new one is one line. */
export function integrandsOf(problem: Problem) {
  return {
    deflectionSquared: (s: State) => s.d * s.d,
    driveForceSquared: square(driveForce(problem)),
    /** |v_r|, and v_r. */
    slipSpeed: (s: State) => Math.abs(s.slip),
    drift: (s: State) => s.slip,
    forcePower: (s: State) => s.force * s.v,
    basePower: basePower(problem),
    weightPower: (s: State) => problem.weight * s.v,
    counterfacePower: (s: State) => s.f * s.counterfaceVelocity,
    contactHeat: frictionPower,
    viscousHeat: (s: State) => problem.viscous * s.stretchRate * s.stretchRate,
    solidHeat: (s: State) => s.solid * s.stretchRate,
  } as const satisfies Record<string, Channel>;
}

export type ChannelName = keyof ReturnType<typeof channelsOf>;
export type IntegrandName = keyof ReturnType<typeof integrandsOf>;
/** Any channel: of an integrand only integral and mean can be asked. */
export type AnyChannel = ChannelName | IntegrandName;

/** The channels of one problem by name. */
export class Channels {
  private readonly extremal: Readonly<Record<string, Channel>>;
  private readonly integrable: Readonly<Record<string, Channel>>;

  constructor(problem: Problem) {
    this.extremal = channelsOf(problem);
    this.integrable = integrandsOf(problem);
  }

  of(name: AnyChannel): Channel {
    return this.extremal[name] ?? this.integrable[name];
  }

  /** One pass over the window for all the names; ask the survey with the functions of `of`. */
  survey(motion: Motion, from: number, to: number, names: readonly AnyChannel[]): Survey {
    const those = (among: Readonly<Record<string, Channel>>) => names.flatMap((name) => among[name] ?? []);
    return survey(motion, from, to, those(this.extremal), those(this.integrable));
  }
}
