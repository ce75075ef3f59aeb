import { checkScenario } from "./check-scenario.ts";
import type { Fault, Term } from "./scenario.ts";

/** A body that every kind of term can act on; nothing of it is asked. */
const anyBody = {
  format: "restband-scenario/1",
  motion: "linear",
  body: { inertia: 1, stiffness: 1 },
  contact: { law: { model: "none" }, normal: { preload: 0 }, counterface: "base" },
  span: { seconds: 1, untilRest: false },
};

/** A term with every default written out, or every fault of it. */
export type CheckedTerm = { term: Term; faults: [] } | { term: null; faults: Fault[] };

/**
 * Checks a term that belongs to no scenario: what a person has switched off and keeps beside one. Paths of faults begin at
 * the term. That it fits a certain body is not asked. Never throws.
 */
export function checkTerm(place: "force" | "base", input: unknown): CheckedTerm {
  const { scenario, faults } = checkScenario({ ...anyBody, [place]: [input] });
  if (scenario) return { term: scenario[place][0], faults: [] };
  return { term: null, faults: faults.map((fault) => ({ ...fault, path: withoutRoot(fault.path, `${place}[0]`) })) };
}

const withoutRoot = (path: string, root: string): string =>
  path.startsWith(root) ? path.slice(root.length).replace(/^\./, "") : path;
