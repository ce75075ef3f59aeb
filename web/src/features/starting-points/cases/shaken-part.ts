import { practice, startingPoint } from "../starting-point.ts";

export const shakenPart = startingPoint({
  key: "shaken-part",
  name: "Shaken part",
  why: "A part lies loose on a pallet that shakes: does it stay where it was put?",
  shows: "It never slips on the pallet and uses 86 % of what friction can hold: the pallet's peak is 0.26 g.",
  draft: {
    purpose: "holding",
    motion: "linear",
    body: { inertia: 2, stiffness: 0 },
    contact: {
      law: { model: "coulomb", static: 0.3, kinetic: 0.2 },
      normal: { preload: 0, weight: true },
      counterface: "base",
    },
    base: [{ kind: "harmonic", amplitude: 0.001, hz: 8, phase: 0 }],
    span: { seconds: 3, untilRest: false },
    limits: [{ quantity: "slipPerCycle", max: 0 }],
    origins: {
      "body.inertia": practice("a turned part; its mass makes no difference"),
      "contact.law.static": practice(
        "steel part on a steel pallet, dry; tables give 0.15 to 0.30 and more",
        [0.2, 0.4],
      ),
      "contact.law.kinetic": practice("steel part on a steel pallet, dry"),
      "base[0].amplitude": practice("pallet on rollers, 1 mm"),
      "base[0].hz": practice("drive of the conveyor, 480 a minute"),
      "limits[0].max": practice("a robot finds the part where it was put"),
    },
  },
});
