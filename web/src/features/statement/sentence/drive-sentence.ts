import { excitationTerms, termOf, type Scenario } from "@restband/solver";
import { addTerm, type Place } from "../changes.ts";
import { value } from "./body-sentence.ts";
import { text, type Piece, type WordPiece } from "./piece.ts";
import { fromTemplate } from "./template.ts";

/** "The far end of the spring is fed at 2 mm/s from 0 s on. No force acts on the body; the ways are level." */
export function driveSentence(scenario: Scenario): Piece[] {
  return [...placeWords(scenario, "base"), ...placeWords(scenario, "force"), ...inclineWords(scenario)];
}

function placeWords(scenario: Scenario, place: Place): Piece[] {
  const terms = scenario[place].flatMap((term, i) => {
    const kind = termOf(term.kind);
    return [...fromTemplate(scenario, kind.sentence[place] ?? "", { path: `${place}[${i}]`, ...kind }), text(". ")];
  });
  return terms.length > 0 ? terms : [...stillWords(scenario, place), text(". ")];
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
    choose: (chosen) => {
      const kind = kinds.find((each) => each.kind === chosen)?.kind;
      return kind ? addTerm(place, kind) : { type: "settle" };
    },
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
