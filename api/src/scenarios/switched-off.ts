import { checkTerm } from "@restband/solver";
import { refusedContent } from "../errors.ts";
import type { SwitchedOff } from "./scenarios-schema.ts";

/**
 * Terms that are switched off, each with its defaults written out: one that is brought back is a term of the format.
 * @throws Refusal 422 with every faulty field, under `switchedOff[i].term`
 */
export function checkedSwitchedOff(entries: readonly SwitchedOff[]): SwitchedOff[] {
  const checked = entries.map((entry) => ({ entry, ...checkTerm(entry.place, entry.term) }));
  const faults = checked.flatMap((each, i) =>
    each.faults.map(({ path, message }) => ({ path: `switchedOff[${i}].term${path && `.${path}`}`, message })),
  );
  if (faults.length > 0) throw refusedContent("refused-scenario", faults);
  return checked.flatMap(({ entry, term }) => (term ? [{ ...entry, term }] : []));
}
