import { practice, startingPoint } from "../starting-point.ts";

export const massOnABelt = startingPoint({
  key: "mass-on-a-belt",
  name: "Mass on a moving belt",
  why: "A carton lies on a running belt against a springy stop: does it shudder?",
  shows: "It sticks and slips three times a second, and presses the stop by 15 mm.",
  draft: {
    purpose: "other",
    motion: "linear",
    body: { inertia: 5, stiffness: 2000 },
    contact: {
      law: { model: "coulomb", static: 0.5, kinetic: 0.35 },
      normal: { preload: 0, weight: true },
      counterface: { velocity: 0.1 },
    },
    span: { seconds: 8, untilRest: false },
    limits: [{ quantity: "peakDisplacement", max: 0.018 }],
    origins: {
      "body.inertia": practice("a full carton"),
      "body.stiffness": practice("sheet metal stop, 2 N/mm"),
      "contact.law.static": practice("cardboard on a rubber belt, at rest", [0.45, 0.55]),
      "contact.law.kinetic": practice("cardboard on a rubber belt, sliding", [0.3, 0.4]),
      "contact.counterface.velocity": practice("slow sorting belt"),
      "limits[0].max": practice("the gap behind the stop"),
    },
  },
});
