import { unitSystem, type UnitSystem } from "./unit-system.ts";
import type { Measurand, Measure, Unit } from "./unit.ts";

const INCH = 0.0254;
const POUND = 0.45359237;
const GRAVITY = 9.80665;
const POUND_FORCE = POUND * GRAVITY;
const DEGREE = Math.PI / 180;

const metres: readonly Unit[] = [
  { label: "mm", factor: 1e-3, from: 0.2 },
  { label: "μm", factor: 1e-6, from: 0.2, aliases: ["micron", "microns"] },
  { label: "nm", factor: 1e-9, from: 0 },
  { label: "m", factor: 1, from: 1 },
  { label: "in", factor: INCH, inchFrom: 0.001, aliases: ["inch", "inches", '"', "″"] },
  { label: "μin", factor: 1e-6 * INCH, inchFrom: 0, aliases: ["microinch"] },
  { label: "mil", factor: 1e-3 * INCH, aliases: ["mils", "thou"] },
];

const speeds: readonly Unit[] = [
  { label: "mm/s", factor: 1e-3, from: 0.1 },
  { label: "μm/s", factor: 1e-6, from: 0 },
  { label: "m/s", factor: 1, from: 1 },
  { label: "mm/min", factor: 1e-3 / 60 },
  { label: "m/min", factor: 1 / 60 },
  { label: "in/s", factor: INCH, inchFrom: 0, aliases: ["ips"] },
  { label: "in/min", factor: INCH / 60, aliases: ["ipm"] },
];

const forces: readonly Unit[] = [
  { label: "N", factor: 1, from: 0.1 },
  { label: "mN", factor: 1e-3, from: 0 },
  { label: "kN", factor: 1e3, from: 100 },
  { label: "lbf", factor: POUND_FORCE, inchFrom: 0, aliases: ["lb"] },
  { label: "kgf", factor: GRAVITY, aliases: ["kp"] },
];

const masses: readonly Unit[] = [
  { label: "kg", factor: 1, from: 0.1 },
  { label: "g", factor: 1e-3, from: 0 },
  { label: "t", factor: 1e3, from: 100 },
  { label: "lb", factor: POUND, inchFrom: 0, aliases: ["lbs", "lbm"] },
];

const springRates: readonly Unit[] = [
  { label: "N/mm", factor: 1e3, from: 1 },
  { label: "N/m", factor: 1, from: 0 },
  { label: "N/μm", factor: 1e6, from: 1, aliases: ["kN/mm", "MN/m"] },
  { label: "lbf/in", factor: POUND_FORCE / INCH, inchFrom: 0, aliases: ["lb/in"] },
];

const dampings: readonly Unit[] = [
  { label: "N·s/m", factor: 1, from: 0, aliases: ["kg/s"] },
  { label: "N·s/mm", factor: 1e3, from: 1000 },
  { label: "lbf·s/in", factor: POUND_FORCE / INCH, inchFrom: 0, aliases: ["lb·s/in"] },
];

const accelerations: readonly Unit[] = [
  { label: "m/s²", factor: 1, from: 0.1 },
  { label: "mm/s²", factor: 1e-3, from: 0 },
  { label: "g", factor: GRAVITY, aliases: ["gn"] },
  { label: "in/s²", factor: INCH, inchFrom: 0 },
];

/** Per dimension the units of a linear body, and those of an angular one where they differ. The first is the one for zero. */
const table: Record<Measurand, { linear: readonly Unit[]; angular?: readonly Unit[] }> = {
  none: {
    linear: [
      { label: "", factor: 1, from: 0 },
      { label: "%", factor: 0.01 },
    ],
  },
  inertia: {
    linear: masses,
    angular: [
      { label: "kg·m²", factor: 1, from: 0 },
      { label: "kg·cm²", factor: 1e-4 },
      { label: "g·cm²", factor: 1e-7 },
      { label: "lb·in²", factor: POUND * INCH ** 2, inchFrom: 0 },
      { label: "lb·ft²", factor: POUND * (12 * INCH) ** 2 },
    ],
  },
  stiffness: {
    linear: springRates,
    angular: [
      { label: "N·m/rad", factor: 1, from: 0, aliases: ["N·m"] },
      { label: "kN·m/rad", factor: 1e3, from: 100, aliases: ["kN·m"] },
      { label: "N·m/°", factor: 1 / DEGREE },
      { label: "lbf·in/rad", factor: POUND_FORCE * INCH, inchFrom: 0, aliases: ["lbf·in"] },
    ],
  },
  cubicStiffness: {
    linear: [
      { label: "N/m³", factor: 1, from: 0 },
      { label: "N/mm³", factor: 1e9, from: 0.01 },
      { label: "lbf/in³", factor: POUND_FORCE / INCH ** 3, inchFrom: 0 },
    ],
    angular: [
      { label: "N·m/rad³", factor: 1, from: 0 },
      { label: "lbf·in/rad³", factor: POUND_FORCE * INCH, inchFrom: 0 },
    ],
  },
  damping: {
    linear: dampings,
    angular: [
      { label: "N·m·s/rad", factor: 1, from: 0, aliases: ["N·m·s"] },
      { label: "lbf·in·s/rad", factor: POUND_FORCE * INCH, inchFrom: 0, aliases: ["lbf·in·s"] },
    ],
  },
  displacement: {
    linear: metres,
    angular: [
      { label: "rad", factor: 1, from: 0.1 },
      { label: "mrad", factor: 1e-3, from: 0 },
      { label: "°", factor: DEGREE, aliases: ["deg", "degrees"] },
      { label: "turn", factor: 2 * Math.PI, aliases: ["turns", "rev"] },
    ],
  },
  velocity: {
    linear: speeds,
    angular: [
      { label: "rad/s", factor: 1, from: 0.1 },
      { label: "mrad/s", factor: 1e-3, from: 0 },
      { label: "°/s", factor: DEGREE, aliases: ["deg/s"] },
      { label: "rpm", factor: Math.PI / 30, aliases: ["1/min", "rev/min"] },
    ],
  },
  acceleration: {
    linear: accelerations,
    angular: [
      { label: "rad/s²", factor: 1, from: 0 },
      { label: "°/s²", factor: DEGREE, aliases: ["deg/s²"] },
    ],
  },
  force: {
    linear: forces,
    angular: [
      { label: "N·m", factor: 1, from: 0.1 },
      { label: "mN·m", factor: 1e-3, from: 0, aliases: ["N·mm"] },
      { label: "kN·m", factor: 1e3, from: 100 },
      { label: "lbf·in", factor: POUND_FORCE * INCH, inchFrom: 0, aliases: ["lb·in"] },
      { label: "lbf·ft", factor: POUND_FORCE * 12 * INCH, aliases: ["lb·ft"] },
    ],
  },
  forceRate: {
    linear: [
      { label: "N/s", factor: 1, from: 0 },
      { label: "kN/s", factor: 1e3, from: 10 },
      { label: "lbf/s", factor: POUND_FORCE, inchFrom: 0 },
    ],
    angular: [
      { label: "N·m/s", factor: 1, from: 0 },
      { label: "lbf·in/s", factor: POUND_FORCE * INCH, inchFrom: 0 },
    ],
  },
  pressing: { linear: forces },
  length: { linear: metres },
  mass: { linear: masses },
  slidingVelocity: { linear: speeds },
  fluidDamping: { linear: dampings },
  bristleStiffness: { linear: springRates },
  frequency: {
    linear: [
      { label: "Hz", factor: 1, from: 0, aliases: ["1/s"] },
      { label: "kHz", factor: 1e3, from: 10 },
      { label: "rpm", factor: 1 / 60, aliases: ["1/min"] },
      { label: "rad/s", factor: 1 / (2 * Math.PI) },
    ],
  },
  time: {
    linear: [
      { label: "s", factor: 1, from: 0.1, aliases: ["sec"] },
      { label: "ms", factor: 1e-3, from: 0.1 },
      { label: "μs", factor: 1e-6, from: 0 },
      { label: "min", factor: 60 },
      { label: "h", factor: 3600 },
    ],
  },
  angle: {
    linear: [
      { label: "°", factor: 1, from: 0, aliases: ["deg", "degrees"] },
      { label: "rad", factor: 180 / Math.PI },
    ],
  },
  power: {
    linear: [
      { label: "W", factor: 1, from: 0.1 },
      { label: "mW", factor: 1e-3, from: 0 },
      { label: "kW", factor: 1e3, from: 10 },
      { label: "lbf·in/s", factor: POUND_FORCE * INCH, inchFrom: 0 },
      { label: "hp", factor: 550 * 12 * POUND_FORCE * INCH },
    ],
  },
  energy: {
    linear: [
      { label: "J", factor: 1, from: 1 },
      { label: "mJ", factor: 1e-3, from: 1 },
      { label: "μJ", factor: 1e-6, from: 0 },
      { label: "kJ", factor: 1e3, from: 10 },
      { label: "lbf·in", factor: POUND_FORCE * INCH, inchFrom: 0, aliases: ["in·lbf"] },
    ],
  },
  pressure: {
    linear: [
      { label: "MPa", factor: 1e6, from: 0.1, aliases: ["N/mm²"] },
      { label: "Pa", factor: 1, from: 0 },
      { label: "GPa", factor: 1e9, from: 1 },
      { label: "psi", factor: POUND_FORCE / INCH ** 2, inchFrom: 0 },
      { label: "ksi", factor: (1e3 * POUND_FORCE) / INCH ** 2, inchFrom: 1000 },
    ],
  },
  density: {
    linear: [
      { label: "kg/m³", factor: 1, from: 0 },
      { label: "g/cm³", factor: 1e3, aliases: ["kg/dm³"] },
      { label: "lb/in³", factor: POUND / INCH ** 3, inchFrom: 0 },
    ],
  },
};

const shareUnits: readonly Unit[] = [
  { label: "%", factor: 0.01, from: 0 },
  { label: "", factor: 1 },
];

/** The units a number can be typed and read in, the usual one first. */
export function unitsOf({ dimension, motion, isShare }: Measure): readonly Unit[] {
  if (isShare) return shareUnits;
  const entry = table[dimension];
  return motion === "angular" && entry.angular ? entry.angular : entry.linear;
}

/** The unit of a dimension by its label, or undefined: a label kept from before the body changed its kind. */
export function unitByLabel(measure: Measure, label: string | undefined): Unit | undefined {
  return unitsOf(measure).find((unit) => unit.label === label);
}

/**
 * The unit a value is shown in where nobody chose one: the largest of those customary to the person in which it is not too
 * small to read. Zero, and what is not a number, take the first.
 */
export function unitFor(value: number, measure: Measure): Unit {
  const units = customary(measure, unitSystem());
  const size = Math.abs(value);
  if (!(size > 0)) return units[0].unit;
  const fitting = units.filter(({ unit, from }) => size >= from * unit.factor * (1 - 1e-12));
  const largest = fitting.reduce(
    (best, each) => (each.unit.factor > best.unit.factor ? each : best),
    fitting[0] ?? units[0],
  );
  return largest.unit;
}

/** The units shown unasked, each from so many of it on; what a system does not say is as usual. */
function customary(measure: Measure, system: UnitSystem): { unit: Unit; from: number }[] {
  const units = unitsOf(measure);
  const shown = (from: (unit: Unit) => number | undefined) =>
    units.flatMap((unit) => (from(unit) === undefined ? [] : { unit, from: from(unit) ?? 0 }));
  const usual = shown(({ from }) => from);
  if (system === "millimetre" || measure.isShare) return usual;
  const own = shown(system === "inch" ? ({ inchFrom }) => inchFrom : ({ factor }) => (factor === 1 ? 0 : undefined));
  return own.length > 0 ? own : usual;
}

export const siOf = (measure: Measure): string => unitsOf(measure).find((unit) => unit.factor === 1)?.label ?? "";
