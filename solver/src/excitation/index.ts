import { accelerationRecord } from "./acceleration-record.ts";
import { chirp } from "./chirp.ts";
import { constant } from "./constant.ts";
import type { ExcitationTerm } from "./excitation-term.ts";
import { harmonic } from "./harmonic.ts";
import { move } from "./move.ts";
import { pulse } from "./pulse.ts";
import { ramp } from "./ramp.ts";
import { record } from "./record.ts";
import { staircase } from "./staircase.ts";
import { step } from "./step.ts";
import { unbalance } from "./unbalance.ts";

/** Every excitation kind, in the order menus show them. A new kind is one file and one line here. */
const kinds = [
  constant,
  ramp,
  step,
  harmonic,
  unbalance,
  pulse,
  chirp,
  move,
  staircase,
  record,
  accelerationRecord,
] as const;

type ValuesOf<Kind> = Kind extends ExcitationTerm<string, infer Values> ? Values : never;

/** A term of `force` or `base` of a scenario. */
export type Term = ValuesOf<(typeof kinds)[number]>;
export type TermKind = Term["kind"];

export const excitationTerms: readonly ExcitationTerm<TermKind, Term>[] = kinds;

/** The description of a kind by its name; throws RangeError where there is none of that name. */
export function termOf(kind: TermKind): ExcitationTerm<TermKind, Term> {
  const term = excitationTerms.find((each) => each.kind === kind);
  if (term === undefined) throw new RangeError(`no excitation is called ${JSON.stringify(kind)}`);
  return term;
}
