import type { Field } from "../field.ts";

/** Where a term begins; before it, the term is 0. */
export const startField: Field = {
  key: "start",
  label: "Start",
  dimension: "time",
  default: 0,
  initial: 0,
};

export const hzField: Field = {
  key: "hz",
  label: "Frequency",
  symbol: "f",
  dimension: "frequency",
  exclusiveMinimum: 0,
  initial: 5,
};

export const phaseField: Field = {
  key: "phase",
  label: "Phase",
  symbol: "φ",
  dimension: "angle",
  default: 0,
  initial: 0,
  help: "of a cosine: −90° starts as a sine",
};

/** Members of a trapezoidal move: speed and acceleration of the base, both positive whatever the direction. */
export const moveFields: readonly Field[] = [
  {
    key: "speed",
    label: "Speed",
    dimension: "velocity",
    exclusiveMinimum: 0,
    initial: 0.02,
    help: "reached between ramp-up and ramp-down",
  },
  {
    key: "acceleration",
    label: "Acceleration",
    dimension: "acceleration",
    exclusiveMinimum: 0,
    initial: 0.5,
    help: "while speeding up and while slowing down",
  },
];
