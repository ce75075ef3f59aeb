import type { Scenario, Term } from "@restband/solver";
import { value } from "./body-sentence.ts";
import { text, type Piece, type WordPiece } from "./piece.ts";

/** "It starts at rest with the spring relaxed and is followed for 0.5 s, or until it rests for good." */
export function startSentence(scenario: Scenario): Piece[] {
  const { displacement, velocity } = scenario.initial;
  const speed = velocity === 0 ? value(scenario, "initial.velocity", "at rest") : value(scenario, "initial.velocity");
  return [
    text(velocity === 0 ? "It starts " : "It starts with "),
    speed,
    text(displacement === 0 && isRelaxedAtZero(scenario) ? " with " : " at "),
    placeWord(scenario),
    text(" and is followed for "),
    value(scenario, "span.seconds"),
    text(" "),
    untilWord(scenario),
    ...settleWords(scenario),
    text("."),
  ];
}

function placeWord(scenario: Scenario): Piece {
  const isRelaxed = scenario.initial.displacement === 0 && isRelaxedAtZero(scenario);
  return value(scenario, "initial.displacement", isRelaxed ? "the spring relaxed" : undefined);
}

/** Whether x = 0 leaves the spring without tension at the start: it has one, and its far end starts from 0. */
function isRelaxedAtZero({ body, base }: Scenario): boolean {
  return body.stiffness > 0 && base.every(startsFromZero);
}

const startsFromZero = (term: Term): boolean => "start" in term && term.start >= 0;

function untilWord({ span }: Scenario): WordPiece {
  return {
    kind: "word",
    label: "End of the run",
    value: span.untilRest ? "rest" : "time",
    options: [
      { value: "rest", label: "or until it rests for good" },
      { value: "time", label: "to the end" },
    ],
    choose: (chosen) => ({ type: "set", path: "span.untilRest", value: chosen === "rest" }),
  };
}

function settleWords(scenario: Scenario): Piece[] {
  if (scenario.settleBand === null) return [];
  return [text("; it has settled once it stays within ±"), value(scenario, "settleBand"), text(" of the drive")];
}
