import { calculated, practice, startingPoint, tabled } from "../starting-point.ts";

const table = "table of an introductory physics text (Pressbooks): cast iron on steel, greased";

export const machineSlide = startingPoint({
  key: "machine-slide",
  name: "Machine slide on a feed drive",
  why: "A slide on plain ways at a creeping feed: will it move evenly?",
  shows: "It sticks and slips at 20 mm/min, 54 times a second: the feed is well below the one from which it slides.",
  draft: {
    purpose: "feed",
    motion: "linear",
    body: { inertia: 300, stiffness: 1e8, viscous: 17_300 },
    contact: { law: { model: "coulomb", static: 0.21, kinetic: 0.133 }, normal: { preload: 0, weight: true } },
    base: [{ kind: "ramp", rate: 0.02 / 60, start: 0, stop: "none" }],
    span: { seconds: 1, untilRest: false },
    limits: [
      { quantity: "stickFraction", max: 0 },
      { quantity: "followingErrorPeak", max: 10e-6 },
    ],
    origins: {
      "body.inertia": practice("slide with its table and a workpiece"),
      "body.stiffness": practice("screw, nut and bearing in series, 100 N/μm"),
      "body.viscous": calculated("5 % of critical: 0.1 √(k m)"),
      "contact.law.static": tabled(table, [0.18, 0.24]),
      "contact.law.kinetic": tabled(table, [0.11, 0.15]),
      "base[0].rate": { ...practice("a finishing cut"), entered: "20 mm/min" },
      "limits[0].max": practice("no mark on the surface"),
      "limits[1].max": practice("a tenth of the tolerance of a good part"),
    },
  },
});
