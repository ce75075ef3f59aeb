import type { Body, Contact, Law, Scenario, Solid, Term } from "@restband/solver";

type Defaulted = "phase" | "start" | "stop" | "fluid";
/** `T` with the members the format has defaults for left optional, kind by kind. */
type Sketch<T> = T extends unknown ? Omit<T, Defaulted & keyof T> & Partial<Pick<T, Defaulted & keyof T>> : never;

export type TermSketch = Sketch<Term>;

/** A scenario with only what a test is about. */
export interface ScenarioSketch {
  motion?: Scenario["motion"];
  body: Pick<Body, "inertia" | "stiffness"> & Partial<Body>;
  solid?: Solid;
  contact?: Omit<Partial<Contact>, "law" | "normal"> & {
    law?: Sketch<Law>;
    normal?: Partial<Contact["normal"]>;
  };
  incline?: number;
  force?: TermSketch[];
  base?: TermSketch[];
  initial?: Partial<Scenario["initial"]>;
  span: Pick<Scenario["span"], "seconds"> & Partial<Scenario["span"]>;
  settleBand?: number;
  limits?: Scenario["limits"];
}

/** The complete scenario of a sketch: what it leaves out takes the format's default; the law, `none` and no preload. */
export function buildScenario(sketch: ScenarioSketch): Scenario {
  return {
    format: "restband-scenario/1",
    title: "",
    purpose: "test",
    motion: sketch.motion ?? "linear",
    body: { cubic: 0, viscous: 0, ...sketch.body },
    solid: sketch.solid ?? { model: "none" },
    contact: buildContact(sketch.contact ?? {}),
    incline: sketch.incline ?? 0,
    force: (sketch.force ?? []).map(completeTerm),
    base: (sketch.base ?? []).map(completeTerm),
    initial: { displacement: 0, velocity: 0, ...sketch.initial },
    span: { untilRest: true, maxEvents: 200_000, maxWork: 2e7, ...sketch.span },
    settleBand: sketch.settleBand ?? null,
    limits: sketch.limits ?? [],
    origins: {},
  };
}

function buildContact(sketch: NonNullable<ScenarioSketch["contact"]>): Contact {
  const law = sketch.law ?? { model: "none" };
  return {
    law: law.model === "stribeck" || law.model === "bristle" ? { fluid: 0, ...law } : law,
    normal: { preload: 0, faces: 1, weight: false, ripple: null, ...sketch.normal },
    radius: sketch.radius ?? 1,
    counterface: sketch.counterface ?? "ground",
  };
}

function completeTerm(term: TermSketch): Term {
  switch (term.kind) {
    case "ramp":
      return { start: 0, stop: "none", ...term };
    case "harmonic":
    case "unbalance":
      return { phase: 0, ...term };
    case "step":
    case "pulse":
    case "move":
    case "staircase":
      return { start: 0, ...term };
    default:
      return term;
  }
}

/** A Coulomb contact given by its friction forces in N (pressed by 1 N, so that the coefficients are the forces). */
export function coulombForces(kinetic: number, fixed: number = kinetic): NonNullable<ScenarioSketch["contact"]> {
  return { law: { model: "coulomb", static: fixed, kinetic }, normal: { preload: 1 } };
}
