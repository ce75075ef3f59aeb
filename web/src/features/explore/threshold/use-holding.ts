import { digestOf, holdingRanges, solverVersion, type HoldingRange, type Scenario } from "@restband/solver";
import { useEffect, useMemo, useState } from "react";
import { idlePool } from "../../../compute/explore-pools.ts";
import { goThrough } from "../../../compute/go-through.ts";

const REST_BEFORE_MS = 800;
const MOST_KEPT = 60;
const PREFIX = "restband-holding ";

/**
 * How far the answer of a scenario holds, computed by the idle worker of whoever has the page open, and kept by this
 * browser under what was asked and the version of the solver. Null until it is known; an edit ends it.
 */
export function useHolding(scenario: Scenario | null): readonly HoldingRange[] | null {
  const key = useMemo(() => (scenario ? keyOf(scenario) : null), [scenario]);
  const [known, setKnown] = useState<{ key: string; ranges: readonly HoldingRange[] } | null>(null);
  const kept = useMemo(() => (key ? recall(key) : null), [key]);
  useEffect(() => {
    if (!scenario || key === null || kept) return;
    const controller = new AbortController();
    const begin = async (): Promise<void> => {
      const ranges = await goThrough(holdingRanges(scenario), { pool: idlePool, signal: controller.signal });
      keep(key, ranges);
      setKnown({ key, ranges });
    };
    // What was called off or has failed leaves the place empty: nothing waits for it.
    const timer = setTimeout(() => void begin().catch(() => undefined), REST_BEFORE_MS);
    return () => {
      clearTimeout(timer);
      controller.abort();
    };
    // The key stands for the scenario.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [key, kept]);
  return kept ?? (known?.key === key ? known.ranges : null);
}

/** All that the runs read, and which values are known as ranges. */
function keyOf(scenario: Scenario): string {
  const ranged = Object.keys(scenario.origins).filter((path) => {
    const { low, high } = scenario.origins[path];
    return low !== undefined || high !== undefined;
  });
  const digest = digestOf({ ...scenario, title: "", purpose: "other", origins: {} });
  return `${PREFIX}${solverVersion} ${digest} ${ranged.join(" ")}`;
}

function recall(key: string): readonly HoldingRange[] | null {
  try {
    const text = localStorage.getItem(key);
    return text === null ? null : (JSON.parse(text) as HoldingRange[]);
  } catch {
    return null;
  }
}

/** Without the scenarios of the ends: they are long, and made again when asked for. */
function keep(key: string, ranges: readonly HoldingRange[]): void {
  try {
    const ours = Object.keys(localStorage).filter((each) => each.startsWith(PREFIX));
    for (const old of ours.slice(0, Math.max(0, ours.length - MOST_KEPT + 1))) localStorage.removeItem(old);
    localStorage.setItem(
      key,
      JSON.stringify(ranges.map(({ low, high, ...rest }) => ({ ...rest, low: slim(low), high: slim(high) }))),
    );
  } catch {
    // No room, or storage is refused: it is computed anew next time.
  }
}

/** That something flips is told by a flip that is there. */
const slim = ({ value, flip, change }: HoldingRange["low"]): object => ({
  value,
  flip: flip === null ? null : {},
  change,
});
