import type { Scenario } from "@restband/solver";
import type { Sheet } from "./draft.ts";

/** A change of structure: what is kept by path goes with its value, or away with it. */
export function restructured(
  sheet: Sheet,
  apply: (scenario: Scenario) => Scenario,
  rename = (path: string): string | null => path,
): Sheet {
  return {
    ...sheet,
    wanted: apply(sheet.wanted),
    unread: renamed(sheet.unread, rename),
    units: renamed(sheet.units, rename),
  };
}

function renamed<T>(record: Readonly<Record<string, T>>, rename: (path: string) => string | null): Record<string, T> {
  return Object.fromEntries(
    Object.entries(record).flatMap(([path, value]) => {
      const name = rename(path);
      return name === null ? [] : [[name, value]];
    }),
  );
}
