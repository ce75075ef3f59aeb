import type { Field } from "@restband/solver";
import { fromSi, toSi, type Unit } from "../../../format/unit.ts";

/**
 * A value moved by a share of itself (SI in and out), rounded in its unit to where the share can be seen: 2 mm/s goes to
 * 2.02 mm/s. Zero moves by that share of where the field starts; whole numbers by at least one. Bounds hold.
 */
export function nudged(value: number, share: number, field: Field, unit: Unit): number {
  const moved = field.integer ? movedWhole(value, share) : movedByShare(value, share, field, unit);
  return isWithin(moved, field) ? moved : value;
}

const movedWhole = (value: number, share: number): number =>
  value + Math.sign(share) * Math.max(1, Math.round(Math.abs(value * share)));

function movedByShare(value: number, share: number, field: Field, unit: Unit): number {
  const size = Math.abs(fromSi(value, unit)) || Math.abs(fromSi(field.initial, unit)) || 1;
  const step = share * size;
  const places = Math.max(0, 1 - Math.floor(Math.log10(Math.abs(step))));
  return toSi(Number((fromSi(value, unit) + step).toFixed(Math.min(places, 20))), unit);
}

function isWithin(value: number, { minimum, maximum, exclusiveMinimum, exclusiveMaximum }: Field): boolean {
  return (
    value >= (minimum ?? -Infinity) &&
    value <= (maximum ?? Infinity) &&
    value > (exclusiveMinimum ?? -Infinity) &&
    value < (exclusiveMaximum ?? Infinity)
  );
}
