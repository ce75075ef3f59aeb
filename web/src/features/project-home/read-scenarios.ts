import { mostCases } from "@restband/api/contract";
import { checkScenario, type Fault, type Scenario } from "@restband/solver";

/** What a text of JSON holds: scenarios, or every reason why not. */
export type ScenariosRead = { scenarios: Scenario[]; faults: null } | { scenarios: null; faults: Fault[] };

/** Reads one scenario, or a list of them, from JSON. A fault in any refuses all; a list's faults say which. */
export function readScenarios(text: string): ScenariosRead {
  const value = parsed(text);
  if (value instanceof SyntaxError) return refused("", `This is no JSON: ${value.message}.`);
  if (!Array.isArray(value)) return checked([value], () => "");
  if (value.length === 0) return refused("", "The list is empty.");
  if (value.length > mostCases) {
    return refused("", `The list holds ${value.length} scenarios; at most ${mostCases} come in at once.`);
  }
  return checked(value, (index) => `[${index}]`);
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch (error) {
    return error instanceof SyntaxError ? error : new SyntaxError(String(error));
  }
}

function checked(values: readonly unknown[], rootOf: (index: number) => string): ScenariosRead {
  const all = values.map((value) => checkScenario(value));
  const faults = all.flatMap((each, index) =>
    each.faults.map(({ path, message }) => ({ path: [rootOf(index), path].filter(Boolean).join("."), message })),
  );
  if (faults.length > 0) return { scenarios: null, faults };
  return { scenarios: all.flatMap(({ scenario }) => scenario ?? []), faults: null };
}

const refused = (path: string, message: string): ScenariosRead => ({ scenarios: null, faults: [{ path, message }] });
