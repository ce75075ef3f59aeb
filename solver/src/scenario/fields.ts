import type { Choice, Field } from "../field.ts";

/*
 * The numbers of a scenario that belong to no kind, described as kinds describe theirs. Labels are those of a linear body.
 */

export const bodyFields: readonly Field[] = [
  {
    key: "inertia",
    label: "Mass",
    symbol: "m",
    dimension: "inertia",
    exclusiveMinimum: 0,
    initial: 1,
    help: "moment of inertia of an angular body",
  },
  {
    key: "stiffness",
    label: "Stiffness",
    symbol: "k",
    dimension: "stiffness",
    minimum: 0,
    initial: 1000,
    help: "0 without a spring",
  },
  {
    key: "cubic",
    label: "Cubic stiffness",
    symbol: "k3",
    dimension: "cubicStiffness",
    default: 0,
    initial: 0,
    help: "of a spring that hardens; negative softens",
  },
  { key: "viscous", label: "Damping", symbol: "c", dimension: "damping", minimum: 0, default: 0, initial: 0 },
];

export const normalFields: readonly Field[] = [
  { key: "preload", label: "Preload per face", dimension: "pressing", minimum: 0, initial: 0 },
  { key: "faces", label: "Faces", dimension: "none", minimum: 1, integer: true, default: 1, initial: 1 },
];

export const rippleFields: readonly Field[] = [
  { key: "amplitude", label: "Ripple of the pressing force", dimension: "pressing", initial: 10 },
  { key: "hz", label: "Frequency of the ripple", dimension: "frequency", exclusiveMinimum: 0, initial: 10 },
  { key: "phase", label: "Phase of the ripple", dimension: "angle", default: 0, initial: 0 },
];

export const radiusField: Field = {
  key: "radius",
  label: "Effective radius",
  symbol: "r",
  dimension: "length",
  exclusiveMinimum: 0,
  default: 1,
  initial: 0.1,
  help: "of the contact, angular bodies only",
};

export const counterfaceChoice: Choice = {
  key: "counterface",
  label: "Counterface",
  options: [
    { value: "ground", label: "fixed ways" },
    { value: "base", label: "the moving base" },
    {
      value: "velocity",
      label: "a belt",
      field: { key: "velocity", label: "Speed of the counterface", dimension: "velocity", initial: 0.1 },
    },
  ],
};

export const inclineField: Field = {
  key: "incline",
  label: "Incline",
  symbol: "θ",
  dimension: "angle",
  minimum: -90,
  maximum: 90,
  default: 0,
  initial: 0,
  help: "x points up the incline",
};

export const initialFields: readonly Field[] = [
  { key: "displacement", label: "Starting displacement", dimension: "displacement", default: 0, initial: 0 },
  { key: "velocity", label: "Starting velocity", dimension: "velocity", default: 0, initial: 0 },
];

export const spanFields: readonly Field[] = [
  { key: "seconds", label: "Length of the run", dimension: "time", exclusiveMinimum: 0, maximum: 1e7, initial: 10 },
  {
    key: "maxEvents",
    label: "Most events",
    dimension: "none",
    minimum: 1,
    integer: true,
    default: 200_000,
    initial: 200_000,
  },
  { key: "maxWork", label: "Most work", dimension: "none", exclusiveMinimum: 0, default: 2e7, initial: 2e7 },
];

export const settleBandField: Field = {
  key: "settleBand",
  label: "Settle band",
  dimension: "displacement",
  exclusiveMinimum: 0,
  initial: 1e-5,
  help: "a move has settled inside it",
};
