import { checkTerm, storedForm } from "@restband/solver";
import { refusedContent } from "../errors.ts";
import { type NamedRecord, namedRecords } from "../records/records-service.ts";
import type { SwitchedOff } from "./scenarios-schema.ts";

/**
 * Terms that are switched off as they are kept, each with its defaults written out and long records named by digest: one
 * that is brought back is a term of the format.
 * @throws Refusal 422 with every faulty field, under `switchedOff[i].term`
 */
export function checkedSwitchedOff(entries: readonly SwitchedOff[]): { kept: SwitchedOff[]; records: NamedRecord[] } {
  const checked = entries.map((entry) => ({ entry, ...checkTerm(entry.place, entry.term) }));
  const faults = checked.flatMap((each, i) =>
    each.faults.map(({ path, message }) => ({ path: `switchedOff[${i}].term${path && `.${path}`}`, message })),
  );
  if (faults.length > 0) throw refusedContent("refused-scenario", faults);
  const sent = checked.flatMap(({ entry, term }) => (term ? [{ ...entry, term }] : []));
  const kept = sent.map((entry) => ({ ...entry, term: storedForm(entry.term) }));
  return { kept, records: namedRecords(byPath(kept), byPath(sent)) };
}

function byPath(entries: readonly SwitchedOff[]) {
  return Object.fromEntries(entries.map(({ term }, i) => [`switchedOff[${i}].term`, term]));
}
