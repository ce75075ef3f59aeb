import {
  cellOutcomes,
  withValues,
  type Exploring,
  type Outcome,
  type RunAsk,
  type RunReply,
  type Scenario,
  type SweepPlan,
} from "@restband/solver";
import { axisValues } from "@restband/solver";
import type { SweepCells } from "./sweep-cells.ts";

/** Where one outcome gives way to another along one axis, the other value as in the cells. SI. */
export interface LinePoint {
  readonly across: number;
  readonly up: number;
}

/** A boundary between two outcomes: searched points, in order. */
export interface LimitLine {
  readonly between: readonly [Outcome, Outcome];
  readonly points: readonly LinePoint[];
}

/** A pair of neighbouring cells on either side of a change; the search goes between their values. */
interface Crossing {
  readonly from: Outcome;
  readonly to: Outcome;
  /** Which axis is searched: 0 across, 1 up. */
  readonly axis: 0 | 1;
  /** Value of the other axis. */
  readonly fixed: number;
  low: number;
  high: number;
  column: number;
  row: number;
}

/** Relative width at which a search ends: a tenth of a percent. */
const ENOUGH = 1e-3;
const MOST_HALVINGS = 14;
const MOST_CROSSINGS = 1200;

/**
 * Searches the boundaries of a map of two fields, each between the two cells it lies between, all at a time. A cell's
 * outcome is taken for the boundary as it was run; what a run in between comes to is put on the side it is like, or on
 * the upper one.
 */
export function* searchLimitLines(scenario: Scenario, plan: SweepPlan, cells: SweepCells): Exploring<LimitLine[]> {
  const crossings = crossingsOf(plan, cells);
  for (let i = 0; i < MOST_HALVINGS; i++) {
    const open = crossings.filter(
      ({ low, high }) => Math.abs(high - low) > ENOUGH * Math.max(Math.abs(low), Math.abs(high)),
    );
    if (open.length === 0) break;
    const runs = open.map((crossing) => askOf(scenario, plan, crossing));
    const replies = yield { runs, done: i, total: MOST_HALVINGS };
    open.forEach((crossing, k) => halve(crossing, replies[k]));
  }
  return linesOf(crossings);
}

function crossingsOf(plan: SweepPlan, cells: SweepCells): Crossing[] {
  const [across, up] = plan.axes.map(axisValues);
  if (!up) return [];
  const at = (column: number, row: number): Outcome | null => {
    const code = cells.code(row * across.length + column);
    return code === null || code < 0 ? null : cellOutcomes[code];
  };
  const found: Crossing[] = [];
  for (let row = 0; row < up.length; row++)
    for (let column = 0; column < across.length; column++) {
      const here = at(column, row);
      const above = row + 1 < up.length ? at(column, row + 1) : null;
      const right = column + 1 < across.length ? at(column + 1, row) : null;
      if (here && above && here !== above)
        found.push({
          from: here,
          to: above,
          axis: 1,
          fixed: across[column],
          low: up[row],
          high: up[row + 1],
          column,
          row,
        });
      if (here && right && here !== right)
        found.push({
          from: here,
          to: right,
          axis: 0,
          fixed: up[row],
          low: across[column],
          high: across[column + 1],
          column,
          row,
        });
    }
  return found.slice(0, MOST_CROSSINGS);
}

const middleOf = ({ low, high }: Crossing): number =>
  low * high > 0 ? Math.sign(low) * Math.sqrt(low * high) : (low + high) / 2;

function askOf(scenario: Scenario, plan: SweepPlan, crossing: Crossing): RunAsk {
  const middle = middleOf(crossing);
  const values = crossing.axis === 1 ? [crossing.fixed, middle] : [middle, crossing.fixed];
  const pairs = plan.axes.map(({ path }, i): [string, number] => [path, values[i]]);
  return { scenario: withValues(scenario, pairs, plan.links), quantities: [] };
}

function halve(crossing: Crossing, reply: RunReply): void {
  const outcome = "reason" in reply ? null : reply.outcome;
  const middle = middleOf(crossing);
  if (outcome === crossing.from) crossing.low = middle;
  else crossing.high = middle;
}

/** Points of like boundaries joined: those found upwards by column, those found across by row, whichever are more. */
function linesOf(crossings: readonly Crossing[]): LimitLine[] {
  const groups = new Map<string, Crossing[]>();
  for (const crossing of crossings) {
    const key = [crossing.from, crossing.to].sort().join("|");
    groups.set(key, [...(groups.get(key) ?? []), crossing]);
  }
  return [...groups.values()].flatMap((group) => {
    const upwards = group.filter(({ axis }) => axis === 1);
    const sideways = group.filter(({ axis }) => axis === 0);
    const chosen = upwards.length >= sideways.length ? upwards : sideways;
    return chains(chosen).map((chain) => ({
      between: [chain[0].from, chain[0].to] as const,
      points: chain.map(pointOf),
    }));
  });
}

const pointOf = (crossing: Crossing): LinePoint => {
  const middle = middleOf(crossing);
  return crossing.axis === 1 ? { across: crossing.fixed, up: middle } : { across: middle, up: crossing.fixed };
};

/** Crossings of neighbouring columns (or rows) that lie nearest to each other make a line. */
function chains(crossings: readonly Crossing[]): Crossing[][] {
  const along = ({ axis, column, row }: Crossing): number => (axis === 1 ? column : row);
  const beside = ({ axis, column, row }: Crossing): number => (axis === 1 ? row : column);
  const left = [...crossings].sort((a, b) => along(a) - along(b) || beside(a) - beside(b));
  const found: Crossing[][] = [];
  for (const crossing of left) {
    const open = found.filter((chain) => along(chain[chain.length - 1]) === along(crossing) - 1);
    const same = open.filter((chain) => chain[0].from === crossing.from && chain[0].to === crossing.to);
    const distance = (chain: Crossing[]): number => Math.abs(beside(chain[chain.length - 1]) - beside(crossing));
    const nearest = same.sort((a, b) => distance(a) - distance(b))[0];
    if (nearest && distance(nearest) <= MOST_JUMP) nearest.push(crossing);
    else found.push([crossing]);
  }
  return found;
}

/** Cells by which a line may rise from one column to the next. */
const MOST_JUMP = 6;
