import { measures, textbook, type Given, type Preset } from "../formula/formula.ts";
import { lengthOf } from "../formula/lengths.ts";
import { threadDiameters, threads } from "./threads.ts";
import { way, type Sheet } from "./way.ts";

const diameter = lengthOf("diameter", "Nominal diameter", "d");

const count: Given<"count"> = {
  key: "count",
  label: "Bolts that press one face",
  symbol: "z",
  measure: measures.number,
  minimum: 1,
  integer: true,
  initial: 1,
};

const spread: Given<"spread"> = {
  key: "spread",
  label: "Spread up and down",
  symbol: "s",
  measure: { ...measures.number, isShare: true },
  minimum: 0,
  exclusiveMaximum: 1,
  initial: 0.25,
  help: "becomes the range the answer is tested over",
};

/** What a way of tightening leaves unknown of the force: common practice, from memory. */
const tightening: Preset<"spread"> = {
  label: "Tightened by",
  options: [
    { label: "torque wrench, oiled thread", values: { spread: 0.25 } },
    { label: "torque wrench, dry thread; by feel", values: { spread: 0.35 } },
    { label: "turn of the nut", values: { spread: 0.15 } },
    { label: "measured stretch, indicating washer", values: { spread: 0.1 } },
    { label: "impact driver", values: { spread: 0.6 } },
  ],
};

/** K of T = K d F: common practice, from memory. */
const threadFriction: Preset<"factor"> = {
  label: "Thread and head",
  options: [
    { label: "as delivered, dry", values: { factor: 0.2 } },
    { label: "oiled", values: { factor: 0.16 } },
    { label: "molybdenum grease", values: { factor: 0.12 } },
  ],
};

/** Proof stress S_p of bolts by property class, after ISO 898-1, from memory. */
const propertyClasses: Preset<"proof"> = {
  label: "Property class",
  options: [
    { label: "5.8", values: { proof: 380e6 } },
    { label: "8.8 up to M16", values: { proof: 580e6 } },
    { label: "8.8 above M16", values: { proof: 600e6 } },
    { label: "10.9", values: { proof: 830e6 } },
    { label: "12.9", values: { proof: 970e6 } },
  ],
};

/**
 * Pressing force N = z T / (K d) of z bolts tightened to a torque, N.
 * @param count z
 * @param torque T at each, N·m
 * @param factor K, the torque coefficient of thread and head
 * @param diameter d nominal, m
 */
export const forceFromTorque = ({
  count,
  torque,
  factor,
  diameter,
}: Record<"count" | "torque" | "factor" | "diameter", number>): number => (count * torque) / (factor * diameter);

/**
 * Pressing force N = z u S_p A_t of z bolts tightened to a share of their proof load, A_t = π (d − 0.9382 p)²/4, N.
 * @param count z
 * @param share u of the proof load, 0…1
 * @param proof S_p, Pa
 * @param diameter d nominal, m
 * @param pitch p, m
 */
export const forceFromClass = ({
  count,
  share,
  proof,
  diameter,
  pitch,
}: Record<"count" | "share" | "proof" | "diameter" | "pitch", number>): number =>
  (count * share * proof * Math.PI * (diameter - 0.9382 * pitch) ** 2) / 4;

const around = (force: number, s: number) => ({ low: force * (1 - s), high: force * (1 + s) });

const result = { symbol: "N", measure: measures.force };
const caveat = "A joint settles after tightening and loses some 5 to 10 % in the first hours, from memory.";

const byTorque = way({
  key: "torque",
  label: "from the tightening torque",
  givens: [
    { key: "torque", label: "Torque", symbol: "T", measure: measures.torque, exclusiveMinimum: 0 },
    {
      key: "factor",
      label: "Torque coefficient",
      symbol: "K",
      measure: measures.number,
      exclusiveMinimum: 0,
      initial: 0.2,
    },
    diameter,
    count,
    spread,
  ],
  presets: [threadDiameters, threadFriction, tightening],
  result,
  expression: "{count} · {torque} / ({factor} · {diameter})",
  source: textbook,
  caveat: `Nine tenths of the torque go into friction of thread and head: K is the doubt. ${caveat}`,
  value: forceFromTorque,
  range: (values) => around(forceFromTorque(values), values.spread),
});

const byClass = way({
  key: "class",
  label: "from the property class",
  givens: [
    {
      key: "proof",
      label: "Proof stress",
      symbol: "S_p",
      measure: measures.pressure,
      exclusiveMinimum: 0,
      initial: 580e6,
    },
    {
      key: "share",
      label: "Share of the proof load",
      symbol: "u",
      measure: { ...measures.number, isShare: true },
      exclusiveMinimum: 0,
      maximum: 1,
      initial: 0.75,
      help: "75 % where the joint is opened again: common practice, from memory",
    },
    diameter,
    lengthOf("pitch", "Pitch", "p"),
    count,
    spread,
  ],
  presets: [propertyClasses, threads, tightening],
  result,
  expression: "{count} · {share} · {proof} · π · ({diameter} − 0.9382 · {pitch})^2 / 4",
  source: textbook,
  caveat,
  value: forceFromClass,
  range: (values) => around(forceFromClass(values), values.spread),
  fault: ({ diameter: d, pitch }) =>
    pitch < d ? null : { key: "pitch", message: "The pitch is smaller than the diameter." },
});

export const bolts: Sheet = {
  ways: [byTorque, byClass],
  caution: "Counts what presses one face; a force that pulls the joint apart in service is taken off it.",
};
