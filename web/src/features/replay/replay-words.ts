import type { Replay, ReplayDraft } from "@restband/api/contract";
import type { Scenario } from "@restband/solver";
import { formatNumber } from "../../format/format-number.ts";
import { joined, readQuantity } from "../../format/format-quantity.ts";
import { measureOfQuantity, quantityNamed } from "../../format/quantities.ts";
import type { Measure } from "../../format/unit.ts";

type Deviation = ReplayDraft["deviations"][number];
type Motion = Scenario["motion"];

const eventColumns: Readonly<Record<string, { label: string; dimension: Measure["dimension"] }>> = {
  t: { label: "time", dimension: "time" },
  x: { label: "position", dimension: "displacement" },
  v: { label: "velocity", dimension: "velocity" },
  f: { label: "friction", dimension: "force" },
};

/** How it was run: "Same method, exact". */
export function wayWords(way: ReplayDraft["way"], frozenMethod: "exact" | "adaptive"): string {
  switch (way) {
    case "same-method":
      return `Same method, ${frozenMethod}`;
    case "other-method":
      return `Other method, ${frozenMethod === "exact" ? "adaptive" : "exact"}`;
    case "tolerances":
      return "Adaptive method at other tolerances";
    case "script":
      return "Python file, run elsewhere";
  }
}

/** What a deviation is of: "peak velocity", "time of event 4". */
export function deviationName({ what, event }: Deviation): string {
  if (event !== undefined) return `${eventColumns[what]?.label ?? what} of event ${event + 1}`;
  const label = quantityNamed(what)?.label ?? what;
  return label.charAt(0).toLowerCase() + label.slice(1);
}

/** The unit a deviation is read in. */
export function deviationMeasure({ what, event }: Deviation, motion: Motion): Measure {
  const column = event === undefined ? undefined : eventColumns[what];
  return column ? { dimension: column.dimension, motion } : measureOfQuantity(what, motion);
}

/** The largest deviation in one line: "0 in every digit", "3.6e-11 of the peak, position of event 3, 0.36 nm". */
export function largestWords({ way, differences, deviations }: Replay, motion: Motion): string {
  if (differences.length > 0) return differences[0];
  const [largest] = deviations;
  if (!largest || largest.relative === 0) return way === "script" ? "0 as printed" : "none, to the last bit";
  const size = joined(readQuantity(largest.absolute, deviationMeasure(largest, motion), { digits: 2 }));
  return `${shareOfPeak(largest.relative)}: ${deviationName(largest)}, ${size}`;
}

export const shareOfPeak = (relative: number): string => `${formatNumber(relative, 2)} of the peak`;
