import type { Motion } from "../../../format/unit.ts";
import type { Formula } from "../formula/formula.ts";
import { inertias } from "../inertias/index.ts";
import { springs } from "../springs/index.ts";
import { transmissions } from "../transmissions/index.ts";
import type { Transmission } from "../transmissions/transmission.ts";

/** What a chain is made of and how its screen speaks. */
export interface Kit {
  readonly members: readonly Formula[];
  /** Inertias only add up. */
  readonly canStandInSeries: boolean;
  readonly dimension: "stiffness" | "inertia";
  readonly symbol: (motion: Motion) => string;
  /** Heads the column of parts. */
  readonly shareHead: string;
  /** "Nut gives way most: 51 % of the compliance." */
  readonly most: (name: string, share: string) => string;
  readonly empty: string;
}

export const kits: Readonly<Record<"stiffness-chain" | "inertia-sum", Kit>> = {
  "stiffness-chain": {
    members: springs,
    canStandInSeries: true,
    dimension: "stiffness",
    symbol: () => "k",
    shareHead: "of the compliance",
    most: (name, share) => `${name} gives way most: ${share} of the compliance.`,
    empty:
      "Add what the force passes through between the body and what holds it: screw, nut, bearing, belt, shaft, beam.",
  },
  "inertia-sum": {
    members: inertias,
    canStandInSeries: false,
    dimension: "inertia",
    symbol: (motion) => (motion === "linear" ? "m" : "J"),
    shareHead: "of the whole",
    most: (name, share) => `${name} is the most of it: ${share}.`,
    empty: "Add everything that moves with the body: its masses, and behind a screw or gears the rotors.",
  },
};

/** The members that have a place where things move like this. */
export const membersFor = (kit: Kit, motion: Motion): readonly Formula[] =>
  kit.members.filter(({ result }) => result.measure.motion === motion);

/** What parts can stand behind where things move like this. */
export const transmissionsFor = (motion: Motion): readonly Transmission[] =>
  transmissions.filter(({ front }) => front === motion);

export const transmissionOf = (key: string): Transmission | undefined => transmissions.find((each) => each.key === key);

/** How the parts of a group move that itself stands where things move like `front`. */
export const motionBehind = (through: string, front: Motion): Motion => transmissionOf(through)?.behind ?? front;
