import { sharedValue, useSharedValue } from "../shared-value.ts";

/** The units a person thinks in: what numbers are shown in where nobody chose a unit for the one number. */
export const unitSystems = [
  { key: "millimetre", label: "mm–N–kg" },
  { key: "metre", label: "m–kg–s" },
  { key: "inch", label: "inch–pound" },
] as const;

export type UnitSystem = (typeof unitSystems)[number]["key"];

let own: UnitSystem = "millimetre";
const inForce = sharedValue<UnitSystem>(own);

/** Puts the choice of the person signed in in force on every page. */
export function showUnitSystem(system: UnitSystem): void {
  if (system === own) return;
  own = system;
  inForce.set(system);
}

/**
 * Puts units in force that are not the person's choice: those a page is told in. Nothing is remembered.
 * @returns how to go back to the person's own
 */
export function lendUnitSystem(system: UnitSystem): () => void {
  inForce.set(system);
  return () => inForce.set(own);
}

/** The person's own choice, whatever is in force. */
export const ownUnitSystem = (): UnitSystem => own;

export const unitSystem = (): UnitSystem => inForce.get();

/** The choice in force, and a new render when it changes. */
export const useUnitSystem = (): UnitSystem => useSharedValue(inForce);
