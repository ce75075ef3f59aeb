import { pathText } from "./path.ts";
import { ruleFaults } from "./rules.ts";
import type { Fault, Scenario } from "./scenario.ts";
import { draftSchema, scenarioSchema } from "./schema.ts";
import { quoted } from "./sentences.ts";
import type { z } from "./zod.ts";

/** A scenario with every default written out, or every fault of it. */
export type Checked = { scenario: Scenario; faults: [] } | { scenario: null; faults: Fault[] };

/** No answer names more faults than this. */
const mostFaults = 500;

/**
 * Checks anything for being a `restband-scenario/1`. All faults are found at once, each with the path of its field and a
 * sentence that says what is allowed; nothing is silently changed but for defaults written out. Never throws.
 */
export function checkScenario(input: unknown): Checked {
  const parsed = scenarioSchema.safeParse(input);
  const shape = parsed.success ? [] : parsed.error.issues.flatMap(faultsOf);
  const rules = ruleFaults(parsed.success ? parsed.data : draftSchema.parse(input));
  const faults = [...shape, ...uncovered(rules, shape)];
  if (parsed.success && faults.length === 0) return { scenario: parsed.data, faults: [] };
  return { scenario: null, faults: shortened(faults) };
}

function faultsOf(issue: z.core.$ZodIssue): Fault[] {
  if (issue.code !== "unrecognized_keys") return [{ path: pathText(issue.path), message: issue.message }];
  return issue.keys.map((key) => ({
    path: pathText([...issue.path, key]),
    message: `${quoted(key)} is not known here. Remove it, or correct its name.`,
  }));
}

/**
 * The faults of rules that say more than the members' own: not those of a member that is faulty itself, nor of the origin of
 * a number whose kind cannot be told.
 */
function uncovered(rules: readonly Fault[], shape: readonly Fault[]): Fault[] {
  const paths = new Set(shape.map((fault) => fault.path));
  const untold = shape.flatMap(({ path }) =>
    /\.(?:model|kind)$/.test(path) ? [`origins.${path.replace(/\w+$/, "")}`] : [],
  );
  return rules.filter(({ path }) => !paths.has(path) && !untold.some((owner) => path.startsWith(owner)));
}

function shortened(faults: Fault[]): Fault[] {
  if (faults.length <= mostFaults) return faults;
  const more = faults.length - mostFaults;
  return [...faults.slice(0, mostFaults), { path: "", message: `and ${more} more like these.` }];
}
