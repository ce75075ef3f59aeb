import type { DemoProject, DemoReview } from "../demo-project.ts";

const carriage = {
  format: "restband-scenario/1",
  purpose: "feed",
  motion: "linear",
  body: { inertia: 120, stiffness: 4.0e6, viscous: 350 },
  contact: {
    law: { model: "coulomb", static: 0.15, kinetic: 0.12 },
    normal: { preload: 800, weight: true },
  },
  span: { seconds: 0.5, untilRest: false },
};

const wayFriction = { kind: "catalogue", source: "way maker's sheet 12, oiled, invented" };

const origins = {
  "body.inertia": { kind: "calculated", source: "mass list of the carriage, drawing ZC-204", entered: "120 kg" },
  "body.stiffness": { kind: "measured", source: "drive pushed with a load cell, 14 October", entered: "4.0 N/µm" },
  "contact.law.static": { ...wayFriction, entered: "0.15", low: 0.12, high: 0.18 },
  "contact.law.kinetic": { ...wayFriction, entered: "0.12", low: 0.1, high: 0.14 },
  "contact.normal.preload": { kind: "assumed", source: "gib strips as set by hand", entered: "800 N" },
};

const creepFeed = {
  ...carriage,
  title: "Z carriage, creep feed",
  base: [{ kind: "ramp", rate: 0.002 }],
  limits: [
    { quantity: "stickFraction", max: 0 },
    { quantity: "velocityRipple", max: 0.5 },
    { quantity: "followingErrorPeak", max: 100e-6 },
    { quantity: "peakAcceleration", max: 2.0 },
  ],
  origins,
};

const oilDamper = {
  ...creepFeed,
  title: "Z carriage, oil damper",
  body: { ...carriage.body, viscous: 4100 },
  origins: {
    ...origins,
    "body.viscous": {
      kind: "catalogue",
      source: "damper sheet OD-4, invented",
      entered: "4100 N·s/m",
      low: 3600,
      high: 4600,
    },
  },
};

const oilDamperReview: DemoReview = {
  reviewer: "priya",
  checklist: [
    "Every value says where it comes from.",
    "The limits are those of the machine's own sheet.",
    "Friction was run over its whole range.",
  ],
  first: { ...creepFeed, title: "Z carriage, oil damper" },
  returned: {
    request: "The creep feed as the carriage stands now, with the guide's own damping.",
    comments: [
      {
        anchor: { kind: "span", from: 0.0613, to: 0.0757 },
        words: "It stands still here after every jump, 40 % of the time in all. The limit asks for none.",
        answer: "Agreed. The oil damper of sheet OD-4 fits beside the screw; I put it in.",
      },
      {
        anchor: { kind: "field", path: "body.viscous" },
        words: "Where do these 350 N·s/m come from? The sheet names no damper.",
        answer: "A guess for the seals. The damper will be far above it.",
      },
    ],
    reasons: "Sticks and slips at the feed that is asked for: two of four limits are broken.",
  },
  accepted: {
    request: "Now with the damper OD-4. It slides from the first break-away on.",
    comments: [
      {
        anchor: { kind: "instant", t: 0.0651 },
        words: "Slowest here: 0.05 mm/s. That is all that keeps it from stopping again.",
      },
      {
        anchor: { kind: "span", from: 0.25, to: 0.5 },
        words: "The ripple is taken over this half only: the first half is run-in.",
      },
    ],
    reasons: "The replay agrees and all four limits are kept. Accepted for the prototype.",
  },
};

const rapidReturn = {
  ...oilDamper,
  title: "Z carriage, rapid return",
  base: [{ kind: "ramp", rate: -0.02 }],
  limits: [
    { quantity: "stickFraction", max: 0 },
    { quantity: "followingErrorPeak", max: 200e-6 },
  ],
};

const padBrake = {
  format: "restband-scenario/1",
  title: "Turret, two-pad brake",
  purpose: "braking",
  motion: "angular",
  body: { inertia: 0.35, stiffness: 0 },
  contact: {
    law: { model: "coulomb", static: 0.42, kinetic: 0.38 },
    normal: { preload: 210, faces: 2 },
    radius: 0.09,
  },
  // 12 turns a second.
  initial: { displacement: 0, velocity: 75.398 },
  span: { seconds: 2.5 },
  limits: [{ quantity: "restTime", max: 2 }],
  origins: {
    "contact.law.kinetic": {
      kind: "catalogue",
      source: "pad sheet P-7, invented",
      entered: "0.38",
      low: 0.33,
      high: 0.43,
    },
    "contact.normal.preload": { kind: "calculated", source: "spring packet at its working height", entered: "210 N" },
  },
};

const beltCarton = {
  format: "restband-scenario/1",
  title: "Sorting belt, carton against the stop",
  purpose: "test",
  motion: "linear",
  body: { inertia: 6, stiffness: 9000 },
  contact: {
    law: { model: "coulomb", static: 0.45, kinetic: 0.3 },
    normal: { preload: 0, weight: true },
    counterface: { velocity: 0.05 },
  },
  span: { seconds: 1.2, untilRest: false },
};

const tailClamp = {
  format: "restband-scenario/1",
  title: "Tail clamp, shaken by the mill",
  purpose: "holding",
  motion: "linear",
  body: { inertia: 18, stiffness: 2.5e6, viscous: 400 },
  contact: {
    law: { model: "coulomb", static: 0.2, kinetic: 0.16 },
    normal: { preload: 1800, faces: 2 },
  },
  force: [{ kind: "harmonic", amplitude: 446.4, hz: 25 }],
  span: { seconds: 1, untilRest: false },
  limits: [{ quantity: "holdUse", max: 0.8 }],
  origins: {
    "contact.normal.preload": {
      kind: "calculated",
      source: "bolt preload at 60 % of proof, invented",
      entered: "1800 N",
    },
    "contact.law.static": {
      kind: "standard",
      source: "steel on steel, dry; from memory",
      entered: "0.2",
      low: 0.15,
      high: 0.25,
    },
    "force[0].amplitude": { kind: "measured", source: "cutting force, side mill, 21 October", entered: "446 N" },
  },
};

export const hall3Refit: DemoProject = {
  name: "Hall 3 refit",
  description:
    "Refit of the vertical machining cell in hall 3: way material, feed damper and clamps. Okarin Toolworks, invented for the example.",
  owner: "ines",
  members: { tomas: "editor", priya: "reviewer", aoife: "reader" },
  scenarios: [
    { by: "ines", content: tailClamp },
    { by: "tomas", content: beltCarton },
    { by: "ines", content: padBrake },
    { by: "tomas", content: rapidReturn },
    { by: "ines", content: oilDamper, review: oilDamperReview },
    { by: "ines", content: creepFeed },
  ],
};
