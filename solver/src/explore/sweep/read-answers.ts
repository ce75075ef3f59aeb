import { verdictOn } from "../../limits.ts";
import { randomFrom, shuffled } from "../../numerics/random.ts";
import { ownMember } from "../../scenario/own-member.ts";
import type { Fault, Records, Scenario } from "../../scenario/scenario.ts";
import {
  cellOutcomes,
  cellRefusals,
  limitsCode,
  rowHead,
  rowLength,
  withLimitQuantities,
  type CellRefusal,
} from "../cells/cell-row.ts";
import { CellSetter } from "../cells/cell-setter.ts";
import { cellCount, cellValues } from "./axis-values.ts";
import { sweepDigest } from "./exchange.ts";
import { SweepRunner } from "./run-tile.ts";
import type { SweepPlan } from "./sweep-plan.ts";
import { tileCells, tileCount } from "./tiles.ts";

/** Cells recomputed of every set of answers, and how far a quantity may be off, relative: another engine rounds otherwise. */
const sampled = 20;
const tolerance = 1e-9;
const mostFaults = 20;

/** Answers that were solved elsewhere, as tiles; or every fault of them. `path` is `line n`. */
export type ReadAnswers =
  | { readonly tiles: readonly Float64Array[]; readonly recomputed: number; readonly faults: [] }
  | { tiles: null; faults: Fault[] };

/**
 * Takes back a sweep that was solved elsewhere: its header, which must be of this sweep by digest, then an answer for every
 * cell, in any order. Some cells, chosen by `seed`, are run again here: all they say must agree.
 */
export function readAnswers(
  scenario: Scenario,
  plan: SweepPlan,
  lines: Iterable<string>,
  { seed = 1, records }: { seed?: number; records?: Records } = {},
): ReadAnswers {
  const reader = new AnswerReader(scenario, plan);
  const faults: Fault[] = [];
  let number = 0;
  for (const line of lines) {
    number += 1;
    if (line.trim() === "" || faults.length >= mostFaults) continue;
    const message = number === 1 ? reader.header(line) : reader.answer(line);
    if (message !== null) faults.push({ path: `line ${number}`, message });
    if (number === 1 && message !== null) break;
  }
  if (faults.length === 0) faults.push(...reader.missing());
  if (faults.length === 0) faults.push(...recomputedFaults({ scenario, plan, rows: reader.rows, seed, records }));
  if (faults.length > 0) return { tiles: null, faults };
  return { tiles: tilesOf(plan, reader.rows), recomputed: Math.min(sampled, cellCount(plan)), faults: [] };
}

/** Rows of all cells by their index, filled as answers come. */
class AnswerReader {
  readonly rows: Float64Array;
  private readonly isAnswered: Uint8Array;
  private readonly names: readonly string[];
  private readonly setter: CellSetter;

  constructor(
    private readonly scenario: Scenario,
    private readonly plan: SweepPlan,
  ) {
    this.rows = new Float64Array(cellCount(plan) * rowLength(plan));
    this.isAnswered = new Uint8Array(cellCount(plan));
    this.names = withLimitQuantities(plan, scenario.limits).quantities;
    this.setter = new CellSetter(
      scenario,
      plan.axes.map(({ path }) => path),
      plan.links,
    );
  }

  /** What is wrong with the first line; null where it is of this sweep. */
  header(line: string): string | null {
    const digest = ownMember(parsed(line), "digest");
    if (typeof digest !== "string") return "The first line is the header of the cells, with its digest.";
    return digest === sweepDigest(this.scenario, this.plan)
      ? null
      : "These answers are of another sweep, or of another version of its scenario.";
  }

  answer(line: string): string | null {
    const answer = parsed(line);
    if (!Array.isArray(answer)) return "This is no answer: [index, outcome, quantity, …] is asked.";
    const [index, outcome, ...rest] = answer as unknown[];
    if (typeof index !== "number" || this.isAnswered[index] === undefined)
      return `This sweep has no cell ${JSON.stringify(index)}.`;
    if (this.isAnswered[index] === 1) return `Cell ${index} is answered already.`;
    const values = rest.slice(0, this.names.length);
    if (values.length < this.names.length || !values.every((value) => value === null || Number.isFinite(value)))
      return `Cell ${index} has no ${this.names.length} numbers: ${this.names.join(", ")}.`;
    const code =
      outcome === null
        ? this.refusalOf(index, rest.at(-1))
        : cellOutcomes.indexOf(outcome as (typeof cellOutcomes)[number]);
    if (outcome !== null && code < 0) return `No outcome is called ${JSON.stringify(outcome)}.`;
    this.isAnswered[index] = 1;
    this.fill(index, code, values as (number | null)[]);
    return null;
  }

  missing(): Fault[] {
    const first = this.isAnswered.indexOf(0);
    if (first < 0) return [];
    const count = this.isAnswered.reduce((sum, is) => sum + 1 - is, 0);
    if (count === 1) return [{ path: "", message: `Cell ${first} has no answer.` }];
    return [{ path: "", message: `${count} cells have no answer; the first of them is cell ${first}.` }];
  }

  private fill(index: number, code: number, values: readonly (number | null)[]): void {
    const { plan, rows, scenario } = this;
    const at = index * rowLength(plan);
    rows[at] = code;
    if (code < 0) return;
    const valueOf = (name: string): number | null => values[this.names.indexOf(name)];
    rows[at + 1] = limitsCode(scenario.limits.map((limit) => verdictOn(limit, valueOf(limit.quantity), "time")));
    plan.quantities.forEach((name, i) => {
      const value = valueOf(name);
      if (value === null) rows[at + 2] += 2 ** i;
      else rows[at + rowHead + i] = value;
    });
  }

  /** The code of a cell without an outcome; its reason tells runs that were cut off. */
  private refusalOf(index: number, reason: unknown): number {
    if (this.setter.set(cellValues(this.plan, index)) !== null) return cellRefusals.refused;
    const cutOff = (["max-events", "max-work"] satisfies CellRefusal[]).find((name) => String(reason).includes(name));
    return cellRefusals[cutOff ?? "failed"];
  }
}

function parsed(line: string): unknown {
  try {
    return JSON.parse(line) as unknown;
  } catch {
    return null;
  }
}

interface Recomputation {
  readonly scenario: Scenario;
  readonly plan: SweepPlan;
  readonly rows: Float64Array;
  readonly seed: number;
  readonly records: Records | undefined;
}

function recomputedFaults({ scenario, plan, rows, seed, records }: Recomputation): Fault[] {
  const runner = new SweepRunner(scenario, plan, records);
  const length = rowLength(plan);
  const chosen = shuffled(cellCount(plan), randomFrom(seed)).subarray(0, sampled);
  return Array.from(chosen).flatMap((index) => {
    const own = new Float64Array(length);
    runner.run(index, own);
    const off = own.findIndex((value, i) => !isClose(value, rows[index * length + i], i));
    if (off < 0) return [];
    const what = off < rowHead ? "its outcome or verdicts" : plan.quantities[off - rowHead];
    return [
      { path: "", message: `Cell ${index} comes out otherwise here: ${what} differ. These answers are not taken.` },
    ];
  });
}

const isClose = (own: number, other: number, place: number): boolean =>
  own === other || (place >= rowHead && Math.abs(own - other) <= tolerance * Math.abs(own));

function tilesOf(plan: SweepPlan, rows: Float64Array): Float64Array[] {
  const length = rowLength(plan);
  return Array.from({ length: tileCount(plan) }, (_, tile) => {
    const cells = tileCells(plan, tile);
    const own = new Float64Array(cells.length * length);
    cells.forEach((cell, i) => own.set(rows.subarray(cell * length, (cell + 1) * length), i * length));
    return own;
  });
}
