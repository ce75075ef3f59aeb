import {
  limitLines,
  textbookBeside,
  type Exploring,
  type LimitLine,
  type LimitLines,
  type LineSubject,
  type Scenario,
  type SweepPlan,
  type TextbookBeside,
} from "@restband/solver";
import { useEffect, useState } from "react";
import { useExploring } from "../../../compute/use-exploring.ts";
import type { TileRun } from "../kept/tile-run.ts";
import type { Shown } from "./shown.ts";
import type { SweepCells } from "./sweep-cells.ts";

/** The searched lines of a map, and what formulas say of the one between sticking and sliding. */
export interface SearchedLines extends LimitLines {
  readonly textbook: readonly TextbookBeside[];
}

/** Those of the outcomes, and those of what is shown. */
export interface LinesOfMap {
  readonly outcomes: SearchedLines;
  readonly shown: SearchedLines;
}

const none: SearchedLines = { lines: [], left: 0, textbook: [] };
const OUTCOMES = "outcome";

/** The searched lines of the outcomes, once all cells are there, and of a limit once it is shown; of one field there are none. */
export function useLimitLines(run: TileRun<SweepCells>, scenario: Scenario, plan: SweepPlan, shown: Shown): LinesOfMap {
  const { begin, state } = useExploring<SearchedLines>();
  const [known, setKnown] = useState<Readonly<Record<string, SearchedLines>>>({});
  const isWanted = run.isComplete && plan.axes.length === 2 && plan.continuation === "none";
  const limit = shown.kind === "limit" ? shown.limit : null;
  // The outcomes come first: the headline speaks of them.
  const next = known[OUTCOMES] === undefined ? OUTCOMES : limit === null ? null : `limit ${limit}`;
  const isOpen = isWanted && next !== null && known[next] === undefined && state.kind !== "failed";
  useEffect(() => {
    if (!isOpen) return;
    const subject: LineSubject = next === OUTCOMES ? { kind: "outcome" } : { kind: "limit", limit: limit ?? 0 };
    void begin(searchedLines(scenario, plan, subject, run.store)).then((found) => {
      if (found) setKnown((old) => ({ ...old, [next]: found }));
    });
  }, [begin, isOpen, next, limit, plan, run, scenario]);
  return {
    outcomes: known[OUTCOMES] ?? none,
    shown: known[limit === null ? OUTCOMES : `limit ${limit}`] ?? none,
  };
}

function* searchedLines(
  scenario: Scenario,
  plan: SweepPlan,
  subject: LineSubject,
  cells: SweepCells,
): Exploring<SearchedLines> {
  const found = yield* limitLines(scenario, plan, subject, (cell) => cells.read(cell));
  const line = longestOf(found.lines.filter(isSmoothLimit));
  return { ...found, textbook: line ? textbookBeside(scenario, plan, line) : [] };
}

/** A line with smooth sliding above it. */
export const isSmoothLimit = ({ between }: LimitLine): boolean => between[1] === "smooth-sliding";

/** The line of the most points; null without any. */
export const longestOf = (lines: readonly LimitLine[]): LimitLine | null =>
  lines.reduce<LimitLine | null>((a, b) => (a && a.points.length >= b.points.length ? a : b), null);
