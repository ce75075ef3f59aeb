import { solidDampings, solidOf, type Purpose, type Scenario } from "@restband/solver";
import { nounOf } from "../../../format/noun.ts";
import { setMotion, setSolid } from "../changes.ts";
import { fieldAt, type PathField } from "../scenario-fields.ts";
import { text, type Piece, type WordPiece } from "./piece.ts";
import { fromTemplate } from "./template.ts";

export const purposeWords: Record<Purpose, string> = {
  feed: "a feed",
  positioning: "positioning",
  holding: "holding",
  braking: "braking",
  isolation: "isolation",
  test: "a test",
  other: "not stated",
};

/** A number of the scenario that is always there. */
export function value(scenario: Scenario, path: string, word?: string): Piece {
  return { kind: "value", path, field: fieldAt(scenario, path) as PathField, word };
}

/** "A carriage of 120 kg on a spring of 4 N/μm, damped 350 N·s/m, with no solid damping. Its purpose is a feed." */
export function bodySentence(scenario: Scenario): Piece[] {
  return [
    text("A "),
    motionWord(scenario),
    text(" of "),
    value(scenario, "body.inertia"),
    ...springWords(scenario),
    ...dampingWords(scenario),
    text(", with "),
    ...solidWords(scenario),
    text(". Its purpose is "),
    purposeWord(scenario),
    text("."),
  ];
}

/** The choice of straight or turning is made on the body's own name. */
function motionWord(scenario: Scenario): WordPiece {
  return {
    kind: "word",
    label: "Motion",
    value: scenario.motion,
    text: nounOf(scenario),
    options: [
      { value: "linear", label: "body on a straight guide" },
      { value: "angular", label: "rotor" },
    ],
    choose: (motion) => setMotion(motion === "angular" ? "angular" : "linear"),
  };
}

function springWords(scenario: Scenario): Piece[] {
  const { stiffness, cubic } = scenario.body;
  const spring = stiffness === 0 ? value(scenario, "body.stiffness", "no spring") : value(scenario, "body.stiffness");
  const straight = [text(stiffness === 0 ? " on " : " on a spring of "), spring];
  if (cubic === 0) return straight;
  return [...straight, text(cubic > 0 ? " that stiffens by " : " that softens by "), value(scenario, "body.cubic")];
}

function dampingWords(scenario: Scenario): Piece[] {
  if (scenario.body.viscous === 0) return [text(", "), value(scenario, "body.viscous", "undamped")];
  return [text(", damped "), value(scenario, "body.viscous")];
}

function solidWords(scenario: Scenario): Piece[] {
  const { solid } = scenario;
  const choice: WordPiece = {
    kind: "word",
    label: "Solid damping",
    value: solid.model,
    options: solidDampings.map(({ model, label }) => ({
      value: model,
      label: model === "none" ? "no solid damping" : label,
    })),
    choose: (model) => setSolid(solidDampings.find((each) => each.model === model)?.model ?? "none"),
  };
  if (solid.model === "none") return [choice];
  const kind = solidOf(solid.model);
  return [
    ...fromTemplate(scenario, kind.sentence, { path: "solid", ...kind }),
    text(" "),
    { ...choice, isBracketed: true },
  ];
}

function purposeWord({ purpose }: Scenario): WordPiece {
  return {
    kind: "word",
    label: "Purpose",
    value: purpose,
    options: Object.entries(purposeWords).map(([key, label]) => ({ value: key, label })),
    choose: (chosen) => ({ type: "set", path: "purpose", value: chosen }),
  };
}
