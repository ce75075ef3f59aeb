import type { Dimension } from "@restband/solver";

/** What a number measures: what fields of scenarios do, and what only the way to a value needs. */
export type Measurand =
  | Dimension
  | "pressure" // Pa always: elastic moduli, stresses
  | "density"; // kg/m³ always

/** A unit people type and read. SI value = value in this unit × factor. */
export interface Unit {
  /** As it is shown and chosen: "N/μm". Micro is U+03BC. */
  readonly label: string;
  /** SI (or, for angles and frequencies, the format's own unit) per one of this unit; exact by definition where one exists. */
  readonly factor: number;
  /** Shown unasked from this many of it on; absent: only where a person chooses it. */
  readonly from?: number;
  /** The same for a person who thinks in inches and pounds. */
  readonly inchFrom?: number;
  /** Other ways to type it, beside the label itself. */
  readonly aliases?: readonly string[];
}

export type Motion = "linear" | "angular";

/** What a number measures and on which kind of body: together they settle its units. */
export interface Measure {
  readonly dimension: Measurand;
  readonly motion: Motion;
  /** A plain number that is a share of something, read as a percentage. */
  readonly isShare?: boolean;
}

/** The value in SI of `value` in `unit`. Powers of ten shift the decimal point, so that 1.2 mm is 0.0012 m to the last bit. */
export function toSi(value: number, unit: Unit): number {
  const exponent = decimalExponent(unit.factor);
  return exponent === null ? value * unit.factor : shifted(value, exponent);
}

/** The value in `unit` of `value` in SI. */
export function fromSi(value: number, unit: Unit): number {
  const exponent = decimalExponent(unit.factor);
  return exponent === null ? value / unit.factor : shifted(value, -exponent);
}

/** `fromSi` to rounding, many times as fast: for the thousands of points of a curve, which nobody reads as figures. */
export const roughlyFromSi = (value: number, unit: Unit): number => value / unit.factor;

function decimalExponent(factor: number): number | null {
  const exponent = Math.round(Math.log10(factor));
  return Number(`1e${exponent}`) === factor ? exponent : null;
}

function shifted(value: number, places: number): number {
  if (!Number.isFinite(value)) return value;
  const [digits, exponent] = value.toExponential().split("e");
  return Number(`${digits}e${Number(exponent) + places}`);
}
