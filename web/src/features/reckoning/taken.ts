import type { Origin } from "@restband/solver";

/** A value a reckoning gives to a field of the scenario, with where it comes from. */
export interface Taken {
  readonly path: string;
  /** SI. */
  readonly value: number;
  readonly origin: Origin;
}

/** A result as it is shown, to four digits: what is taken is what was seen. */
export const asShown = (value: number): number => Number(value.toPrecision(4));
