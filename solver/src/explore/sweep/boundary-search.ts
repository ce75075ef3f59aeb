import { checkScenario } from "../../scenario/check-scenario.ts";
import { numericField } from "../../scenario/numeric-fields.ts";
import type { Scenario } from "../../scenario/scenario.ts";
import type { Exploring, RunFigures } from "../asking.ts";
import { withValues } from "../links.ts";
import { refine, RunCount, type Bracket, type Line } from "../threshold/probes.ts";
import { isMet } from "../threshold/threshold-search.ts";
import type { Target, ThresholdEnd } from "../threshold/threshold.ts";
import { axisValues, sizesOf } from "./axis-values.ts";
import type { CellFigures } from "../cells/cell-row.ts";
import type { SweepPlan } from "./sweep-plan.ts";

/** A place on a boundary: a value of each axis, found between two neighbouring cells. */
export type BoundaryPoint = readonly [number, number];

/** A piece of a boundary across one square of four cells. */
export type BoundaryPiece = readonly [BoundaryPoint, BoundaryPoint];

/** Halvings between two cells: a sixty-fourth of their distance is left. */
const halvings = 6;

/**
 * The boundary of a target on the map of a sweep of two fields, by search and not by the edges of its cells: wherever two
 * neighbouring cells differ, the value between them is halved six times by runs. What a square of four cells hides from its
 * edges is not seen.
 *
 * @param plan of a sweep without continuation; throws RangeError at any other
 * @param figuresAt what a cell came to, null where that is not known yet or it was refused
 */
export function* boundarySearch(
  scenario: Scenario,
  plan: SweepPlan,
  target: Target,
  figuresAt: (index: number) => CellFigures | null,
): Exploring<BoundaryPiece[]> {
  if (plan.axes.length !== 2 || plan.continuation !== "none")
    throw new RangeError("a boundary is searched on a map of two fields whose cells do not follow one another");
  const grid = gridOf(plan, target, figuresAt);
  const edges = grid.edges.map((edge) => ({ edge, bracket: bracketOf(scenario, plan, target, edge) }));
  const found = yield* refine(
    edges.map(({ bracket }) => bracket),
    new RunCount(edges.length * halvings),
    halvings,
  );
  const points = new Map(edges.map(({ edge }, i) => [keyOf(edge), pointOf(edge, found[i])]));
  return grid.squares.flatMap((square) =>
    piecesOf(square.map((key) => points.get(key)).filter((point) => point !== undefined)),
  );
}

/** Two neighbouring cells that differ: along which axis, and the value of the other. */
interface Edge {
  readonly axis: 0 | 1;
  readonly place: readonly [number, number];
  readonly from: number;
  readonly to: number;
  readonly beside: number;
  readonly isFromMet: boolean;
}

const keyOf = ({ axis, place }: Pick<Edge, "axis" | "place">): string => `${axis} ${place.join(" ")}`;

function gridOf(plan: SweepPlan, target: Target, figuresAt: (index: number) => CellFigures | null) {
  const [first, second] = sizesOf(plan);
  const values = plan.axes.map(axisValues);
  const metAt = (i: number, j: number) => metBy(target, figuresAt(j * first + i));
  const edges: Edge[] = [];
  const squares: string[][] = [];
  const look = (axis: 0 | 1, i: number, j: number): void => {
    const [here, there] = [metAt(i, j), axis === 0 ? metAt(i + 1, j) : metAt(i, j + 1)];
    if (here === null || there === null || here === there) return;
    const at = axis === 0 ? i : j;
    const beside = axis === 0 ? values[1][j] : values[0][i];
    edges.push({ axis, place: [i, j], from: values[axis][at], to: values[axis][at + 1], beside, isFromMet: here });
  };
  for (let j = 0; j < second; j++)
    for (let i = 0; i < first; i++) {
      if (i + 1 < first) look(0, i, j);
      if (j + 1 < second) look(1, i, j);
      if (i + 1 < first && j + 1 < second) squares.push(edgesAround(i, j));
    }
  return { edges, squares };
}

/** The edges of a square of cells, one after another around it. */
const edgesAround = (i: number, j: number): string[] =>
  (
    [
      [0, [i, j]],
      [1, [i + 1, j]],
      [0, [i, j + 1]],
      [1, [i, j]],
    ] as const
  ).map(([axis, place]) => keyOf({ axis, place }));

/** As `isMet`, of a cell. */
function metBy(target: Target, figures: CellFigures | null): boolean | null {
  if (figures === null || figures.outcome === null) return null;
  if (target.kind === "outcome") return target.outcomes.includes(figures.outcome) === target.isWanted;
  if (target.kind === "limit") return figures.kept[target.limit];
  return figures.kept.includes(false) ? false : figures.kept.includes(null) ? null : true;
}

function bracketOf(scenario: Scenario, plan: SweepPlan, target: Target, edge: Edge): Bracket {
  const line = lineOf(scenario, plan, target, edge);
  const ends = [edge.from, edge.to].map((value, k): ThresholdEnd => {
    const reply = { reason: "run with the sweep" };
    return { value, isMet: (k === 0) === edge.isFromMet, reply, scenario: null };
  });
  return edge.from < edge.to ? { line, below: ends[0], above: ends[1] } : { line, below: ends[1], above: ends[0] };
}

function lineOf(scenario: Scenario, plan: SweepPlan, target: Target, { axis, beside, from, to }: Edge): Line {
  const { axes, links } = plan;
  return {
    bounds: numericField(scenario, axes[axis].path) ?? {},
    range: Math.abs(to - from),
    isMet: (figures: RunFigures) => isMet(target, figures),
    scenarioAt: (value) => {
      const moved = withValues(
        scenario,
        [
          [axes[axis].path, value],
          [axes[1 - axis].path, beside],
        ],
        links,
      );
      const { scenario: checked, faults } = checkScenario(moved);
      return checked ?? { reason: faults[0].message };
    },
  };
}

function pointOf({ axis, beside }: Edge, { below, above }: Bracket): BoundaryPoint {
  const value = (below.value + above.value) / 2;
  return axis === 0 ? [value, beside] : [beside, value];
}

/** Joins the points around a square, two by two in turn: where all four edges differ the pieces cut off two of its corners. */
function piecesOf(points: readonly BoundaryPoint[]): BoundaryPiece[] {
  return Array.from({ length: points.length >> 1 }, (_, i): BoundaryPiece => [points[2 * i], points[2 * i + 1]]);
}
