import { normalForce, type Scenario, type Term } from "@restband/solver";
import { readInput, say, sayInput } from "../../format/format-quantity.ts";
import type { Measure } from "../../format/unit.ts";
import { sayMany } from "../../format/words.ts";
import type { SketchState } from "./sketch-state.ts";

/* What stands beside the parts of the sketch. Empty where a part is not there. */

const measure = ({ motion }: Scenario, dimension: Measure["dimension"]): Measure => ({ dimension, motion });

export const inertiaWords = (scenario: Scenario): string =>
  sayInput(scenario.body.inertia, measure(scenario, "inertia"));

export function springWords(scenario: Scenario): string {
  const { body, solid } = scenario;
  if (body.stiffness === 0 && body.cubic === 0) return "";
  const rate = body.stiffness > 0 ? sayInput(body.stiffness, measure(scenario, "stiffness")) : "cubic";
  const bent = body.stiffness > 0 && body.cubic !== 0 ? " + cubic" : "";
  const loss =
    solid.model === "none" ? "" : `, η ${readInput(solid.lossFactor, { dimension: "none", motion: "linear" }).text}`;
  return rate + bent + loss;
}

export const damperWords = (scenario: Scenario): string =>
  scenario.body.viscous === 0 ? "" : sayInput(scenario.body.viscous, measure(scenario, "damping"));

/** What presses: "weight + 800 N", "2 faces, 400 N each". */
export function pressWords({ contact }: Scenario): string {
  const { preload, faces, weight } = contact.normal;
  const force = preload === 0 ? "" : sayInput(preload, { dimension: "pressing", motion: "linear" });
  const each = force !== "" && faces > 1 ? `${faces} faces, ${force} each` : force;
  return [weight ? "weight" : "", each].filter((part) => part !== "").join(" + ");
}

/** True where faces touch that can hold or brake: a law, and something that presses. */
export const rubs = (scenario: Scenario): boolean =>
  scenario.contact.law.model !== "none" && (normalForce(scenario) > 0 || scenario.contact.normal.ripple !== null);

/** The motion of the base in a few words: "feed 2 mm/s", "±50 μm at 10 Hz". */
export function baseWords(scenario: Scenario): string {
  const { base } = scenario;
  if (base.length === 0) return "";
  if (base.length > 1) return `base: ${sayMany(base.length, "motion")} together`;
  return motionWords(base[0], scenario);
}

function motionWords(term: Term, scenario: Scenario): string {
  const distance = (value: number): string => sayInput(value, measure(scenario, "displacement"));
  switch (term.kind) {
    case "ramp":
      return `feed ${sayInput(term.rate, measure(scenario, "velocity"))}`;
    case "harmonic":
      return `±${distance(Math.abs(term.amplitude))} at ${sayInput(term.hz, measure(scenario, "frequency"))}`;
    case "move":
      return `moves by ${distance(term.distance)}`;
    case "staircase":
      return `${sayMany(term.count, "step")} of ${distance(term.increment)}`;
    case "constant":
      return `base set at ${distance(term.value)}`;
    case "acceleration-record":
      return "base shaken as recorded";
    default:
      return "base moves as recorded";
  }
}

export function beltWords(scenario: Scenario): string {
  const { counterface } = scenario.contact;
  if (typeof counterface !== "object") return "";
  const speed = sayInput(counterface.velocity, measure(scenario, "velocity"));
  return scenario.motion === "linear" ? `belt ${speed}` : `pads turn at ${speed}`;
}

/** A signed force at the cursor: "friction −237 N". */
const forceWords = (name: string, value: number, scenario: Scenario): string =>
  `${name} ${say(value, measure(scenario, "force"))}`;

export const frictionWords = ({ here, scenario }: SketchState): string => forceWords("friction", here.f, scenario);

export const appliedWords = ({ force, scenario }: SketchState): string =>
  forceWords(scenario.motion === "linear" ? "force" : "torque", force, scenario);

export const bandWords = ({ band, scenario }: SketchState): string =>
  band === null ? "" : `rest band ±${say(band.half, measure(scenario, "displacement"))}`;
