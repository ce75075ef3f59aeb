import { measures, type Given, type Preset } from "./formula.ts";

/* Moduli and densities are customary values for the kind of material, from memory; an alloy's own sheet goes before them. */

export const modulus = {
  key: "modulus",
  label: "Young’s modulus",
  symbol: "E",
  measure: measures.pressure,
  exclusiveMinimum: 0,
  initial: 210e9,
} as const satisfies Given;

export const shearModulus = {
  key: "shearModulus",
  label: "Shear modulus",
  symbol: "G",
  measure: measures.pressure,
  exclusiveMinimum: 0,
  initial: 80e9,
} as const satisfies Given;

export const density = {
  key: "density",
  label: "Density",
  symbol: "ρ",
  measure: measures.density,
  exclusiveMinimum: 0,
  initial: 7850,
} as const satisfies Given;

const materials = [
  { label: "Steel", modulus: 210e9, shearModulus: 80e9, density: 7850 },
  { label: "Grey cast iron", modulus: 110e9, shearModulus: 45e9, density: 7200 },
  { label: "Aluminium alloy", modulus: 70e9, shearModulus: 26e9, density: 2700 },
  { label: "Bronze", modulus: 105e9, shearModulus: 40e9, density: 8800 },
  { label: "Titanium alloy", modulus: 114e9, shearModulus: 43e9, density: 4430 },
] as const;

/** The materials as a choice that fills one property. */
export const materialsFor = <Key extends "modulus" | "shearModulus" | "density">(property: Key): Preset<Key> => ({
  label: "Material",
  options: materials.map((material) => ({ label: material.label, values: pick(material, property) })),
});

function pick<Key extends string>(numbers: Readonly<Record<Key, number>>, key: Key): Partial<Record<Key, number>> {
  const picked: Partial<Record<Key, number>> = {};
  picked[key] = numbers[key];
  return picked;
}
