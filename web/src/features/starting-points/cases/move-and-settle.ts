import { calculated, practice, startingPoint, tabled } from "../starting-point.ts";

const table = "table of thomsonlinear.com: rail guide with balls, 0.002 to 0.003; fitted with seals three times that";

export const moveAndSettle = startingPoint({
  key: "move-and-settle",
  name: "Move and settle",
  why: "A table on rail guides moves and must stand in place soon: when, and where?",
  shows: "It comes to rest within a micrometre, a few hundredths of a second after the drive stands.",
  draft: {
    purpose: "positioning",
    motion: "linear",
    body: { inertia: 60, stiffness: 3e7, viscous: 2550 },
    contact: { law: { model: "coulomb", static: 0.01, kinetic: 0.008 }, normal: { preload: 0, weight: true } },
    base: [{ kind: "move", distance: 0.1, speed: 0.5, acceleration: 5, start: 0 }],
    span: { seconds: 1 },
    settleBand: 2e-6,
    limits: [
      { quantity: "settleTime", max: 0.12 },
      { quantity: "settleOffset", min: -1e-6, max: 1e-6 },
    ],
    origins: {
      "body.inertia": practice("small positioning table, loaded"),
      "body.stiffness": practice("ball screw drive of a small table, 30 N/μm"),
      "body.viscous": calculated("3 % of critical: 0.06 √(k m)"),
      "contact.law.static": tabled(table, [0.008, 0.012]),
      "contact.law.kinetic": tabled(table, [0.006, 0.008]),
      "base[0].distance": practice("a pitch between two parts"),
      "base[0].speed": practice("30 m/min"),
      "base[0].acceleration": practice("half of g"),
      settleBand: practice("a fifth of a tolerance of 10 μm"),
      "limits[0].max": practice("time given to standing still before the process begins"),
      "limits[1].min": practice("half the settle band"),
      "limits[1].max": practice("half the settle band"),
    },
  },
});
