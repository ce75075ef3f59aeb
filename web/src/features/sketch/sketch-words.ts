import type { Scenario } from "@restband/solver";
import { formatExactly } from "../../format/format-number.ts";
import { say } from "../../format/format-quantity.ts";
import { nounOf } from "../../format/noun.ts";
import type { Measure } from "../../format/unit.ts";
import { listed } from "../../format/words.ts";
import {
  appliedWords,
  baseWords,
  bandWords,
  beltWords,
  damperWords,
  frictionWords,
  inertiaWords,
  pressWords,
  rubs,
  springWords,
} from "./sketch-labels.ts";
import { isToldOfBase, type SketchState } from "./sketch-state.ts";

/** What the scale under the sketch measures. */
export function scaleWords(scenario: Scenario): string {
  const noun = nounOf(scenario);
  if (!isToldOfBase(scenario)) return scenario.motion === "angular" ? `turn of the ${noun}` : `place of the ${noun}`;
  const base = scenario.base.some(({ kind }) => kind === "ramp") ? "drive" : "base";
  return `${noun} behind (−) or ahead of the ${base}`;
}

/** The sketch in words, for those who cannot see it: the parts, then how they stand at the cursor. */
export function sketchWords(state: SketchState): string {
  return `Sketch. ${partsWords(state.scenario)} ${standWords(state)}`;
}

function partsWords(scenario: Scenario): string {
  const parts = [
    prefixed("a spring of ", springWords(scenario)),
    prefixed("a damper of ", damperWords(scenario)),
    prefixed("a base that is driven: ", baseWords(scenario)),
    rubs(scenario) ? `rubbing faces pressed by ${pressWords(scenario)}` : "",
    prefixed("a counterface that runs: ", beltWords(scenario)),
    scenario.incline === 0 ? "" : `a guide inclined by ${formatExactly(scenario.incline)}°`,
  ].filter((part) => part !== "");
  const body = `A ${nounOf(scenario)} of ${inertiaWords(scenario)}`;
  return parts.length === 0 ? `${body}, free.` : `${body} with ${listed(parts)}.`;
}

const prefixed = (words: string, what: string): string => (what === "" ? "" : words + what);

function standWords(state: SketchState): string {
  const { scenario, here, place, band } = state;
  const measure = (dimension: Measure["dimension"]): Measure => ({ dimension, motion: scenario.motion });
  const where = `At ${say(here.t, measure("time"), { digits: 4 })} it is at ${say(place, measure("displacement"))} on the scale (${scaleWords(scenario)})`;
  const inside =
    band === null
      ? ""
      : `, ${Math.abs(place - band.centre) <= band.half ? "within" : "outside"} the ${bandWords(state)}`;
  const forces = [
    rubs(scenario) ? frictionWords(state) : "",
    scenario.force.length > 0 ? appliedWords(state) : "",
  ].filter((words) => words !== "");
  return `${where}${inside}${forces.length > 0 ? `; ${listed(forces)}` : ""}.`;
}
