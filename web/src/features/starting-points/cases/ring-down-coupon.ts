import { practice, startingPoint } from "../starting-point.ts";

export const ringDownCoupon = startingPoint({
  key: "ring-down-coupon",
  name: "Ring-down coupon",
  why: "A strip is plucked and rings out: how many swings are there to fit friction and loss to?",
  shows: "It comes to rest after dozens of swings; friction takes the same step off each, the material a share of it.",
  draft: {
    purpose: "test",
    motion: "linear",
    body: { inertia: 0.05, stiffness: 2000 },
    solid: { model: "displacement-proportional", lossFactor: 0.01 },
    contact: { law: { model: "coulomb", static: 0.1, kinetic: 0.1 }, normal: { preload: 0.5 } },
    initial: { displacement: 0.005, velocity: 0 },
    span: { seconds: 5 },
    limits: [{ quantity: "halfCycles", min: 20 }],
    origins: {
      "body.inertia": practice("end of a steel strip with an accelerometer"),
      "body.stiffness": practice("strip of 2 N/mm at its end"),
      "solid.lossFactor": {
        kind: "assumed",
        source: "common practice: order 0.01 for cast iron; sources differ tenfold",
        low: 0.002,
        high: 0.02,
      },
      "contact.law.static": practice("felt guide, sliding and at rest alike"),
      "contact.law.kinetic": practice("felt guide, sliding and at rest alike"),
      "contact.normal.preload": practice("light touch of the guide", [0.4, 0.6]),
      "initial.displacement": practice("plucked by 5 mm"),
      "limits[0].min": practice("ten full swings for a fit"),
    },
  },
});
