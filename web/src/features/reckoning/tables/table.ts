import type { Taken } from "../taken.ts";

/** What sources print for one number: their own figures, and the span of all of them. */
export interface Printed {
  /** As printed, several sources parted by semicolons. */
  readonly text: string;
  readonly low: number;
  readonly high: number;
}

/** One line of a table: values by the path of the field they are for. */
export interface TableRow {
  readonly key: string;
  readonly name: string;
  readonly condition: string;
  readonly printed: Readonly<Record<string, Printed>>;
  readonly source: string;
  /** What this line leaves in doubt. */
  readonly caveat?: string;
}

export interface Table {
  readonly caption: string;
  /** Heads the first column. */
  readonly head: string;
  readonly columns: readonly { readonly path: string; readonly label: string }[];
  readonly rows: readonly TableRow[];
  /** What the sources themselves say about such tables. */
  readonly caution: string;
  /** The value taken out of a span, and how that is said. */
  readonly middle: (low: number, high: number) => number;
  readonly middleWords: string;
}

/** A single figure, or a span; `text` where the sources print more than that. */
export function printed(low: number, high = low, text = low === high ? String(low) : `${low}–${high}`): Printed {
  return { text, low, high };
}

/** The values of a row with their ranges; a single figure has no range, because none is printed. */
export function takenFrom({ columns, middle }: Table, row: TableRow): Taken[] {
  const source = `${row.name}, ${row.condition}: ${row.source}`;
  return columns.flatMap(({ path }) => {
    const found = row.printed[path];
    if (!found) return [];
    const { low, high } = found;
    const origin = { kind: "catalogue", source } as const;
    return low === high
      ? [{ path, value: low, origin }]
      : [{ path, value: rounded(middle(low, high)), origin: { ...origin, low, high } }];
  });
}

/** A middle to three digits: a table that spans so much has no more. */
const rounded = (value: number): number => Number(value.toPrecision(3));
