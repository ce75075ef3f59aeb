import { compileProblem, type Problem, type Scenario } from "@restband/solver";

/** What acts at an instant, and what of the body stands against it. */
export interface Inputs {
  /** y of the base, m (rad); 0 where all is told relative to it. */
  readonly base: (t: number) => number;
  /** The applied force, N (N·m). */
  readonly force: (t: number) => number;
  /** Where the body would stand without friction and motion: k d + k3 d³ = F + W; null without a spring. */
  readonly equilibrium: (t: number) => number | null;
  /** μs N r: what friction can hold, N (N·m). */
  readonly hold: (t: number) => number;
  /** ±μs N r/k about the equilibrium, N without ripple; null without a spring or without friction. */
  readonly restBand: number | null;
  /**
   * The times from `from` to `to` at which to look at the inputs so that none of their corners and swings is lost; null
   * where they swing more often than can be drawn.
   */
  readonly times: (from: number, to: number) => readonly number[] | null;
}

const PER_CYCLE = 24;
const FEWEST = 200;
const MOST = 3600;

type Terms = Problem["force"];

/** Reads the inputs of a checked scenario at any instant. */
export function inputsOf(scenario: Scenario): Inputs {
  const problem = compileProblem(scenario);
  const { stiffness, cubic, normal, radius, law, weight } = problem;
  const base = (t: number): number => (problem.isRelative ? 0 : sum(problem.base, t));
  const force = (t: number): number => sum(problem.force, t);
  const holds = law.atRest * radius;
  return {
    base,
    force,
    equilibrium: (t) => (stiffness > 0 ? base(t) + stretch(force(t) + weight, stiffness, cubic) : null),
    hold: (t) => holds * Math.max(0, normal + rippleAt(problem, t)),
    restBand: stiffness > 0 && holds * normal > 0 ? (holds * normal) / stiffness : null,
    times: (from, to) => timesOf(problem, from, to),
  };
}

function timesOf({ force, base, ripple }: Problem, from: number, to: number): number[] | null {
  const terms = [...force, ...base];
  if (ripple === null && terms.every((term) => term.isConstantFrom(from))) return [from, to];
  const fastest = Math.max(ripple?.hz ?? 0, ...terms.map(({ hz, smooth }) => hz ?? smooth?.fastestHz ?? 0));
  const count = Math.max(FEWEST, Math.ceil(PER_CYCLE * fastest * (to - from)));
  if (count > MOST) return null;
  const even = Array.from({ length: count + 1 }, (_, i) => from + (i * (to - from)) / count);
  const corners = terms.flatMap((term) => cornersOf(term, from, to));
  return [...new Set([...even, ...corners])].sort((a, b) => a - b);
}

/** Each corner and a moment just before it: a step is drawn as one. */
function cornersOf(term: Terms[number], from: number, to: number): number[] {
  const corners: number[] = [];
  const moment = 1e-9 * (to - from);
  for (let t = term.nextCorner(from); t < to && corners.length < MOST; t = term.nextCorner(t))
    corners.push(t - moment, t);
  return corners;
}

function sum(terms: Terms, t: number): number {
  const polynomial = new Float64Array(4);
  let value = 0;
  for (const term of terms) {
    term.addPolynomial(t, polynomial);
    for (const { amplitude, hz, phase, origin } of term.harmonics(t))
      value += amplitude * Math.cos(2 * Math.PI * hz * (t - origin) + phase);
    if (term.smooth && t >= term.smooth.from && t < term.smooth.to) value += term.smooth.value(t);
  }
  return value + polynomial[0];
}

function rippleAt({ ripple }: Problem, t: number): number {
  return ripple ? ripple.amplitude * Math.cos(2 * Math.PI * ripple.hz * t + ripple.phase) : 0;
}

/** d with k d + k3 d³ = push, by Newton from the straight spring's answer; a softening spring may have none: that answer then. */
function stretch(push: number, stiffness: number, cubic: number): number {
  let d = push / stiffness;
  if (cubic === 0) return d;
  for (let i = 0; i < 50; i++) {
    const slope = stiffness + 3 * cubic * d * d;
    if (slope <= 0) return push / stiffness;
    const step = (stiffness * d + cubic * d ** 3 - push) / slope;
    d -= step;
    if (Math.abs(step) <= 1e-14 * Math.abs(d)) break;
  }
  return d;
}
