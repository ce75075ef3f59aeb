import { parseArgs } from "node:util";
import { UsageError } from "./arguments.ts";

/** A plan and its scenario, both files. */
export interface ExploreCommand {
  kind: "search" | "sweep" | "study";
  plan: string;
  file: string;
  /** Of a sweep: its cells are written, not run. */
  isCellsOnly: boolean;
  /** Of a sweep: a file of answers to be checked. */
  answers: string | null;
}

const sweepOnly = "--cells and --check go with a sweep.";

/** Reads the arguments of an exploration; null where they ask for none, or for help. Throws UsageError. */
export function readExploreArguments(given: readonly string[]): ExploreCommand | null {
  const [kind, ...rest] = given;
  if (kind !== "search" && kind !== "sweep" && kind !== "study") return null;
  const { values, positionals } = parsed(rest);
  if (values.help) return null;
  if (positionals.length !== 2) throw new UsageError(`Give two files after ${kind}: the plan, then the scenario.`);
  if (kind !== "sweep" && (values.cells || values.check !== undefined)) throw new UsageError(sweepOnly);
  if (values.cells && values.check !== undefined) throw new UsageError("Give --cells or --check, not both.");
  const [plan, file] = positionals;
  return { kind, plan, file, isCellsOnly: values.cells, answers: values.check ?? null };
}

function parsed(args: string[]) {
  try {
    return parseArgs({
      args,
      allowPositionals: true,
      options: {
        cells: { type: "boolean", default: false },
        check: { type: "string" },
        help: { type: "boolean", short: "h", default: false },
      },
    });
  } catch (error) {
    throw new UsageError((error as Error).message);
  }
}
