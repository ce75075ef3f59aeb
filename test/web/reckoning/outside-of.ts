import type { Given } from "../../../web/src/features/reckoning/formula/formula.ts";

/** Whether a number is outside the bounds of a given. */
export const outsideOf = (given: Given, value: number): boolean =>
  !(value >= (given.minimum ?? -Infinity)) ||
  !(value > (given.exclusiveMinimum ?? -Infinity)) ||
  !(value <= (given.maximum ?? Infinity)) ||
  !(value < (given.exclusiveMaximum ?? Infinity)) ||
  (given.integer === true && !Number.isInteger(value));
