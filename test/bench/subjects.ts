import { compileProblem, needsAdaptive, simulate, type Problem, type Scenario } from "@restband/solver";
import { runAdaptive } from "../../solver/src/motion/adaptive/run-adaptive.ts";
import { runExact } from "../../solver/src/motion/exact/run-exact.ts";
import type { Motion } from "../../solver/src/motion/motion.ts";
import { emptyState } from "../../solver/src/motion/state.ts";
import { p1, p2, p3, p4, p5 } from "./problems.ts";

/** What a yardstick has made of a problem: events without start and end, and the last position (sums over cells). */
export interface Tally {
  events: number;
  x: number;
}

/** One problem: its cells, of which times are told per cell. */
export interface Subject {
  name: string;
  what: string;
  cells: readonly Scenario[];
  /** Of an adaptive run that takes long, how many of the cells are enough. */
  fewCells: number;
}

export const subjects: readonly Subject[] = [
  { name: "P1", what: "free Coulomb decay, 100 half cycles", cells: [p1], fewCells: 1 },
  { name: "P2", what: "harmonic force with stops, 200 periods", cells: [p2], fewCells: 1 },
  { name: "P3", what: "fed slide, Stribeck law, 500 s", cells: [p3], fewCells: 1 },
  { name: "P4", what: "sweep of P2, 400 of 10,000 cells, 100 periods; one cell", cells: p4, fewCells: 8 },
  { name: "P5", what: "shaken by a record, 200 Hz, 60 s", cells: [p5], fewCells: 1 },
];

const asked = ["amplitude", "peakVelocity", "stickFraction", "restTime", "driveForcePeak"];

/** One way this solver is asked: what is timed, of how many cells, and what comes of it, told untimed. */
export interface Way {
  share: number;
  work: () => void;
  tell: () => Tally;
}

/** The ways this solver is asked, each over all its cells. */
export function waysOf({ cells, fewCells }: Subject): Record<string, Way> {
  const problems = cells.map((cell) => compileProblem(cell));
  const few = problems.filter((_, i) => i % Math.ceil(problems.length / fewCells) === 0);
  const adaptive = wayOf(few, (problem) => runAdaptive(problem));
  const isExact = needsAdaptive(cells[0]) === null;
  return {
    propagation: isExact ? wayOf(problems, (problem) => runExact(problem)) : adaptive,
    simulate: { share: cells.length, work: () => simulateAll(cells), tell: () => ({ events: NaN, x: NaN }) },
    ...(isExact ? { "odex restarts": adaptive } : {}),
  };
}

function wayOf(problems: readonly Problem[], run: (problem: Problem) => Motion): Way {
  return {
    share: problems.length,
    work: () => {
      for (const problem of problems) run(problem).release();
    },
    tell: () => sum(problems.map(run)),
  };
}

function sum(motions: readonly Motion[]): Tally {
  const state = emptyState();
  const tally = { events: 0, x: 0 };
  for (const motion of motions) {
    motion.read(motion.count - 1, motion.end, state);
    tally.events += motion.events.length - 2;
    tally.x += state.x;
  }
  return tally;
}

/** Outcome and five quantities, no samples, no ledger. */
function simulateAll(cells: readonly Scenario[]): void {
  for (const cell of cells) simulate(cell, { samples: 0, quantities: asked, energy: false, events: false });
}
