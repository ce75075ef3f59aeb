import { simulate, type Result, type SimulateOptions } from "@restband/solver";
import { buildScenario, type ScenarioSketch } from "./scenario-builder.ts";

/** The result of a sketched scenario; throws where it is refused. */
export function run(sketch: ScenarioSketch, options: SimulateOptions = {}): Result {
  const result = simulate(buildScenario(sketch), { samples: 0, ...options });
  if ("error" in result) throw new Error(`${result.error.path}: ${result.error.message}`);
  return result;
}

/** Where the body starts and where its velocity passes through zero, in order. */
export function turningPoints({ events }: Result): number[] {
  return events.filter(({ kind }) => kind === "start" || kind === "turn" || kind === "stop").map(({ x }) => x);
}

/** The distance slipped against a constant friction force, m: heat over force. */
export function pathOf(result: Result, force: number): number {
  return (result.energy?.heatContact ?? NaN) / force;
}
