import { practice, startingPoint, tabled } from "../starting-point.ts";

const table = "table of pickedshares.com: steel on steel, 0.15 to 0.30 dry, 0.10 oiled";

export const forcedClamp = startingPoint({
  key: "forced-clamp",
  name: "Forced clamp",
  why: "A clamp holds a part while a tool pushes to and fro: how much of the hold is used?",
  shows: "It never moves and uses 53 % of the hold; with oil between the faces it uses more than is allowed.",
  draft: {
    purpose: "holding",
    motion: "linear",
    body: { inertia: 20, stiffness: 2e6 },
    contact: { law: { model: "coulomb", static: 0.15, kinetic: 0.1 }, normal: { preload: 2500, faces: 2 } },
    force: [{ kind: "harmonic", amplitude: 400, hz: 30, phase: 0 }],
    span: { seconds: 1, untilRest: false },
    limits: [{ quantity: "holdUse", max: 0.7 }],
    origins: {
      "body.inertia": practice("part with its plate"),
      "body.stiffness": practice("arm of the fixture, 2 N/μm"),
      "contact.law.static": tabled(table, [0.1, 0.2]),
      "contact.law.kinetic": tabled(table),
      "contact.normal.preload": practice("one M6 screw, tightened by hand"),
      "contact.normal.faces": practice("jaw on both sides"),
      "force[0].amplitude": practice("cutting force of a small end mill"),
      "force[0].hz": practice("two teeth at 900 turns a minute"),
      "limits[0].max": practice("0.7 of what holds, for wear and dirt"),
    },
  },
});
