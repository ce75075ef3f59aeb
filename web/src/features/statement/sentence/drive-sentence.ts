import type { SwitchedOff } from "@restband/api/contract";
import { excitationTerms, termOf, type Scenario, type Term, type TermKind } from "@restband/solver";
import { addTerm, type Place } from "../changes.ts";
import type { DraftAction } from "../draft/draft.ts";
import { raiseTerm, removeTerm, switchOff, switchOn, termRows, type TermRow } from "../terms.ts";
import { value } from "./body-sentence.ts";
import { text, type Piece, type WordPiece } from "./piece.ts";
import { plainText } from "./plain-text.ts";
import { fromTemplate } from "./template.ts";

/** "The far end of the spring is fed at 2 mm/s from 0 s on. No force acts on the body; the ways are level." */
export function driveSentence(scenario: Scenario, off: readonly SwitchedOff[] = []): Piece[] {
  return [...placeWords(scenario, "base", off), ...placeWords(scenario, "force", off), ...inclineWords(scenario)];
}

function placeWords(scenario: Scenario, place: Place, off: readonly SwitchedOff[]): Piece[] {
  const rows = termRows(scenario, off, place);
  const still = scenario[place].length > 0 ? [] : [...stillWords(scenario, place), text(". ")];
  const told = rows.flatMap((row, position) =>
    row.isOn
      ? [...termWords(scenario, place, row.index), text(". "), termMenu(scenario, place, rows, position)]
      : [offPiece(scenario, row.off, position), text(". ")],
  );
  return [...still, ...told];
}

function termWords(scenario: Scenario, place: Place, index: number): Piece[] {
  const kind = termOf(scenario[place][index].kind);
  return fromTemplate(scenario, kind.sentence[place] ?? "", { path: `${place}[${index}]`, ...kind });
}

function offPiece(scenario: Scenario, { place, term, units }: SwitchedOff, position: number): Piece {
  return { kind: "off", text: sayTerm(scenario, place, term, units), switchOn: switchOn(place, position) };
}

/** A term that is not in force, in words; `units` by its members' names. */
export function sayTerm(scenario: Scenario, place: Place, term: Term, units: SwitchedOff["units"]): string {
  const alone = { ...scenario, [place]: [term] };
  const byPath = Object.fromEntries(Object.entries(units).map(([key, unit]) => [`${place}[0].${key}`, unit]));
  return plainText(alone, termWords(alone, place, 0), byPath);
}

/** What can be done to a term, behind a mark after it. */
function termMenu(scenario: Scenario, place: Place, rows: readonly TermRow[], position: number): WordPiece {
  const what = place === "base" ? "motion" : "force";
  const acts: Readonly<Record<string, DraftAction>> = {
    "switch it off": switchOff(place, position),
    ...(position > 0 && { "move it up": raiseTerm(place, position) }),
    ...(position < rows.length - 1 && { "move it down": raiseTerm(place, position + 1) }),
    "remove it": removeTerm(place, position),
  };
  const kinds = kindsFor(scenario, place);
  return {
    kind: "word",
    isMenu: true,
    label: `Change ${what} ${position + 1} of ${rows.length}`,
    value: "",
    options: [
      { value: "", label: `this ${what}` },
      ...Object.keys(acts).map((act) => ({ value: act, label: act })),
      ...kinds.map(({ kind, label }) => ({ value: kind, label, group: `add another ${what}` })),
    ],
    choose: (chosen) => acts[chosen] ?? addKind(scenario, place, chosen),
  };
}

function addKind(scenario: Scenario, place: Place, chosen: string): DraftAction {
  const kind: TermKind | undefined = kindsFor(scenario, place).find((each) => each.kind === chosen)?.kind;
  return kind ? addTerm(place, kind) : { type: "settle" };
}

function stillWords(scenario: Scenario, place: Place): Piece[] {
  return place === "base"
    ? [text("The far end of the spring "), adder(scenario, "base", "stands still")]
    : [adder(scenario, "force", "No force"), text(" acts on the body")];
}

/** Where nothing acts yet the words themselves offer what could. */
function adder(scenario: Scenario, place: Place, shown: string): WordPiece {
  const kinds = kindsFor(scenario, place);
  return {
    kind: "word",
    label: place === "base" ? "Motion of the far end" : "Force on the body",
    value: "",
    text: shown,
    options: [{ value: "", label: shown }, ...kinds.map(({ kind, label }) => ({ value: kind, label }))],
    choose: (chosen) => addKind(scenario, place, chosen),
  };
}

/** The kinds that have a place there on this body. */
export const kindsFor = ({ motion }: Scenario, place: Place) =>
  excitationTerms.filter(({ places, motions }) => places.includes(place) && (motions?.includes(motion) ?? true));

function inclineWords(scenario: Scenario): Piece[] {
  if (scenario.motion === "angular") return [];
  if (scenario.incline === 0) return [text("The ways are "), value(scenario, "incline", "level"), text(".")];
  return [text("The ways are inclined by "), value(scenario, "incline"), text(".")];
}
