import type { Motion } from "../../format/unit.ts";

export type ReckoningKey =
  | "friction-pairs"
  | "loss-factors"
  | "loss-from-decay"
  | "stiffness-chain"
  | "inertia-sum"
  | "damping"
  | "bolts"
  | "band-brake";

/** A way to a value that is on no data sheet: a table to look it up in, or a sheet to work it out on. */
export interface Reckoning {
  readonly key: ReckoningKey;
  /** Heads the dialog. */
  readonly title: string;
  /** What the link to it says, beside the value. */
  readonly link: string;
  readonly paths: readonly string[];
  /** The kinds of body it is for; absent: both. */
  readonly motion?: Motion;
}

const reckonings: readonly Reckoning[] = [
  {
    key: "friction-pairs",
    title: "Friction of common pairs",
    link: "look it up",
    paths: ["contact.law.static", "contact.law.kinetic"],
  },
  { key: "stiffness-chain", title: "Stiffness of a chain of members", link: "work it out", paths: ["body.stiffness"] },
  { key: "inertia-sum", title: "Everything that moves", link: "work it out", paths: ["body.inertia"] },
  { key: "damping", title: "Damping", link: "work it out", paths: ["body.viscous"] },
  { key: "loss-factors", title: "Loss factors of materials", link: "look it up", paths: ["solid.lossFactor"] },
  {
    key: "loss-from-decay",
    title: "Loss factor from a decay",
    link: "work it out from a decay",
    paths: ["solid.lossFactor"],
  },
  { key: "bolts", title: "Pressing force of bolts", link: "work it out from bolts", paths: ["contact.normal.preload"] },
  {
    key: "band-brake",
    title: "Band brake as a pad",
    link: "work it out from a band brake",
    paths: ["contact.normal.preload"],
    motion: "angular",
  },
];

/** The reckonings that lead to the value at a path of a scenario, for a body of this kind; none for most. */
export const reckoningsFor = (path: string, motion: Motion): readonly Reckoning[] =>
  reckonings.filter(
    (reckoning) => reckoning.paths.includes(path) && (reckoning.motion === undefined || reckoning.motion === motion),
  );
