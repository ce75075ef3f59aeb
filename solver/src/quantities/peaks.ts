import type { Quantity } from "./quantity.ts";

export const peakDisplacement: Quantity = {
  name: "peakDisplacement",
  label: "Peak displacement",
  dimension: "displacement",
  signed: false,
  meaning: "largest |x| of the run",
  whole: ["displacement"],
  value: ({ whole }) => whole.peak("displacement"),
};

export const peakVelocity: Quantity = {
  name: "peakVelocity",
  label: "Peak velocity",
  dimension: "velocity",
  signed: false,
  meaning: "largest |ẋ| of the run",
  whole: ["velocity"],
  value: ({ whole }) => whole.peak("velocity"),
};

export const peakAcceleration: Quantity = {
  name: "peakAcceleration",
  label: "Peak acceleration",
  dimension: "acceleration",
  signed: false,
  meaning: "largest |ẍ| of the run, on either side of a jump",
  whole: ["acceleration"],
  value: ({ whole }) => whole.peak("acceleration"),
};

export const slipVelocityPeak: Quantity = {
  name: "slipVelocityPeak",
  label: "Peak slip speed",
  dimension: "velocity",
  signed: false,
  meaning: "largest |v_r| of the run, the velocity against the counterface",
  whole: ["slip"],
  value: ({ whole }) => whole.peak("slip"),
};
