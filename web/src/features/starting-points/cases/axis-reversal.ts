import { calculated, practice, startingPoint, tabled } from "../starting-point.ts";

const table = "table of r2r.tech: bush lined with PTFE; static within 20 % of kinetic";

export const axisReversal = startingPoint({
  key: "axis-reversal",
  name: "Reversal of an axis",
  why: "An axis goes out and comes back: how much of the first travel is lost?",
  shows: "The first 2.9 μm of the way back are lost; friction could take 11 μm, 2 μs N/k, at most.",
  draft: {
    purpose: "positioning",
    motion: "linear",
    body: { inertia: 300, stiffness: 5e7, viscous: 24_500 },
    contact: { law: { model: "coulomb", static: 0.09, kinetic: 0.08 }, normal: { preload: 0, weight: true } },
    base: [
      { kind: "move", distance: 0.01, speed: 0.05, acceleration: 1, start: 0 },
      { kind: "move", distance: -0.01, speed: 0.05, acceleration: 1, start: 0.5 },
    ],
    span: { seconds: 1.2, untilRest: false },
    limits: [{ quantity: "lostMotion", max: 15e-6 }],
    origins: {
      "body.inertia": practice("table with a workpiece"),
      "body.stiffness": practice("ball screw drive, 50 N/μm"),
      "body.viscous": calculated("10 % of critical: 0.2 √(k m)"),
      "contact.law.static": tabled(table, [0.08, 0.12]),
      "contact.law.kinetic": tabled(table, [0.04, 0.1]),
      "base[0].distance": practice("a short stroke of a reversal test"),
      "base[0].speed": practice("3 m/min"),
      "base[0].acceleration": practice("1 m/s², unhurried"),
      "base[1].distance": practice("the same way back"),
      "base[1].speed": practice("3 m/min"),
      "base[1].acceleration": practice("1 m/s², unhurried"),
      "base[1].start": practice("a pause of 0.25 s"),
      "limits[0].max": practice("what a drive's compensation is asked to cover"),
    },
  },
});
