import type { Preset } from "../formula/formula.ts";

/** Nominal diameter and coarse pitch of metric threads, mm (ISO 261, from memory). */
const coarse = [
  [3, 0.5],
  [4, 0.7],
  [5, 0.8],
  [6, 1],
  [8, 1.25],
  [10, 1.5],
  [12, 1.75],
  [14, 2],
  [16, 2],
  [20, 2.5],
  [24, 3],
  [30, 3.5],
] as const;

export const threads: Preset<"diameter" | "pitch"> = {
  label: "Thread",
  options: coarse.map(([diameter, pitch]) => ({
    label: `M${diameter}`,
    values: { diameter: diameter / 1000, pitch: pitch / 1000 },
  })),
};

/** Where the pitch does not count. */
export const threadDiameters: Preset<"diameter"> = {
  label: "Thread",
  options: threads.options.map(({ label, values }) => ({ label, values: { diameter: values.diameter } })),
};
