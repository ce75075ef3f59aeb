import type { Fault, Scenario } from "./scenario.ts";

/**
 * Why a checked scenario has no closed form between events, so that the adaptive method is needed; null where the exact
 * one applies. (A ripple that lets the contact go has one: the instants at which it does are corners.)
 */
export function needsAdaptive({ contact, body, force }: Scenario): Fault | null {
  const { model } = contact.law;
  if (model !== "none" && model !== "coulomb")
    return { path: "contact.law.model", message: "The exact method needs friction that does not vary with speed." };
  if (body.cubic !== 0) return { path: "body.cubic", message: "The exact method needs a spring without a cubic part." };
  const chirp = force.findIndex((term) => term.kind === "chirp");
  if (chirp < 0) return null;
  return { path: `force[${chirp}].kind`, message: "The exact method has no closed form for a chirp." };
}
