import { jsonText } from "../json-text.ts";
import type { Refusal, SimulateOptions } from "../options.ts";
import type { Result } from "../result.ts";
import { checkScenario } from "../scenario/check-scenario.ts";
import { ownMember } from "../scenario/own-member.ts";
import type { Fault } from "../scenario/scenario.ts";
import { quoted } from "../scenario/sentences.ts";
import { simulate } from "../simulate.ts";

const mostTimes = 10_000;

/** Runs a scenario given as JSON text, which may carry the times it is asked at as a top-level `at`. Never throws. */
export function answerText(text: string, options: SimulateOptions): Result | Refusal {
  const input = parse(text);
  return "fault" in input ? refusal([input.fault]) : answer(input.value, options);
}

/** The value of a JSON text, or the fault of it. */
export function parse(text: string): { value: unknown } | { fault: Fault } {
  try {
    return { value: JSON.parse(text.replace(/^\uFEFF/, "")) as unknown };
  } catch (error) {
    return { fault: { path: "", message: `This is no JSON: ${(error as Error).message}.` } };
  }
}

/** Runs a scenario given as plain data. Never throws: what was not foreseen is told in place, so that other lines go on. */
export function answer(input: unknown, options: SimulateOptions): Result | Refusal {
  const { at, scenario: bare } = withoutTimes(input);
  const { scenario, faults } = checkScenario(bare);
  const times = at ?? options.at;
  const all = [...faults, ...timeFaults(times, scenario?.span.seconds ?? Infinity)];
  if (scenario === null || all.length > 0) return refusal(all);
  try {
    return simulate(scenario, { ...options, at: times as number[] | undefined });
  } catch (error) {
    return refusal([{ path: "", message: `The run failed: ${(error as Error).message}.` }]);
  }
}

/** An answer as JSON text, and whether it is a refusal; a result that cannot be written is one. */
export function written(answer: Result | Refusal): { text: string; refused: Refusal | null } {
  try {
    return { text: jsonText(answer), refused: "error" in answer ? answer : null };
  } catch (error) {
    const refused = refusal([{ path: "", message: `The result cannot be written: ${(error as Error).message}.` }]);
    return { text: jsonText(refused), refused };
  }
}

export function refusal(faults: Fault[]): Refusal {
  return { error: { ...faults[0], faults } };
}

function withoutTimes(input: unknown): { at: unknown; scenario: unknown } {
  const at = ownMember(input, "at");
  if (at === undefined || Array.isArray(input)) return { at: undefined, scenario: input };
  return { at, scenario: Object.fromEntries(Object.entries(input as object).filter(([key]) => key !== "at")) };
}

/** Faults of the times asked for: at most 10,000 numbers in [0, seconds]. */
function timeFaults(at: unknown, seconds: number): Fault[] {
  if (at === undefined) return [];
  if (!Array.isArray(at)) return [{ path: "at", message: `The times asked for are a list; it is ${quoted(at)}.` }];
  if (at.length > mostTimes)
    return [{ path: "at", message: `At most ${mostTimes} times can be asked for; there are ${at.length}.` }];
  return at.flatMap((t: unknown, i) => {
    if (typeof t === "number" && t >= 0 && t <= seconds) return [];
    return [{ path: `at[${i}]`, message: `A time lies between 0 and the run's ${seconds} s; it is ${quoted(t)}.` }];
  });
}
