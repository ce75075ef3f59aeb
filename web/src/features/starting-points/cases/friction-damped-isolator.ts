import { calculated, practice, startingPoint } from "../starting-point.ts";

export const frictionDampedIsolator = startingPoint({
  key: "friction-damped-isolator",
  name: "Friction-damped isolator at resonance",
  why: "A floor shakes an instrument at its worst frequency: does friction in the mount keep the swing small?",
  shows: "It swings by two and a half times the floor, and by more as friction falls.",
  draft: {
    purpose: "isolation",
    motion: "linear",
    body: { inertia: 50, stiffness: 49_348, viscous: 157 },
    contact: {
      law: { model: "coulomb", static: 0.25, kinetic: 0.2 },
      normal: { preload: 150, faces: 2 },
      counterface: "base",
    },
    base: [{ kind: "harmonic", amplitude: 0.002, hz: 5, phase: 0 }],
    span: { seconds: 20, untilRest: false },
    limits: [{ quantity: "transmissibility", max: 3 }],
    origins: {
      "body.inertia": practice("instrument on its frame"),
      "body.stiffness": calculated("natural frequency of 5 Hz: m (10 π)²"),
      "body.viscous": calculated("5 % of critical: 0.1 √(k m)"),
      "contact.law.static": practice("steel wedge on steel, dry; tables give 0.15 to 0.30"),
      "contact.law.kinetic": practice("steel wedge on steel, dry; tables give 0.10 to 0.30", [0.15, 0.25]),
      "contact.normal.preload": practice("leaf spring that presses the wedge"),
      "contact.normal.faces": practice("wedge with two faces"),
      "base[0].amplitude": practice("floor beside a slow machine, 2 mm"),
      "base[0].hz": calculated("the natural frequency: the worst case"),
      "limits[0].max": practice("three times the floor"),
    },
  },
});
