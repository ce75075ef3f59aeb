import type { Refusal, SimulateOptions } from "../options.ts";
import { digestOf } from "../scenario/canonical.ts";
import { checkScenario } from "../scenario/check-scenario.ts";
import { pythonGap } from "../script/not-covered.ts";
import { pythonScript } from "../script/python-script.ts";
import { simulate } from "../simulate.ts";
import { parse, refusal } from "./answer.ts";

/** The Python file of a scenario given as JSON text, with this solver's result to compare; a refusal where there is none. */
export function scriptText(text: string, options: SimulateOptions): { text: string; refused: Refusal | null } {
  const input = parse(text);
  if ("fault" in input) return refusedBy(refusal([input.fault]));
  const { scenario, faults } = checkScenario(input.value);
  if (scenario === null) return refusedBy(refusal(faults));
  const result = simulate(scenario, options);
  if ("error" in result) return refusedBy(result);
  const gap = pythonGap(scenario, result.ended);
  if (gap !== null) return refusedBy(refusal([{ path: "", message: gap }]));
  const claim = { ...result, eventCount: result.events.length, digest: digestOf(scenario), name: "this run" };
  return { text: pythonScript(scenario, claim).trimEnd(), refused: null };
}

const refusedBy = (refused: Refusal) => ({ text: "", refused });
