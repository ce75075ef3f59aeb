import { counterfaceChoice, frictionLaws, lawOf, type Choice, type Scenario } from "@restband/solver";
import { setLaw, setRipple } from "../changes.ts";
import { value } from "./body-sentence.ts";
import { text, type Piece, type WordPiece } from "./piece.ts";
import { fromTemplate, word } from "./template.ts";

/** "It rubs on fixed ways with friction 0.15 before it moves and 0.12 while it slides (Coulomb), pressed by …" */
export function contactSentence(scenario: Scenario): Piece[] {
  const kind = lawOf(scenario.contact.law.model);
  const rubs = scenario.contact.law.model === "none" ? "It moves on " : "It rubs on ";
  return [
    text(rubs),
    ...word(scenario, "contact.counterface", counterfaceFor(scenario)),
    text(" "),
    ...fromTemplate(scenario, kind.sentence, { path: "contact.law", ...kind }),
    text(" "),
    lawWord(scenario),
    ...(scenario.contact.law.model === "none" ? [] : pressingWords(scenario)),
    text("."),
  ];
}

/** A rotor has no ways: what stands still against it is a pad. */
function counterfaceFor({ motion }: Scenario): Choice {
  if (motion === "linear") return counterfaceChoice;
  const options = counterfaceChoice.options.map((option) =>
    option.value === "ground" ? { ...option, label: "a fixed pad" } : option,
  );
  return { ...counterfaceChoice, options };
}

function lawWord({ contact }: Scenario): WordPiece {
  return {
    kind: "word",
    label: "Friction law",
    value: contact.law.model,
    isBracketed: true,
    options: frictionLaws.map(({ model, label }) => ({ value: model, label })),
    choose: (model) => setLaw(frictionLaws.find((law) => law.model === model)?.model ?? "none"),
  };
}

function pressingWords(scenario: Scenario): Piece[] {
  const { normal } = scenario.contact;
  const preload = [value(scenario, "contact.normal.preload"), text(" of preload on ")];
  const faces = [value(scenario, "contact.normal.faces"), text(normal.faces === 1 ? " face" : " faces")];
  const radius = scenario.motion === "angular" ? [text(" at a radius of "), value(scenario, "contact.radius")] : [];
  return [text(", pressed by "), ...weightWord(scenario), ...preload, ...faces, ...radius, ...rippleWords(scenario)];
}

/** A rotor's weight does not press its faces. */
function weightWord({ motion, contact }: Scenario): Piece[] {
  if (motion === "angular") return [];
  const choice: WordPiece = {
    kind: "word",
    label: "Weight on the faces",
    value: contact.normal.weight ? "yes" : "no",
    options: [
      { value: "yes", label: "its weight" },
      { value: "no", label: "nothing of its weight" },
    ],
    choose: (chosen) => ({ type: "set", path: "contact.normal.weight", value: chosen === "yes" }),
  };
  return [choice, text(contact.normal.weight ? " and " : " but ")];
}

function rippleWords(scenario: Scenario): Piece[] {
  const { ripple } = scenario.contact.normal;
  const choice: WordPiece = {
    kind: "word",
    label: "Ripple of the pressing force",
    value: ripple ? "yes" : "no",
    options: [
      { value: "no", label: "steadily" },
      { value: "yes", label: "with a ripple" },
    ],
    choose: (chosen) => setRipple(chosen === "yes"),
  };
  if (!ripple) return [text(", "), choice];
  const at = "contact.normal.ripple";
  const swing = [text(" of ±"), value(scenario, `${at}.amplitude`), text(" at "), value(scenario, `${at}.hz`)];
  return [text(", "), choice, ...swing, text(" with phase "), value(scenario, `${at}.phase`)];
}
