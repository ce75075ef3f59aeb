/**
 * JSON text of plain data without spaces: what every scenario and result leaves as. Typed arrays become plain lists, members
 * that are undefined are left out, −0 prints as 0.
 * @param order "sorted" sorts keys by UTF-16 units: with ECMAScript's own printing of numbers and strings this is the
 * canonical form of RFC 8785.
 * @throws RangeError where a number is not finite, naming its place: JSON has no such number, and none may become null.
 */
export function jsonText(value: unknown, order: "as given" | "sorted" = "as given"): string {
  const place = placeOfNonFinite(value);
  if (place !== null) throw new RangeError(`${place || "the value"} is not finite, and JSON has no such number`);
  return textOf(value, order === "sorted");
}

function textOf(value: unknown, isSorted: boolean): string {
  if (value instanceof Float64Array) return `[${value.join(",")}]`;
  if (Array.isArray(value)) return `[${value.map((item) => textOf(item, isSorted)).join(",")}]`;
  if (typeof value !== "object" || value === null) return JSON.stringify(value ?? null);
  const keys = isSorted ? Object.keys(value).sort() : Object.keys(value);
  let members = "";
  for (const key of keys) {
    const member = (value as Record<string, unknown>)[key];
    if (member !== undefined) members += `${members && ","}${JSON.stringify(key)}:${textOf(member, isSorted)}`;
  }
  return `{${members}}`;
}

/** Where the first number lies that is not finite, as `samples.t[3]`; null where all are. */
function placeOfNonFinite(value: unknown): string | null {
  if (typeof value === "number") return Number.isFinite(value) ? null : "";
  if (typeof value !== "object" || value === null) return null;
  if (Array.isArray(value) || value instanceof Float64Array) {
    for (let i = 0; i < value.length; i++) {
      const place = placeOfNonFinite(value[i]);
      if (place !== null) return joined(`[${i}]`, place);
    }
    return null;
  }
  for (const key in value) {
    const place = placeOfNonFinite((value as Record<string, unknown>)[key]);
    if (place !== null) return joined(key, place);
  }
  return null;
}

const joined = (step: string, rest: string) => (rest === "" || rest.startsWith("[") ? step + rest : `${step}.${rest}`);
