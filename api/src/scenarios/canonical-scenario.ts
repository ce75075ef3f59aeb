import { checkScenario, digestOf, jsonText, type Scenario } from "@restband/solver";
import { refusedContent, type FieldFault } from "../errors.ts";

/** A list tells no more of a title; the content has all of it. */
const LONGEST_TITLE = 300;

/**
 * What is kept of a checked scenario: its text, keys sorted and defaults written, long records with all their points; the
 * SHA-256 of its canonical text (lower-case hex), in which they are named by digest; and what lists tell of it.
 */
export interface CanonicalScenario {
  readonly text: string;
  readonly digest: string;
  readonly title: string;
  readonly purpose: string;
}

/**
 * Checks a scenario by the solver's own rules; faults keep the paths of the format.
 * @throws Refusal 422 with every faulty field
 */
export function canonicalOf(input: unknown): CanonicalScenario {
  const { scenario, faults } = checkScenario(input);
  if (!scenario) throw refusedContent("refused-scenario", faults);
  return kept(scenario);
}

/**
 * Checks several scenarios; the faults of all of them are named at once, under `contents[i]`.
 * @throws Refusal 422 with every faulty field
 */
export function canonicalCases(inputs: readonly unknown[]): CanonicalScenario[] {
  const checked = inputs.map((input) => checkScenario(input));
  const faults = checked.flatMap((each, index) => each.faults.map((fault) => within(`contents[${index}]`, fault)));
  if (faults.length > 0) throw refusedContent("refused-scenario", faults);
  return checked.flatMap(({ scenario }) => (scenario ? [kept(scenario)] : []));
}

function within(root: string, { path, message }: FieldFault): FieldFault {
  return { path: path === "" ? root : `${root}.${path}`, message };
}

function kept(scenario: Scenario): CanonicalScenario {
  const title = scenario.title.slice(0, LONGEST_TITLE);
  return { text: jsonText(scenario, "sorted"), digest: digestOf(scenario), title, purpose: scenario.purpose };
}

/** The members in which two canonical texts differ: what a trail tells of a save. */
export function changedMembers(before: string, after: string): string[] {
  const [old, next] = [before, after].map((text) => JSON.parse(text) as Record<string, unknown>);
  return Object.keys(next).filter((key) => JSON.stringify(old[key]) !== JSON.stringify(next[key]));
}

/** The same scenario under another title. */
export function retitled(text: string, title: string): CanonicalScenario {
  return canonicalOf({ ...(JSON.parse(text) as Scenario), title });
}
