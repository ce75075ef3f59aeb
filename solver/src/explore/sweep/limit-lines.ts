import type { Outcome } from "../../result.ts";
import type { Scenario } from "../../scenario/scenario.ts";
import type { Exploring, RunReply } from "../asking.ts";
import type { CellFigures } from "../cells/cell-row.ts";
import { withValues } from "../links.ts";
import { mapEdges, type EdgePlace, type MapEdge } from "./map-edges.ts";
import { joinedEdges } from "./map-lines.ts";
import type { SweepPlan } from "./sweep-plan.ts";

/** What tells cells of a map apart: their outcome, or the verdict of the limit at that place of the scenario. */
export type LineSubject = { readonly kind: "outcome" } | { readonly kind: "limit"; readonly limit: number };

/** What lies on one side of a line. */
export type LineSide = Outcome | "kept" | "broken";

/** A place on a line, SI: a value of the first field and of the second. */
export interface LinePoint {
  readonly across: number;
  readonly up: number;
}

/** Where one side gives way to another. */
export interface LimitLine {
  /** What lies below it and above it; beside it, to the left and to the right, where it is upright. */
  readonly between: readonly [LineSide, LineSide];
  /** Searched points in order, from where the first field is smaller; a closed line ends where it starts. */
  readonly points: readonly LinePoint[];
}

export interface LimitLines {
  readonly lines: readonly LimitLine[];
  /** Changes between cells that were left unsearched: where sides alternate from cell to cell there is no end of them. */
  readonly left: number;
}

/** Relative distance at which a search ends: a tenth of a percent, finer than a map is drawn. */
const enough = 1e-3;
const mostHalvings = 14;
const mostSearched = 2000;

/**
 * The lines of a map of two fields, by search and not by the edges of its cells: wherever two neighbouring cells differ, the
 * value between them is halved by runs, all at a time, until it is known to 0.1 %. What a run in between comes to is put on
 * the side it is like, or on the other. Runs last as long as those of the cells: a line is of this map and no other. What a
 * square of four cells hides from its edges is not seen.
 *
 * @param plan of a sweep without continuation; throws RangeError at any other
 * @param figuresAt what a cell came to, null where that is not known yet or it was refused
 */
export function* limitLines(
  scenario: Scenario,
  plan: SweepPlan,
  subject: LineSubject,
  figuresAt: (index: number) => CellFigures | null,
): Exploring<LimitLines> {
  if (plan.axes.length !== 2 || plan.continuation !== "none")
    throw new RangeError("lines are searched on a map of two fields whose cells do not follow one another");
  const all = mapEdges(plan, (index) => sideOfCell(subject, figuresAt(index)));
  const searches = all.slice(0, mostSearched).map((edge) => ({ edge, low: edge.low, high: edge.high }));
  for (let i = 0; i < mostHalvings; i++) {
    const open = searches.filter(isOpen);
    if (open.length === 0) break;
    const runs = open.map((search) => ({ scenario: scenarioAt(scenario, plan, search), quantities: [] }));
    const replies = yield { runs, done: i * searches.length, total: mostHalvings * searches.length };
    open.forEach((search, k) => {
      if (sideOfRun(subject, replies[k]) === search.edge.from) search.low = middleOf(search);
      else search.high = middleOf(search);
    });
  }
  const found = new Map(searches.map((search): [EdgePlace, Search] => [search.edge.place, search]));
  const lines = joinedEdges(searches.map(({ edge }) => edge)).map((line) => ({
    between: sidesOf(line),
    points: fromTheLeft(line.map(({ place }) => pointOf(found.get(place) as Search))),
  }));
  return { lines, left: all.length - searches.length };
}

/** An edge, and the two values between which its change lies by now. */
interface Search {
  readonly edge: MapEdge<LineSide>;
  low: number;
  high: number;
}

function sideOfCell(subject: LineSubject, figures: CellFigures | null): LineSide | null {
  if (figures === null || figures.outcome === null) return null;
  return subject.kind === "outcome" ? figures.outcome : verdictSide(figures.kept[subject.limit]);
}

function sideOfRun(subject: LineSubject, reply: RunReply): LineSide | null {
  if ("reason" in reply) return null;
  return subject.kind === "outcome" ? reply.outcome : verdictSide(reply.limits[subject.limit].kept);
}

const verdictSide = (kept: boolean | null): LineSide | null => (kept === null ? null : kept ? "kept" : "broken");

const isOpen = ({ low, high }: Search): boolean =>
  Math.abs(high - low) > enough * Math.max(Math.abs(low), Math.abs(high));

const middleOf = ({ low, high }: Search): number =>
  low * high > 0 ? Math.sign(low) * Math.sqrt(low * high) : (low + high) / 2;

function pointOf(search: Search): LinePoint {
  const { axis, beside } = search.edge;
  return axis === 0 ? { across: middleOf(search), up: beside } : { across: beside, up: middleOf(search) };
}

function scenarioAt(scenario: Scenario, { axes, links }: SweepPlan, search: Search): Scenario {
  const { across, up } = pointOf(search);
  return withValues(
    scenario,
    [across, up].map((value, i): [string, number] => [axes[i].path, value]),
    links,
  );
}

/** An edge that goes up tells what lies below and above. */
function sidesOf(line: readonly MapEdge<LineSide>[]): LimitLine["between"] {
  const { from, to } = line.find(({ axis }) => axis === 1) ?? line[0];
  return [from, to];
}

const fromTheLeft = (points: LinePoint[]): LinePoint[] =>
  points[0].across <= points[points.length - 1].across ? points : points.reverse();
