import type { DemoProject } from "../demo-project.ts";

const hanger = {
  format: "restband-scenario/1",
  title: "Hanger C-2, released",
  purpose: "test",
  motion: "linear",
  body: { inertia: 25, stiffness: 10214, viscous: 11.3 },
  contact: {
    law: { model: "coulomb", static: 0.18, kinetic: 0.16 },
    normal: { preload: 132.5 },
  },
  initial: { displacement: 0.092, velocity: 0 },
  span: { seconds: 3.2 },
  limits: [{ quantity: "restTime", max: 3 }],
  origins: {
    "body.stiffness": {
      kind: "measured",
      source: "ring-down of 9 November: 3.217 Hz at 25 kg",
      entered: "10.214 N/mm",
    },
    "body.viscous": { kind: "measured", source: "same ring-down, damping ratio 0.0112", entered: "11.3 N·s/m" },
    "contact.law.kinetic": { kind: "measured", source: "same ring-down, 21.2 N at 132.5 N", entered: "0.16" },
  },
};

const coupon = {
  format: "restband-scenario/1",
  title: "Coupon, ring-down in its grips",
  purpose: "test",
  motion: "linear",
  body: { inertia: 2.4, stiffness: 3800, viscous: 3.5 },
  solid: { model: "equivalent-viscous", lossFactor: 0.01, at: "natural" },
  contact: {
    law: { model: "coulomb", static: 0.1, kinetic: 0.08 },
    normal: { preload: 12 },
  },
  initial: { displacement: 0.012, velocity: 0 },
  span: { seconds: 6 },
  limits: [
    { quantity: "restTime", max: 4 },
    { quantity: "restOffset", min: -0.0005, max: 0.0005 },
  ],
  origins: { "solid.lossFactor": { kind: "assumed", source: "common practice for bolted steel", entered: "0.01" } },
};

export const hangerLine: DemoProject = {
  name: "Hanger line C",
  description:
    "How long the hangers of line C swing after they are let go. Okarin Toolworks, invented for the example.",
  owner: "tomas",
  members: { ines: "editor", priya: "reviewer" },
  scenarios: [
    { by: "ines", content: coupon },
    { by: "tomas", content: hanger },
  ],
};
