import { parseArgs } from "node:util";
import type { SimulateOptions } from "../options.ts";
import { quantityNames } from "../scenario/quantity-names.ts";

export const usage = `npm run --silent solve -- FILE [options]      one scenario, one result as JSON
npm run --silent solve -- --lines [options]   a scenario a line on standard input, a result a line on standard output
npm run --silent solve -- python FILE         a Python file that recomputes the result by itself (numpy, scipy)

  --samples N          points of the uniform grid of samples (2001; with --lines 0)
  --no-samples         leave samples out
  --at t1,t2,…         values at these times, s; a scenario may carry its own as "at": [t1, t2]
  --method NAME        auto, exact or adaptive (auto)
  --no-events          leave the list of events out
  --quantities a,b,…   these quantities only

npm run --silent solve -- search QUESTION FILE           a threshold: {"path", "low", "high", "target"}
npm run --silent solve -- sweep PLAN FILE                a restband-sweep/1 of a scenario, a cell a line
npm run --silent solve -- sweep PLAN FILE --cells        its cells alone, to be solved elsewhere with --lines
npm run --silent solve -- sweep PLAN FILE --check FILE   whether answers solved elsewhere are whole and right
npm run --silent solve -- study PLAN FILE                a restband-tolerance/1 of a scenario: what it says

A line that is refused gives {"error": {"path", "message", "faults"}} in its place. With --lines, a first line of format
restband-cells/1 makes each further line a cell, [index, value, …], answered by [index, outcome, quantity, …].

Exit status: 0; 1 where a scenario was refused; 2 where the command cannot be read.
`;

/** What the command line asks for; `file` null reads lines. */
export interface Command {
  file: string | null;
  /** True where a Python file is wanted in place of the result. */
  asPython: boolean;
  options: SimulateOptions;
}

/** Something about the command itself that has to be put right: exit status 2. */
export class UsageError extends Error {}

/** Reads the arguments after the program's name; null where only help is asked. Throws UsageError. */
export function readArguments(given: readonly string[]): Command | null {
  const { values, positionals } = parsed(given);
  if (values.help) return null;
  const asPython = !values.lines && positionals.length === 2 && positionals[0] === "python";
  const files = asPython ? positionals.slice(1) : positionals;
  if (values.lines ? files.length > 0 : files.length !== 1)
    throw new UsageError("Give one file, or --lines and no file.");
  const options: SimulateOptions = {
    samples: samplesOf(values.samples, values["no-samples"] || (values.lines && values.samples === undefined)),
    ...(values.at === undefined ? {} : { at: numbersOf("--at", values.at) }),
    ...(values.method === undefined ? {} : { method: methodOf(values.method) }),
    ...(values["no-events"] ? { events: false } : {}),
    ...(values.quantities === undefined ? {} : { quantities: quantitiesOf(values.quantities) }),
  };
  return { file: files[0] ?? null, asPython, options };
}

function parsed(given: readonly string[]) {
  try {
    return parseArgs({
      args: [...given],
      allowPositionals: true,
      options: {
        lines: { type: "boolean", default: false },
        samples: { type: "string" },
        "no-samples": { type: "boolean", default: false },
        at: { type: "string" },
        method: { type: "string" },
        "no-events": { type: "boolean", default: false },
        quantities: { type: "string" },
        help: { type: "boolean", short: "h", default: false },
      },
    });
  } catch (error) {
    throw new UsageError((error as Error).message);
  }
}

const mostSamples = 1_000_000;

function samplesOf(text: string | undefined, isLeftOut: boolean): number | undefined {
  if (isLeftOut) return 0;
  if (text === undefined) return undefined;
  const samples = Number(text);
  if (Number.isInteger(samples) && samples >= 2 && samples <= mostSamples) return samples;
  throw new UsageError(`--samples takes a whole number between 2 and ${mostSamples}; it is ${JSON.stringify(text)}.`);
}

function numbersOf(name: string, text: string): number[] {
  return text.split(",").map((part) => {
    const value = Number(part);
    if (part.trim() === "" || !Number.isFinite(value))
      throw new UsageError(`${name} takes numbers with commas between; ${JSON.stringify(part)} is none.`);
    return value;
  });
}

function methodOf(text: string): "auto" | "exact" | "adaptive" {
  if (text === "auto" || text === "exact" || text === "adaptive") return text;
  throw new UsageError(`--method is auto, exact or adaptive; it is ${JSON.stringify(text)}.`);
}

function quantitiesOf(text: string): string[] {
  const names = text.split(",").filter((name) => name !== "");
  const unknown = names.find((name) => !(quantityNames as readonly string[]).includes(name));
  if (unknown !== undefined) throw new UsageError(`--quantities: no quantity is called ${JSON.stringify(unknown)}.`);
  return names;
}
