const MINUS = "\u2212";
const NARROW_GAP = "\u202f";
const SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";

/**
 * A number as people read it: `digits` significant digits but never less than its whole part, trailing zeros dropped
 * unless `keepZeros`, a true minus, four digits ungrouped and five or more with a narrow gap; powers of ten from 10⁷ up
 * and below 10⁻⁴.
 */
export function formatNumber(value: number, digits = 3, keepZeros = false): string {
  if (value === 0) return "0";
  const size = rounded(Math.abs(value), digits);
  if (size >= 1e7 || size < 1e-4) return signed(value, powerOfTen(size, digits, keepZeros));
  const text = plain(size, digits);
  return signed(value, grouped(keepZeros ? text : withoutTrailingZeros(text)));
}

/** An input as it was given: all its digits, free of the noise that unit conversion leaves after the twelfth. */
export function formatExactly(value: number): string {
  const size = Number(Math.abs(value).toPrecision(12));
  const isPlain = size === 0 || (size >= 1e-6 && size < 1e12);
  return isPlain
    ? signed(value, grouped(withoutTrailingZeros(size === 0 ? "0" : plain(size, 12))))
    : formatNumber(value, 12);
}

/** A number to a fixed number of decimals, for columns and readouts that must not jump. */
export function formatFixed(value: number, decimals: number): string {
  const text = Math.abs(value).toFixed(decimals);
  return Number(text) === 0 ? grouped(text) : signed(value, grouped(text));
}

/** Every digit of the value, for a title that shows full precision. */
export const formatFully = (value: number): string => String(value).replace("-", MINUS);

function rounded(size: number, digits: number): number {
  return size >= 10 ** digits && size < 1e7 ? Math.round(size) : Number(size.toPrecision(digits));
}

function signed(value: number, text: string): string {
  return value < 0 ? MINUS + text : text;
}

function plain(size: number, digits: number): string {
  const exponent = Math.floor(Math.log10(size));
  return size.toFixed(Math.max(0, digits - 1 - exponent));
}

function powerOfTen(size: number, digits: number, keepZeros: boolean): string {
  const [mantissa, exponent] = size.toExponential(digits - 1).split("e");
  const power = superscript(Number(exponent));
  const shown = keepZeros ? mantissa : withoutTrailingZeros(mantissa);
  return `${shown}·10${power}`;
}

const withoutTrailingZeros = (text: string): string => (text.includes(".") ? text.replace(/\.?0+$/, "") : text);

function superscript(exponent: number): string {
  const digits = [...String(Math.abs(exponent))].map((digit) => SUPERSCRIPTS[Number(digit)]).join("");
  return exponent < 0 ? `⁻${digits}` : digits;
}

function grouped(text: string): string {
  const [whole, decimals] = text.split(".");
  const gapped = whole.length > 4 ? whole.replace(/\B(?=(\d{3})+$)/g, NARROW_GAP) : whole;
  return decimals === undefined ? gapped : `${gapped}.${decimals}`;
}
