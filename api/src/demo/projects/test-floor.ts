import type { DemoProject } from "../demo-project.ts";

const isolator = {
  format: "restband-scenario/1",
  title: "Fan on rubbed springs, near resonance",
  purpose: "isolation",
  motion: "linear",
  body: { inertia: 85, stiffness: 134000, viscous: 90 },
  contact: {
    law: { model: "coulomb", static: 0.25, kinetic: 0.2 },
    normal: { preload: 150, faces: 2 },
  },
  force: [{ kind: "harmonic", amplitude: 120, hz: 6 }],
  span: { seconds: 12, untilRest: false },
  limits: [
    { quantity: "amplitude", max: 0.004 },
    { quantity: "transmissibility", max: 4 },
  ],
  origins: {
    "contact.law.kinetic": {
      kind: "assumed",
      source: "pad maker names no figure",
      entered: "0.2",
      low: 0.15,
      high: 0.3,
    },
    "force[0].amplitude": { kind: "calculated", source: "unbalance grade of the fan, invented", entered: "120 N" },
  },
};

const inclinedStage = {
  format: "restband-scenario/1",
  title: "Inclined stage, power off",
  purpose: "holding",
  motion: "linear",
  body: { inertia: 40, stiffness: 5000, viscous: 20 },
  contact: {
    law: { model: "coulomb", static: 0.18, kinetic: 0.14 },
    normal: { preload: 0, weight: true },
  },
  incline: 8,
  span: { seconds: 2, untilRest: false },
  limits: [{ quantity: "holdUse", max: 0.9 }],
  origins: {
    "contact.law.static": {
      kind: "measured",
      source: "pulled with a spring scale, 12 pulls",
      entered: "0.18",
      low: 0.16,
      high: 0.21,
    },
    incline: { kind: "standard", source: "drawing TS-11", entered: "8°" },
  },
};

export const testFloor: DemoProject = {
  name: "Test floor isolators",
  description:
    "Fan isolators and the inclined stage of the test floor, for Okarin Toolworks by Lund & Raman; invented for the example.",
  owner: "priya",
  members: { ines: "editor", aoife: "reader" },
  scenarios: [
    { by: "priya", content: inclinedStage },
    { by: "ines", content: isolator },
  ],
};
