import type { KindFault } from "../field.ts";
import { monotoneCubic } from "../numerics/monotone-cubic.ts";
import type { FrictionLaw } from "./friction-law.ts";

export interface FrictionTable {
  model: "table";
  /** Rows of sliding speed (m/s, rising from 0) and coefficient. */
  points: [number, number][];
}

/** Measured friction: a monotone cubic through the points, constant past the last; μs is the value at rest. */
export const table: FrictionLaw<"table", FrictionTable> = {
  model: "table",
  label: "Table",
  summary: "measured friction against speed",
  sentence: "with measured friction, {points}",
  fields: [],
  rows: {
    columns: [
      { key: "speed", label: "Sliding speed", symbol: "v", dimension: "slidingVelocity", minimum: 0, initial: 0 },
      { key: "coefficient", label: "Friction", symbol: "μ", dimension: "none", minimum: 0, initial: 0.15 },
    ],
    initial: [
      [0, 0.2],
      [0.01, 0.13],
      [0.1, 0.11],
    ],
  },
  source: "measured; interpolation after Fritsch & Carlson 1980",
  faults: ({ points }) => [...startFault(points), ...orderFaults(points)],
  compile: ({ points }) => {
    const curve = monotoneCubic(
      points.map(([speed]) => speed),
      points.map(([, coefficient]) => coefficient),
    );
    return {
      atRest: points[0][1],
      atOnset: points[0][1],
      constant: null,
      coefficient: curve.value,
      slope: curve.slope,
      fluid: 0,
      corners: points.slice(1).map(([speed]) => speed),
    };
  },
};

function startFault(points: FrictionTable["points"]): KindFault[] {
  if (points.length === 0) return [{ path: "points", message: "The table needs at least one point, at speed 0." }];
  const first = points[0][0];
  if (!(first > 0)) return [];
  return [
    { path: "points[0][0]", message: `The table starts at speed 0, the friction at rest; it starts at ${first}.` },
  ];
}

function orderFaults(points: FrictionTable["points"]): KindFault[] {
  const faults: KindFault[] = [];
  for (let i = 1; i < points.length; i++) {
    const [before, speed] = [points[i - 1][0], points[i][0]];
    if (speed <= before)
      faults.push({ path: `points[${i}][0]`, message: `Speeds rise from row to row; ${speed} comes after ${before}.` });
  }
  return faults;
}
