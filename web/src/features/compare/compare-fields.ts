import { fieldPaths, type Scenario } from "@restband/solver";
import { formatNumber } from "../../format/format-number.ts";

/** A part of two scenarios that is not the same, both in words; `path` is that of the part. */
export interface PartDifference {
  readonly path: string;
  readonly label: string;
  readonly mine: string;
  readonly theirs: string;
}

/** How the members of a scenario are read and said. */
export interface FieldWords {
  readonly read: (scenario: Scenario, path: string) => unknown;
  readonly label: (scenario: Scenario, path: string) => string;
  readonly value: (scenario: Scenario, path: string) => string;
  /** Null where nobody has said it. */
  readonly origin: (scenario: Scenario, path: string) => string | null;
}

export interface FieldRow {
  readonly path: string;
  readonly label: string;
  readonly values: readonly [string, string];
  readonly origins: readonly [string | null, string | null];
  /** "12 times", "+5 %"; empty where it cannot be told so. */
  readonly change: string;
}

export interface FieldComparison {
  readonly rows: readonly FieldRow[];
  /** Numbers that both have and that are equal. */
  readonly same: number;
}

/**
 * What two scenarios do not have in common, number by number where both are built alike and part by part where they are not.
 * @param parts every part that differs at all
 */
export function compareFields(
  a: Scenario,
  b: Scenario,
  parts: readonly PartDifference[],
  words: FieldWords,
): FieldComparison {
  const inBoth = new Set(fieldPaths(b));
  const paths = fieldPaths(a).filter((path) => inBoth.has(path));
  const isEqual = (path: string): boolean => words.read(a, path) === words.read(b, path);
  const row = rowOf(a, b, words);
  const rows = parts.filter(({ path }) => path !== "origins").flatMap((part) => rowsOfPart(part));

  function rowsOfPart(part: PartDifference): FieldRow[] {
    const within = paths.filter((path) => isUnder(path, part.path) && !isEqual(path));
    const isAlike = shapeOf(words.read(a, part.path)) === shapeOf(words.read(b, part.path));
    if (isAlike && within.length > 0) return within.map((path) => row(path));
    return [row(part.path, part)];
  }

  const told = new Set(rows.map(({ path }) => path));
  const moved = originPaths(a, b).filter((path) => !told.has(path) && inBoth.has(path));
  return { rows: [...rows, ...moved.map((path) => row(path))], same: paths.filter(isEqual).length };
}

const rowOf =
  (a: Scenario, b: Scenario, words: FieldWords) =>
  (path: string, part?: PartDifference): FieldRow => ({
    path,
    label: part?.label ?? words.label(a, path),
    values: part ? [part.mine, part.theirs] : [words.value(a, path), words.value(b, path)],
    origins: [words.origin(a, path), words.origin(b, path)],
    change: changeWords(words.read(a, path), words.read(b, path)),
  });

const isUnder = (path: string, root: string): boolean =>
  path === root || path.startsWith(`${root}.`) || path.startsWith(`${root}[`);

/** Kinds and lengths without the numbers. */
const shapeOf = (value: unknown): string =>
  JSON.stringify(value, (_, part: unknown) => (typeof part === "number" ? 0 : part)) ?? "";

/** Paths of values whose origin is not the same in both. */
function originPaths(a: Scenario, b: Scenario): string[] {
  const paths = new Set([...Object.keys(a.origins), ...Object.keys(b.origins)]);
  return [...paths].filter((path) => JSON.stringify(a.origins[path]) !== JSON.stringify(b.origins[path]));
}

/** How much a number has become of another: times from twice and half on, else per cent. */
export function changeWords(from: unknown, to: unknown): string {
  if (typeof from !== "number" || typeof to !== "number" || from === to) return "";
  const ratio = to / from;
  if (!Number.isFinite(ratio) || ratio <= 0) return "";
  if (ratio >= 2) return `${formatNumber(ratio, 3)} times`;
  if (ratio <= 0.5) return `1/${formatNumber(1 / ratio, 3)}`;
  const percent = formatNumber(100 * Math.abs(ratio - 1), 2);
  return `${ratio > 1 ? "+" : "−"}${percent}\u00a0%`;
}
