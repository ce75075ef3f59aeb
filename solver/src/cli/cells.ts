import { linkFaults, withValues, type Links } from "../explore/links.ts";
import { cellsFormat } from "../explore/sweep/exchange.ts";
import type { Refusal, SimulateOptions } from "../options.ts";
import { checkScenario } from "../scenario/check-scenario.ts";
import { fieldPaths } from "../scenario/field-paths.ts";
import { ownMember } from "../scenario/own-member.ts";
import { quantityNames } from "../scenario/quantity-names.ts";
import type { Fault, Scenario } from "../scenario/scenario.ts";
import { quoted } from "../scenario/sentences.ts";
import { answer, parse } from "./answer.ts";

/** The first line of `restband-cells/1`: what its cells vary, and what is asked of each. */
export interface Cells {
  readonly base: Scenario;
  /** Paths the values of a cell are set at, in order. */
  readonly fields: readonly string[];
  readonly links: Links;
  readonly quantities: readonly string[];
}

/** Checks a header: its base is a scenario, its paths are fields of it, its quantities have names. */
export function checkCells(header: unknown): { cells: Cells; faults: [] } | { cells: null; faults: Fault[] } {
  const { scenario, faults } = checkScenario(ownMember(header, "base"));
  if (scenario === null)
    return {
      cells: null,
      faults: faults.map((fault) => ({ ...fault, path: ["base", fault.path].filter(Boolean).join(".") })),
    };
  const paths = new Set(fieldPaths(scenario));
  const fields = ownMember(header, "fields");
  const quantities = ownMember(header, "quantities");
  const links = ownMember(header, "links") ?? {};
  const wrong = [
    ...unknownNames("fields", fields, paths, "This scenario has no number called"),
    ...unknownNames("quantities", quantities, new Set(quantityNames), "No quantity is called"),
    ...linkFaults(links, scenario, Array.isArray(fields) ? (fields as string[]) : []),
  ];
  if (wrong.length > 0) return { cells: null, faults: wrong };
  return { cells: { base: scenario, fields, links, quantities } as Cells, faults: [] };
}

function unknownNames(path: string, names: unknown, known: ReadonlySet<string>, sentence: string): Fault[] {
  if (!Array.isArray(names)) return [{ path, message: `A header of ${cellsFormat} has a list of ${path}.` }];
  return names.flatMap((name: unknown, i) =>
    known.has(name as string) ? [] : [{ path: `${path}[${i}]`, message: `${sentence} ${quoted(name)}.` }],
  );
}

/** One cell, `[index, value, …]`, answered by `[index, outcome, quantity, …]`; a reason follows where there is no outcome. */
export function answerCell(cells: Cells, line: string, options: SimulateOptions): unknown[] {
  const empty = cells.quantities.map(() => null);
  const input = parse(line);
  if ("fault" in input) return [null, null, ...empty, input.fault.message];
  const [index, ...values] = Array.isArray(input.value) ? (input.value as unknown[]) : [null];
  if (typeof index !== "number" || values.length !== cells.fields.length || !values.every((v) => typeof v === "number"))
    return [index, null, ...empty, `A cell is [index, ${cells.fields.join(", ")}], all numbers.`];
  const result = answer(cellScenario(cells, values), cellOptions(cells, options));
  if ("error" in result) return [index, null, ...empty, reasonOf(result)];
  const quantities = cells.quantities.map((name) => result.quantities[name] ?? null);
  return [
    index,
    result.outcome,
    ...quantities,
    ...(result.outcome === null ? [`The run ended by ${result.ended}.`] : []),
  ];
}

function cellScenario({ base, fields, links }: Cells, values: readonly number[]): Scenario {
  return withValues(
    base,
    fields.map((path, i) => [path, values[i]]),
    links,
  );
}

const cellOptions = ({ quantities }: Cells, { method }: SimulateOptions): SimulateOptions => ({
  method,
  quantities,
  samples: 0,
  events: false,
  energy: false,
});

const reasonOf = ({ error: { path, message } }: Refusal) => (path === "" ? message : `${path}: ${message}`);
