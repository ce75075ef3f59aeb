/** A double as Python reads it, with every digit it has; −0 as 0. */
export function pythonNumber(value: number): string {
  const text = String(0 + value);
  return /^-?\d+$/.test(text) ? `${text}.0` : text;
}

/** A text as a Python literal on one line: JSON's escapes are Python's too. */
export function pythonText(text: string): string {
  return JSON.stringify(text);
}

/** A number, or None. */
export function pythonValue(value: number | null): string {
  return value === null ? "None" : pythonNumber(value);
}

/** Numbers in a list, a few on each line. */
export function pythonList(values: readonly number[]): string {
  const perLine = 6;
  const lines: string[] = [];
  for (let i = 0; i < values.length; i += perLine)
    lines.push(
      values
        .slice(i, i + perLine)
        .map(pythonNumber)
        .join(", "),
    );
  return `[\n    ${lines.join(",\n    ")},\n]`;
}
