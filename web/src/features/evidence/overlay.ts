import type { Samples } from "@restband/solver";
import { instantAt, type Instant } from "../../compute/instant.ts";

/** A motion drawn beside the run, for comparison: told by its samples, whatever it comes from. */
export interface Overlay {
  readonly key: string;
  /** What it is called at its line and beside its values. */
  readonly label: string;
  readonly samples: Samples;
}

/** The other motion at an instant; null beyond its end. */
export function overlayAt({ samples }: Overlay, t: number): Instant | null {
  const { t: times } = samples;
  return times.length > 0 && t >= times[0] && t <= times[times.length - 1] ? instantAt(samples, t) : null;
}
