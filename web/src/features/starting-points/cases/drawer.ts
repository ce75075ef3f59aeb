import { practice, startingPoint } from "../starting-point.ts";

export const drawer = startingPoint({
  key: "drawer",
  name: "Drawer to its stop",
  why: "A spring draws a drawer shut against its runners: does it arrive, or stay ajar?",
  shows: "It comes to rest a few millimetres from its stop after one soft swing; friction decides how far.",
  draft: {
    purpose: "positioning",
    motion: "linear",
    body: { inertia: 12, stiffness: 60, viscous: 30 },
    contact: { law: { model: "coulomb", static: 0.02, kinetic: 0.015 }, normal: { preload: 0, weight: true } },
    initial: { displacement: 0.3, velocity: 0 },
    span: { seconds: 10 },
    limits: [{ quantity: "restOffset", min: -0.01, max: 0.01 }],
    origins: {
      "body.inertia": practice("a full drawer"),
      "body.stiffness": practice("pull-in spring, 18 N when 0.3 m open"),
      "body.viscous": practice("small oil damper"),
      "contact.law.static": practice(
        "roller runners: catalogue 0.001 to 0.006, fitted and dusty several times that",
        [0.015, 0.03],
      ),
      "contact.law.kinetic": practice("roller runners, fitted", [0.01, 0.02]),
      "initial.displacement": practice("let go 300 mm open"),
      "limits[0].min": practice("the seal yields 10 mm"),
      "limits[0].max": practice("ajar by 10 mm counts as shut"),
    },
  },
});
