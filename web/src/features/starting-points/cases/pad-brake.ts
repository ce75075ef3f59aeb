import { practice, startingPoint } from "../starting-point.ts";

export const padBrake = startingPoint({
  key: "pad-brake",
  name: "Pad-braked rotor",
  why: "Two pads press on a disc: when does the rotor stand, and after how many turns?",
  shows: "It comes to rest after 3.4 s and 43 turns; the time grows as friction falls.",
  draft: {
    purpose: "braking",
    motion: "angular",
    body: { inertia: 2.4, stiffness: 0 },
    contact: {
      law: { model: "coulomb", static: 0.45, kinetic: 0.38 },
      normal: { preload: 1200, faces: 2 },
      radius: 0.12,
    },
    initial: { displacement: 0, velocity: 50 * Math.PI },
    span: { seconds: 6 },
    limits: [{ quantity: "restTime", max: 4 }],
    origins: {
      "body.inertia": practice("spindle with a chuck"),
      "contact.law.static": practice("dry friction lining on steel, at rest"),
      "contact.law.kinetic": practice("dry friction lining on steel, cold and hot", [0.3, 0.45]),
      "contact.normal.preload": practice("spring packet of a small caliper"),
      "contact.normal.faces": practice("one pad on each side"),
      "contact.radius": practice("middle of the pads on a disc of 300 mm"),
      "initial.velocity": { ...practice("a lathe at work"), entered: "1500 rpm" },
      "limits[0].max": practice("standstill before a door may open"),
    },
  },
});
