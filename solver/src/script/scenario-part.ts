import { cosDegrees, sinDegrees } from "../scenario/degrees.ts";
import { driveHz } from "../scenario/drive-hz.ts";
import type { Counterface, Scenario, Solid, Term } from "../scenario/scenario.ts";
import { lawPart } from "./law-part.ts";
import { pythonNumber as n, pythonValue } from "./literals.ts";
import { isNothing, termPart, type TermPart } from "./term-parts.ts";

/** The scenario's numbers as Python constants. Must stand before the functions of `scenarioFunctions`. */
export function scenarioConstants(scenario: Scenario): string {
  const { body, solid, contact, incline, initial, span, motion } = scenario;
  const { preload, faces, weight, ripple } = contact.normal;
  const isLinear = motion === "linear";
  const share = weight ? ` + MASS * GRAVITY * ${n(cosDegrees(incline))}` : "";
  const law = contact.law;
  return lines([
    `MASS = ${n(body.inertia)}  # ${isLinear ? "kg" : "kg m2, the moment of inertia"}`,
    `STIFFNESS = ${n(body.stiffness)}  # k`,
    `CUBIC = ${n(body.cubic)}  # k3`,
    `DAMPING = ${n(body.viscous)}  # c`,
    ...solidLines(solid, scenario),
    "GRAVITY = 9.80665",
    `WEIGHT = -MASS * GRAVITY * ${n(isLinear ? sinDegrees(incline) : 0)}  # W, along the guide; sin ${n(incline)} degrees`,
    `NORMAL = ${n(faces)} * ${n(preload)}${share}  # N without ripple`,
    `RIPPLE, RIPPLE_HZ, RIPPLE_PHASE = ${ripple ? [ripple.amplitude, ripple.hz, ripple.phase].map(n).join(", ") : "0.0, 1.0, 0.0"}`,
    `RADIUS = ${n(contact.radius)}  # r, 1 for a body on a guide`,
    `LAW = "${law.model}"`,
    `FLUID = ${n("fluid" in law ? law.fluid : 0)}  # b`,
    `COUNTERFACE = "${counterfaceName(contact.counterface)}"`,
    `BELT = ${n(typeof contact.counterface === "object" ? contact.counterface.velocity : 0)}`,
    `START_PLACE, START_VELOCITY = ${n(initial.displacement)}, ${n(initial.velocity)}`,
    `SECONDS, UNTIL_REST = ${n(span.seconds)}, ${span.untilRest ? "True" : "False"}`,
    `SETTLE_BAND = ${pythonValue(scenario.settleBand)}`,
  ]);
}

function solidLines(solid: Solid, scenario: Scenario): string[] {
  if (solid.model === "none") return ["SOLID_VISCOUS, SOLID_SHARE = 0.0, 0.0  # no solid damping"];
  if (solid.model === "displacement-proportional")
    return [`SOLID_VISCOUS, SOLID_SHARE = 0.0, np.pi * ${n(solid.lossFactor)} / 2  # S = share k |d| sgn d'`];
  const hz = solid.at === "drive" ? driveHz(scenario) : solid.at === "natural" ? null : solid.at.hz;
  const omega = hz === null ? "np.sqrt(STIFFNESS / MASS)" : `(TURN * ${n(hz)})`;
  return [`SOLID_VISCOUS, SOLID_SHARE = ${n(solid.lossFactor)} * STIFFNESS / ${omega}, 0.0  # S = SOLID_VISCOUS d'`];
}

const counterfaceName = (counterface: Counterface) => (typeof counterface === "object" ? "belt" : counterface);

/** Force, base, floor, friction and pressing force of the scenario as Python functions, and the instants at which inputs are not smooth. */
export function scenarioFunctions({ force, base, contact }: Scenario): string {
  const isShaken = base.some(({ kind }) => kind === "acceleration-record");
  const forces = partsOf(force, "FORCE");
  const bases = partsOf(isShaken ? [] : base, "BASE");
  const floors = partsOf(isShaken ? base : [], "FLOOR");
  const law = lawPart(contact.law);
  const all = [...forces, ...bases, ...floors];
  return lines([
    ...all.flatMap(({ part }) => part.setUp ?? []),
    ...(law.setUp ?? []),
    "",
    ...functionOf("force(t, at)", "F(t), what acts on the body.", sumOf(forces, 0)),
    ...functionOf("base(t, at)", "y, y' and y'': where the far end of the spring is.", [
      ...assigned("y", bases, 0),
      ...assigned("y1", bases, 1),
      ...assigned("y2", bases, 2),
      "return y, y1, y2",
    ]),
    ...functionOf(
      "floor(t, at)",
      "The floor's acceleration where all motion is told relative to it.",
      sumOf(floors, 0),
    ),
    ...functionOf("friction(v)", "mu(v) for v >= 0, the value at rest for v = 0.", law.body),
    ...functionOf("pressing(t)", "N(t), never below 0.", [
      "return np.maximum(0.0, NORMAL + RIPPLE * np.cos(TURN * RIPPLE_HZ * t + np.radians(RIPPLE_PHASE)))",
    ]),
    ...functionOf(
      "counterface(t, at)",
      "u, u' and u'': where the other face is.",
      counterfaceBody(contact.counterface),
    ),
    `CONSTANT_FROM = max([0.0, ${all.map(({ part }) => part.constantFrom).join(", ")}])`,
    `FORCE_CONSTANT_FROM = max([0.0, ${forces.map(({ part }) => part.constantFrom).join(", ")}])`,
    `INPUT_CORNERS = [${all.flatMap(({ part }) => part.corners.map((corner) => `*${corner}`)).join(", ")}]`,
  ]);
}

interface Named {
  readonly part: TermPart;
  readonly comment: string;
}

function partsOf(terms: readonly Term[], name: string): Named[] {
  return terms.flatMap((term, i) =>
    isNothing(term) ? [] : [{ part: termPart(term, `${name}_${i}`), comment: term.kind }],
  );
}

function sumOf(parts: readonly Named[], which: 0 | 1 | 2): string[] {
  return [...assigned("total", parts, which), "return total"];
}

function assigned(name: string, parts: readonly Named[], which: 0 | 1 | 2): string[] {
  const added = parts.filter(({ part }) => part.value[which] !== "0.0");
  return [
    `${name} = 0.0 * t`,
    ...added.map(({ part, comment }) => `${name} = ${name} + ${part.value[which]}  # ${comment}`),
  ];
}

function functionOf(head: string, says: string, body: readonly string[]): string[] {
  return [`def ${head}:`, `    """${says}"""`, ...body.map((line) => `    ${line}`), "", ""];
}

function counterfaceBody(counterface: Counterface): string[] {
  if (counterface === "base") return ["return base(t, at)"];
  return counterface === "ground" ? ["return 0.0 * t, 0.0 * t, 0.0 * t"] : ["return BELT * t, BELT + 0.0 * t, 0.0 * t"];
}

const lines = (all: readonly string[]) => `${all.join("\n")}\n`;
