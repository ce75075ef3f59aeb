import { sharedValue, useSharedValue } from "../shared-value.ts";

/** The units a person thinks in: what numbers are shown in where nobody chose a unit for the one number. */
export const unitSystems = [
  { key: "millimetre", label: "mm–N–kg" },
  { key: "metre", label: "m–kg–s" },
  { key: "inch", label: "inch–pound" },
] as const;

export type UnitSystem = (typeof unitSystems)[number]["key"];

const inForce = sharedValue<UnitSystem>("millimetre");
let account = "";

const keyOf = (accountId: string): string => `restband-units ${accountId}`;

/** Puts the choice of an account in force, as this browser remembers it. */
export function openUnitSystem(accountId: string): void {
  account = accountId;
  inForce.set(remembered(accountId));
}

function remembered(accountId: string): UnitSystem {
  try {
    const kept = localStorage.getItem(keyOf(accountId));
    return unitSystems.find(({ key }) => key === kept)?.key ?? "millimetre";
  } catch {
    return "millimetre";
  }
}

/** Chooses for the account whose choice is in force, and remembers it. */
export function chooseUnitSystem(system: UnitSystem): void {
  try {
    localStorage.setItem(keyOf(account), system);
  } catch {
    // Storage is refused: the choice lasts as long as the page.
  }
  inForce.set(system);
}

/**
 * Puts units in force that are not the account's choice: those a page is told in. Nothing is remembered.
 * @returns how to go back to the account's own
 */
export function lendUnitSystem(system: UnitSystem): () => void {
  inForce.set(system);
  return () => inForce.set(remembered(account));
}

/** The account's own choice, whatever is in force. */
export const ownUnitSystem = (): UnitSystem => remembered(account);

export const unitSystem = (): UnitSystem => inForce.get();

/** The choice in force, and a new render when it changes. */
export const useUnitSystem = (): UnitSystem => useSharedValue(inForce);
