import { measures, type Given } from "./formula.ts";

/** A length above 0. */
export const lengthOf = <Key extends string>(key: Key, label: string, symbol: string, help?: string): Given<Key> => ({
  key,
  label,
  symbol,
  measure: measures.length,
  unit: "mm",
  exclusiveMinimum: 0,
  help,
});

/** The bore of something round that may be solid: 0 where there is none. */
export const bore: Given<"bore"> = {
  key: "bore",
  label: "Bore",
  symbol: "d_i",
  measure: measures.length,
  unit: "mm",
  minimum: 0,
  initial: 0,
  help: "0 where it is solid",
};

/** A bore must leave something of what is round. */
export function boreFault({ diameter, bore: inner }: { diameter: number; bore: number }) {
  return inner < diameter
    ? null
    : { key: "bore" as const, message: "The bore is smaller than the diameter around it." };
}
