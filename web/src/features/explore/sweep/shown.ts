import { useMemo, useState } from "react";
import type { SweepCells } from "./sweep-cells.ts";

/** What the cells of a map show: their outcome, the verdict of a limit, or a quantity between the ends of a scale. */
export type Shown =
  | { readonly kind: "outcome" }
  | { readonly kind: "limit"; readonly limit: number }
  | ({ readonly kind: "quantity"; readonly place: number; readonly canBeLog: boolean } & Scale);

/** Least and largest value of a scale; by ratio where it is logarithmic. */
export interface Scale {
  readonly low: number;
  readonly high: number;
  readonly isLog: boolean;
}

const LIMIT = "limit ";
/** A scale is offered by ratio where its ends are of one sign and this many times apart. */
const LEAST_RATIO = 5;

export const limitChoice = (limit: number): string => `${LIMIT}${limit}`;

/** What the map shows as chosen, and the scale it is shown on: the least and the largest value there are. */
export function useShown(cells: SweepCells, edition: number) {
  const [choice, choose] = useState<string>("outcome");
  const [isLog, setLog] = useState(false);
  const shown = useMemo(
    (): Shown => shownOf(cells, choice, isLog),
    // The cells are the same object all along: the edition tells that there are more of them.
    // eslint-disable-next-line react-hooks/exhaustive-deps
    [choice, isLog, cells, edition],
  );
  return { choice, shown, choose, setLog };
}

function shownOf(cells: SweepCells, choice: string, wantsLog: boolean): Shown {
  if (choice.startsWith(LIMIT)) return { kind: "limit", limit: Number(choice.slice(LIMIT.length)) };
  const place = cells.plan.quantities.findIndex((name) => name === choice);
  if (place < 0) return { kind: "outcome" };
  const { low, high } = endsOf(cells, place);
  const canBeLog = low * high > 0 && Math.max(low / high, high / low) >= LEAST_RATIO;
  return { kind: "quantity", place, low, high, canBeLog, isLog: canBeLog && wantsLog };
}

function endsOf(cells: SweepCells, place: number): { low: number; high: number } {
  let [low, high] = [Infinity, -Infinity];
  for (let cell = 0; cell < cells.count; cell++) {
    const value = cells.quantity(cell, place);
    if (value === null) continue;
    low = Math.min(low, value);
    high = Math.max(high, value);
  }
  return low <= high ? { low, high } : { low: 0, high: 0 };
}

/** How far a value lies between the ends of a scale, 0…1. */
export function shareOn({ low, high, isLog }: Scale, value: number): number {
  const share = isLog ? Math.log(value / low) / Math.log(high / low) : (value - low) / (high - low || 1);
  return Math.min(1, Math.max(0, share));
}

/** The value that lies so far between the ends. */
export const valueOn = ({ low, high, isLog }: Scale, share: number): number =>
  isLog ? low * (high / low) ** share : low + share * (high - low);
