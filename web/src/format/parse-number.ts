/** What a person typed, read as a number; or the readings it allows where there are several; or nothing. */
export type NumberReading = { value: number } | { readings: [number, number] } | null;

const PLAIN = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i;
const POWER = /\s*[·×x*]\s*10\s*\^?\s*([+-]?\d+)$/i;
const SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";

/**
 * Reads a number as people write it: point or comma for the decimals, gaps, commas, points or apostrophes between groups of
 * three, a true minus, "3·10^-5" and "3e-5". "1,200" could be 1.2 or 1200: it is never guessed.
 */
export function parseNumber(typed: string): NumberReading {
  const { mantissa, exponent } = splitPower(plainSigns(typed.trim()));
  const readings = readMantissa(mantissa.replace(/(?<=\d)[ '’\u00a0\u2009\u202f](?=\d{3}(\D|$))/g, ""));
  const values = readings.map((text) => Number(text + exponent)).filter(Number.isFinite);
  if (values.length === 2) return { readings: [values[0], values[1]] };
  return values.length === 1 ? { value: values[0] } : null;
}

function plainSigns(text: string): string {
  return text.replace(/[−–]/g, "-").replace(/10([⁻⁰¹²³⁴⁵⁶⁷⁸⁹]+)$/, (_, power: string) => `10^${plainDigits(power)}`);
}

const plainDigits = (power: string): string =>
  [...power].map((sign) => (sign === "⁻" ? "-" : String(SUPERSCRIPTS.indexOf(sign)))).join("");

function splitPower(text: string): { mantissa: string; exponent: string } {
  const power = POWER.exec(text);
  if (!power) return { mantissa: text, exponent: "" };
  return { mantissa: text.slice(0, power.index), exponent: `e${power[1]}` };
}

/** The plain spellings a mantissa can stand for: none, one, or two where a comma may be either kind. */
function readMantissa(text: string): string[] {
  const commas = text.split(",").length - 1;
  const points = text.split(".").length - 1;
  if (commas === 0 && points <= 1) return plain(text);
  if (commas > 0 && points > 0) return readBoth(text);
  if (points > 1) return isGrouped(text, ".") ? plain(text.replaceAll(".", "")) : [];
  if (commas > 1) return isGrouped(text, ",") ? plain(text.replaceAll(",", "")) : [];
  const asDecimal = plain(text.replace(",", "."));
  return isGrouped(text, ",") ? [...asDecimal, ...plain(text.replace(",", ""))] : asDecimal;
}

/** Both signs occur: the last one parts the decimals. */
function readBoth(text: string): string[] {
  const decimal = text.lastIndexOf(",") > text.lastIndexOf(".") ? "," : ".";
  const group = decimal === "," ? "." : ",";
  const [whole, decimals, ...more] = text.split(decimal);
  if (more.length > 0 || !isGrouped(whole, group)) return [];
  return plain(`${whole.replaceAll(group, "")}.${decimals}`);
}

/** Groups of three after a first group of one to three digits that is not a lone zero. */
function isGrouped(text: string, group: "," | "."): boolean {
  const [first, ...others] = text.replace(/^[+-]/, "").split(group);
  return /^[1-9]\d{0,2}$/.test(first) && others.every((part) => /^\d{3}$/.test(part));
}

const plain = (text: string): string[] => (PLAIN.test(text) ? [text] : []);
