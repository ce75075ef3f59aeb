import { canonicalForm, checkScenario, jsonText, type Scenario } from "@restband/solver";
import { refusedContent, type FieldFault } from "../errors.ts";
import { type NamedRecord, namedRecords, termsOf } from "../records/records-service.ts";
import { sha256Of } from "../sha256.ts";

/** A list tells no more of a title; the content has all of it. */
const LONGEST_TITLE = 300;

/** What is kept of a checked scenario: its canonical text, byte for byte, and what lists tell of it. */
export interface CanonicalScenario {
  readonly text: string;
  /** SHA-256 of the text, lower-case hex. */
  readonly digest: string;
  /** The records that the text names, to be kept beside it. */
  readonly records: readonly NamedRecord[];
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
  return checked.flatMap(({ scenario }, index) => (scenario ? [casesKept(kept(scenario), `contents[${index}]`)] : []));
}

function within(root: string, { path, message }: FieldFault): FieldFault {
  return { path: path === "" ? root : `${root}.${path}`, message };
}

/** The records of one case of several are named by where it stands. */
function casesKept(canonical: CanonicalScenario, root: string): CanonicalScenario {
  return { ...canonical, records: canonical.records.map((record) => ({ ...record, path: `${root}.${record.path}` })) };
}

function kept(scenario: Scenario): CanonicalScenario {
  const form = canonicalForm(scenario);
  const text = jsonText(form, "sorted");
  return {
    ...{ text, digest: sha256Of(text).toString("hex"), records: namedRecords(termsOf(form), termsOf(scenario)) },
    ...{ title: scenario.title.slice(0, LONGEST_TITLE), purpose: scenario.purpose },
  };
}

/** The members in which two canonical texts differ: what a trail tells of a save. */
export function changedMembers(before: string, after: string): string[] {
  const [old, next] = [before, after].map((text) => JSON.parse(text) as Record<string, unknown>);
  return Object.keys(next).filter((key) => JSON.stringify(old[key]) !== JSON.stringify(next[key]));
}
