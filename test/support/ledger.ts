import { simulate, type Energy, type Result, type Scenario } from "@restband/solver";
import { readInputs, type Inputs, type Stretch } from "./judge/inputs.ts";

/** A sign made wrong on purpose from one time to another: of the contact force, or of c. */
export interface Flip {
  of: "friction" | "damping";
  from: number;
  to: number;
}

/** Abscissas in (0, 1) and weights of Gauss and Legendre's five points. */
const gauss: readonly [number, number][] = [-1, -0.5, 0, 0.5, 1].map((place) => {
  const far = Math.abs(place) === 1;
  const root = place === 0 ? 0 : Math.sqrt(5 + (far ? 2 : -2) * Math.sqrt(10 / 7)) / 3;
  const weight = place === 0 ? 128 / 225 : (322 + (far ? -13 : 13) * Math.sqrt(70)) / 900;
  return [(1 + Math.sign(place) * root) / 2, weight / 2];
});

type Instant = Record<"t" | "x" | "v" | "a" | "f", number>;

/**
 * The energy ledger of a run by quadrature over the solver's motion: positions, velocities and contact forces at Gauss points
 * between events, corners and a fine grid; inputs and formulas are the judge's own. With a flip, the ledger of a solver that
 * had that sign wrong.
 */
export function ledgerByQuadrature(scenario: Scenario, result: Result, pieces: number, flip?: Flip): Energy {
  const inputs = readInputs(scenario);
  const end = result.events.at(-1)!.t;
  const knots = refined(scenario, inputs, knotsOf(result, inputs.corners, end, pieces));
  const spans = knots.slice(1).map((to, i) => ({ from: knots[i], to }));
  const nodes = spans.flatMap(({ from, to }) => gauss.map(([place]) => from + (to - from) * place));
  const at = motionAt(scenario, nodes);
  const total = changes(scenario, result, inputs.stretchFrom(0), inputs.stretchFrom(end));
  spans.forEach(({ from, to }, i) => {
    const stretch = inputs.stretchFrom((from + to) / 2);
    const isFlipped = flip !== undefined && from >= flip.from && to <= flip.to;
    gauss.forEach(([, weight], j) => {
      addPowers(total, scenario, stretch, at(i * gauss.length + j), weight * (to - from), isFlipped ? flip.of : null);
    });
  });
  total.residual = residualOf(total);
  return total;
}

/** Work − heat − change. */
export function residualOf(energy: Energy): number {
  const work = energy.workForce + energy.workBase + energy.workWeight + energy.workCounterface;
  const heat = energy.heatContact + energy.heatViscous + energy.heatSolid;
  return work - heat - energy.changeKinetic - energy.changeStored;
}

/** The largest entry but the residual, which the residual is measured by. */
export function largestOf(energy: Energy): number {
  const entries = Object.entries<number>({ ...energy }).filter(([name]) => name !== "residual");
  return Math.max(...entries.map(([, value]) => Math.abs(value)));
}

function knotsOf(result: Result, corners: readonly number[], end: number, pieces: number): number[] {
  const grid = Array.from({ length: pieces + 1 }, (_, i) => (end * i) / pieces);
  const knots = [...grid, ...corners, ...result.events.map(({ t }) => t)].filter((t) => t >= 0 && t <= end);
  return [...new Set(knots)].sort((a, b) => a - b);
}

/**
 * The displacement-proportional force has corners no event marks, where d or ḋ passes through zero: the pieces they lie in
 * are cut into twenty, three times over.
 */
function refined(scenario: Scenario, inputs: Inputs, knots: number[]): number[] {
  if (scenario.solid.model !== "displacement-proportional") return knots;
  let finer = knots;
  for (let round = 0; round < 3; round++) {
    const sides = sidesOf(scenario, inputs, finer);
    finer = finer.flatMap((from, i) => (sides(2 * i) === sides(2 * i + 1) ? [from] : cut(from, finer[i + 1])));
  }
  return finer;
}

/** The signs of d and ḋ just after a knot (even) and just before the next (odd). */
function sidesOf(scenario: Scenario, inputs: Inputs, knots: number[]): (i: number) => string {
  const near = (i: number, share: number) => knots[i] + share * ((knots[i + 1] ?? knots[i]) - knots[i]);
  const motion = motionAt(
    scenario,
    knots.flatMap((_, i) => [near(i, 1e-4), near(i, 1 - 1e-4)]),
  );
  return (i) => {
    const { t, x, v } = motion(i);
    const { base } = inputs.stretchFrom(t);
    const rate = v - base.rate(t);
    const isHeld = Math.abs(rate) <= 1e-9 * Math.abs(base.rate(t));
    return `${Math.sign(x - base.at(t))} ${isHeld ? 0 : Math.sign(rate)}`;
  };
}

const cut = (from: number, to: number): number[] => Array.from({ length: 20 }, (_, i) => from + ((to - from) * i) / 20);

function motionAt(scenario: Scenario, nodes: number[]): (i: number) => Instant {
  const result = simulate(scenario, { samples: 0, at: nodes });
  if ("error" in result || !result.at) throw new Error("no motion at the nodes");
  const { t, x, v, a, f } = result.at;
  return (i) => ({ t: t[i], x: x[i], v: v[i], a: a[i], f: f[i] });
}

/** A ledger that holds only the changes of kinetic and stored energy. */
function changes({ body }: Scenario, { events }: Result, first: Stretch, last: Stretch): Energy {
  const [start, end] = [events[0], events.at(-1)!];
  const stretchOf = (event: { t: number; x: number }, { base }: Stretch) => event.x - base.at(event.t);
  return {
    workForce: 0,
    workBase: 0,
    workWeight: 0,
    workCounterface: 0,
    heatContact: 0,
    heatViscous: 0,
    heatSolid: 0,
    changeKinetic: (body.inertia / 2) * (end.v ** 2 - start.v ** 2),
    changeStored: (body.stiffness / 2) * (stretchOf(end, last) ** 2 - stretchOf(start, first) ** 2),
    residual: 0,
  };
}

/** Adds the powers at one instant times dt. */
function addPowers(
  total: Energy,
  scenario: Scenario,
  { applied, shake, weight, base, face }: Stretch,
  { t, x, v, a, f: contact }: Instant,
  dt: number,
  flipped: Flip["of"] | null,
): void {
  const { inertia, stiffness, viscous } = scenario.body;
  const [baseRate, faceRate] = [base.rate(t), face.rate(t)];
  const rate = v - baseRate;
  const spring = stiffness * (x - base.at(t));
  // S as what the equation of motion leaves for it: it covers the instants it holds the body on ḋ = 0.
  const solid =
    scenario.solid.model === "none"
      ? 0
      : applied(t) + shake(t) + weight + contact - viscous * rate - spring - inertia * a;
  const f = flipped === "friction" ? -contact : contact;
  const damper = flipped === "damping" ? -viscous * rate : viscous * rate;
  total.workForce += applied(t) * v * dt;
  total.workBase += (shake(t) * v - (spring + damper + solid) * baseRate) * dt;
  total.workWeight += weight * v * dt;
  total.workCounterface += f * faceRate * dt;
  total.heatContact -= f * (v - faceRate) * dt;
  total.heatViscous += damper * rate * dt;
  total.heatSolid += solid * rate * dt;
}
