import type { Scenario } from "@restband/solver";
import type { Measure } from "../../../format/unit.ts";

/** Another way to say the same value: shown beside the field, and typed there too. */
export interface Equivalent {
  readonly before: string;
  readonly after: string;
  readonly measure: Measure;
  /** From the value in SI to the equivalent in SI, and back. */
  readonly of: (value: number) => number;
  readonly to: (equivalent: number) => number;
}

/** The equivalents of the value at a path that this scenario gives a meaning to. */
export function equivalentsOf(scenario: Scenario, path: string): readonly Equivalent[] {
  const { inertia, stiffness } = scenario.body;
  if (path === "body.viscous" && stiffness > 0) return dampingRatios(2 * Math.sqrt(stiffness * inertia));
  if (path === "body.stiffness") return [naturalFrequency(inertia)];
  if (/^contact\.law\.(static|kinetic)$/.test(path)) return frictionForce(scenario);
  return [];
}

/** ζ = c / (2√(km)); `critical` is the damping at which ζ is 1. */
function dampingRatios(critical: number): Equivalent[] {
  const ratio = { measure: none, of: (c: number) => c / critical, to: (zeta: number) => zeta * critical };
  const percent = { measure: none, of: (c: number) => (100 * c) / critical, to: (p: number) => (p / 100) * critical };
  return [
    { before: "or as damping ratio", after: "", ...ratio },
    { before: "or", after: "% of critical", ...percent },
  ];
}

/** f = √(k/m)/2π. */
function naturalFrequency(inertia: number): Equivalent {
  return {
    before: "or as natural frequency",
    after: "Hz",
    measure: none,
    of: (k) => Math.sqrt(k / inertia) / (2 * Math.PI),
    to: (hz) => inertia * (2 * Math.PI * hz) ** 2,
  };
}

/** μN r, the friction force (or torque) of the law at the pressing force without ripple. */
function frictionForce({ motion, contact, body, incline }: Scenario): Equivalent[] {
  const weight = contact.normal.weight ? body.inertia * 9.80665 * Math.cos((incline * Math.PI) / 180) : 0;
  const arm = (contact.normal.faces * contact.normal.preload + weight) * (motion === "angular" ? contact.radius : 1);
  if (!(arm > 0)) return [];
  const unit = motion === "angular" ? "N·m" : "N";
  return [
    { before: "or as friction of", after: unit, measure: none, of: (mu) => mu * arm, to: (force) => force / arm },
  ];
}

const none: Measure = { dimension: "none", motion: "linear" };
