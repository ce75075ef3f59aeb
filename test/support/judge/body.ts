import type { Scenario } from "@restband/solver";
import { forceOn, readNormal, type Stretch } from "./inputs.ts";

/** The body's constants, read from the scenario by the judge itself. */
export interface JudgedBody {
  readonly inertia: number;
  readonly stiffness: number;
  /** c + c_h, N·s/m. */
  readonly damping: number;
  /** ρ of the displacement-proportional damping. */
  readonly proportional: number;
  /** μs N r and μk N r at time t. */
  readonly holding: (t: number) => number;
  readonly sliding: (t: number) => number;
}

export function readBody(scenario: Scenario): JudgedBody {
  const { body, contact, solid } = scenario;
  const { law } = contact;
  if (body.cubic !== 0 || (law.model !== "none" && law.model !== "coulomb")) {
    throw new Error("the judge knows linear springs and the laws none and coulomb only");
  }
  const fixed = law.model === "coulomb" ? law.static * contact.radius : 0;
  const kinetic = law.model === "coulomb" ? law.kinetic * contact.radius : 0;
  const normal = readNormal(scenario);
  return {
    inertia: body.inertia,
    stiffness: body.stiffness,
    damping: body.viscous + solidViscous(scenario),
    proportional: solid.model === "displacement-proportional" ? (Math.PI * solid.lossFactor) / 2 : 0,
    holding: (t) => fixed * normal(t),
    sliding: (t) => kinetic * normal(t),
  };
}

/** c_h = η k / ω*. */
function solidViscous({ body, solid, force, base }: Scenario): number {
  if (solid.model !== "equivalent-viscous") return 0;
  const loss = solid.lossFactor * body.stiffness;
  if (solid.at === "natural") return loss / Math.sqrt(body.stiffness / body.inertia);
  if (solid.at !== "drive") return loss / (2 * Math.PI * solid.at.hz);
  const drive = [...force, ...base].find((term) => term.kind === "harmonic" || term.kind === "unbalance");
  if (!drive || !("hz" in drive)) throw new Error("no harmonic to take the solid damping at");
  return loss / (2 * Math.PI * drive.hz);
}

/**
 * To which side a body at x that rides on its counterface at time t begins to slip: 0 where it is held.
 * The needed force is m ü − F + (c + c_h) ḋ + k d + S − W; displacement-proportional damping adds its own hold where ḋ = 0.
 */
export function slipSide(body: JudgedBody, stretch: Stretch, t: number, x: number): -1 | 0 | 1 {
  const { base, face } = stretch;
  const stretchRate = face.rate(t) - base.rate(t);
  const spring = body.stiffness * (x - base.at(t));
  const solid = body.proportional * Math.abs(spring);
  const need =
    body.inertia * face.bend(t) -
    forceOn(stretch, t) +
    body.damping * stretchRate +
    spring +
    solid * Math.sign(stretchRate);
  const limit = body.holding(t) + (stretchRate === 0 ? solid : 0);
  if (Math.abs(need) <= limit * (1 + 1e-12)) return 0;
  return need > 0 ? -1 : 1;
}
