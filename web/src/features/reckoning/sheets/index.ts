import type { Motion } from "../../../format/unit.ts";
import { bandBrake } from "./band-brake.ts";
import { bolts } from "./bolts.ts";
import { damping } from "./damping.ts";
import { lossFromDecay } from "./loss-from-decay.ts";
import type { Sheet } from "./way.ts";

export type SheetKey = "bolts" | "band-brake" | "damping" | "loss-from-decay";

/** The sheets, by key, for a body of either kind. */
export const sheetFor: Readonly<Record<SheetKey, (motion: Motion) => Sheet>> = {
  bolts: () => bolts,
  "band-brake": () => bandBrake,
  damping,
  "loss-from-decay": lossFromDecay,
};
