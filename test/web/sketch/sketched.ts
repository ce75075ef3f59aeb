import { inputsOf } from "../../../web/src/compute/inputs.ts";
import { sketchRange, sketchState, type SketchState } from "../../../web/src/features/sketch/sketch-state.ts";
import type { ScenarioSketch } from "../../support/scenario-builder.ts";
import { solved } from "../support/scenarios.ts";

/** A sketched scenario as it stands at a share of its run. */
export function stateAt(sketch: ScenarioSketch, share = 0.31): SketchState {
  const { scenario, result } = solved(sketch, 401);
  const { samples } = result;
  if (!samples) throw new Error("no samples");
  const inputs = inputsOf(scenario);
  const t = share * samples.t[samples.t.length - 1];
  return sketchState(scenario, inputs, samples, sketchRange(scenario, inputs, samples), t);
}

const coulomb = { model: "coulomb", static: 0.2, kinetic: 0.15 } as const;
const pressed = { law: coulomb, normal: { preload: 300 } };
const heavy = { law: coulomb, normal: { weight: true, preload: 30 } };
const body = { inertia: 20, stiffness: 8e4, viscous: 40 };
const span = { seconds: 1 };

/** One scenario for each part a sketch can have. */
export const cases = {
  feed: {
    body: { inertia: 120, stiffness: 4e6, viscous: 350 },
    contact: { law: { model: "coulomb", static: 0.15, kinetic: 0.12 }, normal: { preload: 800, weight: true } },
    base: [{ kind: "ramp", rate: 0.002 }],
    span: { seconds: 0.5 },
  },
  clamped: {
    body: { inertia: 0.5, stiffness: 245 },
    contact: { law: coulomb, normal: { preload: 3, faces: 2 } },
    initial: { displacement: 0.03 },
    span: { seconds: 2 },
  },
  forced: {
    body: { inertia: 10, stiffness: 1.2e4, viscous: 20 },
    solid: { model: "displacement-proportional", lossFactor: 0.02 },
    contact: { law: coulomb, normal: { weight: true } },
    force: [{ kind: "harmonic", amplitude: 50, hz: 10 }],
    span,
  },
  belt: {
    body: { inertia: 1000, stiffness: 1e7 },
    contact: { ...pressed, counterface: { velocity: 1e-3 } },
    initial: { velocity: 1e-3 },
    span,
  },
  gentle: { body, incline: 8, contact: heavy, initial: { displacement: 0.004 }, span },
  rising: { body, incline: 30, contact: heavy, initial: { displacement: 0.004 }, span },
  falling: {
    body,
    incline: -20,
    contact: pressed,
    force: [{ kind: "constant", value: 100 }],
    base: [{ kind: "move", distance: 0.01, speed: 0.1, acceleration: 1 }],
    span,
  },
  vertical: {
    body: { inertia: 20, stiffness: 8e4 },
    incline: 90,
    contact: { law: coulomb, normal: { preload: 3000, faces: 2 } },
    force: [{ kind: "harmonic", amplitude: 100, hz: 3 }],
    span,
  },
  shaken: {
    body,
    contact: { ...heavy, counterface: "base" },
    base: [{ kind: "harmonic", amplitude: 0.01, hz: 5 }],
    span,
  },
  block: { body: { inertia: 2, stiffness: 0 }, contact: heavy, initial: { velocity: 1 }, span },
  smooth: { body: { inertia: 2, stiffness: 200, viscous: 1 }, initial: { displacement: 0.01 }, span },
  still: { body: { inertia: 2, stiffness: 200 }, span },
  rotor: {
    motion: "angular",
    body: { inertia: 0.02, stiffness: 30, viscous: 0.01 },
    contact: { law: coulomb, normal: { preload: 10 }, radius: 0.1, counterface: { velocity: 3 } },
    force: [{ kind: "harmonic", amplitude: 2, hz: 4 }],
    base: [{ kind: "harmonic", amplitude: 0.05, hz: 4 }],
    span,
  },
  braked: {
    motion: "angular",
    body: { inertia: 0.02, stiffness: 30 },
    contact: { law: coulomb, normal: { preload: 40, faces: 2 }, radius: 0.1 },
    initial: { displacement: 0.3 },
    span,
  },
} satisfies Record<string, ScenarioSketch>;
