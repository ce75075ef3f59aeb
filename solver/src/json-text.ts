/**
 * JSON text of plain data without spaces: what every scenario and result leaves as. Typed arrays become plain lists, members
 * that are undefined are left out, −0 prints as 0.
 * @param order "sorted" sorts keys by UTF-16 units: with ECMAScript's own printing of numbers and strings this is the
 * canonical form of RFC 8785.
 * @throws RangeError where a number is not finite, naming its place: JSON has no such number, and none may become null.
 */
export function jsonText(value: unknown, order: "as given" | "sorted" = "as given", path = ""): string {
  if (typeof value === "number") return numberText(value, path);
  if (value instanceof Float64Array) return numbersText(value, path);
  if (Array.isArray(value)) return `[${value.map((item, i) => jsonText(item, order, `${path}[${i}]`)).join(",")}]`;
  if (typeof value !== "object" || value === null) return JSON.stringify(value ?? null);
  const members = Object.entries(value).filter(([, member]) => member !== undefined);
  if (order === "sorted") members.sort(([a], [b]) => (a < b ? -1 : 1));
  return `{${members.map(([key, member]) => `${JSON.stringify(key)}:${jsonText(member, order, `${path}.${key}`)}`).join(",")}}`;
}

function numberText(value: number, path: string): string {
  if (!Number.isFinite(value)) throw new RangeError(`${path || "the value"} is ${value}, which JSON cannot hold`);
  return String(value);
}

function numbersText(values: Float64Array, path: string): string {
  const bad = values.findIndex((value) => !Number.isFinite(value));
  return bad < 0 ? `[${values.join(",")}]` : numberText(values[bad], `${path}[${bad}]`);
}
