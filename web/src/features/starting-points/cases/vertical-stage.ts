import { practice, startingPoint } from "../starting-point.ts";

export const verticalStage = startingPoint({
  key: "vertical-stage",
  name: "Vertical stage held by friction",
  why: "A stage stands on a vertical guide by nothing but its gibs: how near is it to falling?",
  shows:
    "It never moves and uses 65 % of what friction can hold; the caution says why that must not be all that holds it.",
  draft: {
    purpose: "holding",
    motion: "linear",
    body: { inertia: 8, stiffness: 0 },
    contact: { law: { model: "coulomb", static: 0.2, kinetic: 0.15 }, normal: { preload: 300, faces: 2 } },
    incline: 90,
    span: { seconds: 1 },
    limits: [{ quantity: "holdUse", max: 0.8 }],
    origins: {
      "body.inertia": practice("camera stage with its bracket"),
      "contact.law.static": practice("steel on steel, hardly oiled; tables give 0.10 to 0.30", [0.15, 0.25]),
      "contact.law.kinetic": practice("steel on steel, hardly oiled"),
      "contact.normal.preload": practice("gib screws tightened by hand"),
      "contact.normal.faces": practice("gib and way"),
      incline: practice("straight up"),
      "limits[0].max": practice("0.8 of what holds, as information only"),
    },
  },
});
