import { calculated, practice, startingPoint, tabled } from "../starting-point.ts";

const table = "table of an introductory physics text (Pressbooks): cast iron on steel, greased";

export const smallSteps = startingPoint({
  key: "small-steps",
  name: "Staircase of small steps",
  why: "The drive steps by 2 μm: which step does the slide follow, and how far does it jump?",
  shows: "It stands for three steps, as long as the spring pulls less than friction can hold, then jumps 6 μm at once.",
  draft: {
    purpose: "positioning",
    motion: "linear",
    body: { inertia: 300, stiffness: 1e8, viscous: 17_300 },
    contact: { law: { model: "coulomb", static: 0.21, kinetic: 0.133 }, normal: { preload: 0, weight: true } },
    base: [{ kind: "staircase", increment: 2e-6, count: 20, dwell: 0.2, speed: 0.001, acceleration: 0.1, start: 0 }],
    span: { seconds: 4.5, untilRest: false },
    settleBand: 1e-6,
    limits: [{ quantity: "settleOffset", min: -3e-6, max: 3e-6 }],
    origins: {
      "body.inertia": practice("slide with its table and a workpiece"),
      "body.stiffness": practice("screw, nut and bearing in series, 100 N/μm"),
      "body.viscous": calculated("5 % of critical: 0.1 √(k m)"),
      "contact.law.static": tabled(table),
      "contact.law.kinetic": tabled(table),
      "base[0].increment": practice("the least step a drive is asked for"),
      "base[0].count": practice("enough to see several jumps"),
      "base[0].dwell": practice("time to read a gauge"),
      "base[0].speed": practice("1 mm/s"),
      "base[0].acceleration": practice("0.1 m/s²"),
      settleBand: practice("half a step"),
      "limits[0].min": practice("a step and a half"),
      "limits[0].max": practice("a step and a half"),
    },
  },
});
