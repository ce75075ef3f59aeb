/** What a fit leaves: an estimate of each value and how they scatter together, in the units it was made in. */
export interface FitReading {
  readonly estimates: readonly number[];
  /** A row for each estimate, in their order. */
  readonly covariance: readonly (readonly number[])[];
}

const figure = /[-+]?(?:\d+\.?\d*|\.\d+)(?:e[-+]?\d+)?/giu;

/**
 * Reads a fit as programs print one: the estimates, then the covariance row by row, with any brackets, commas and line ends
 * between them. Names in quotation marks are passed over.
 *
 * @param count how many values it is to be of
 */
export function readFit(text: string, count: number): FitReading | { readonly message: string } {
  const plain = text.replaceAll("−", "-").replace(/"[^"]*"|'[^']*'/gu, " ");
  const strange = /[^\s[\](){},;:|]+/u.exec(plain.replace(figure, " "));
  if (strange) return { message: `“${strange[0]}” is not a number.` };
  const numbers = (plain.match(figure) ?? []).map(Number);
  const asked = count + count * count;
  if (numbers.length !== asked)
    return {
      message: `${count} estimates and a covariance of ${count} rows of ${count} are ${asked} numbers; these are ${numbers.length}.`,
    };
  const row = (from: number): number[] => numbers.slice(from, from + count);
  return { estimates: row(0), covariance: Array.from({ length: count }, (_, i) => row(count * (i + 1))) };
}
