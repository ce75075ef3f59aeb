import { gears } from "./gears.ts";
import { lead } from "./lead.ts";
import { arm, lever } from "./lever.ts";
import { pinion } from "./pinion.ts";
import type { Transmission } from "./transmission.ts";

/** Everything members can stand behind, in the order menus show it. */
export const transmissions: readonly Transmission[] = [lead, pinion, gears, lever, arm];
