import { practice, startingPoint } from "../starting-point.ts";

export const valveSpool = startingPoint({
  key: "valve-spool",
  name: "Valve spool with dither",
  why: "A solenoid moves a spool that friction would hold: does dither free it?",
  shows:
    "The push alone is less than friction can hold; with dither the spool swings about where the spring would have it.",
  draft: {
    purpose: "positioning",
    motion: "linear",
    body: { inertia: 0.08, stiffness: 8000, viscous: 20 },
    contact: { law: { model: "coulomb", static: 0.25, kinetic: 0.15 }, normal: { preload: 20 } },
    force: [
      { kind: "constant", value: 4 },
      { kind: "harmonic", amplitude: 12, hz: 100, phase: 0 },
    ],
    span: { seconds: 0.5, untilRest: false },
    limits: [{ quantity: "meanDisplacement", min: 0.00045, max: 0.00055 }],
    origins: {
      "body.inertia": practice("spool with its plunger"),
      "body.stiffness": practice("centring spring, 8 N/mm"),
      "body.viscous": practice("oil in the gap"),
      "contact.law.static": practice("lapped steel in oil, with particles", [0.2, 0.3]),
      "contact.law.kinetic": practice("lapped steel in oil", [0.1, 0.15]),
      "contact.normal.preload": practice("side load by uneven pressure"),
      "force[0].value": practice("solenoid at a small command: 0.5 mm against the spring"),
      "force[1].amplitude": practice("dither by ripple of the current"),
      "force[1].hz": practice("dither of 100 Hz"),
      "limits[0].min": practice("a tenth of the command"),
      "limits[0].max": practice("a tenth of the command"),
    },
  },
});
