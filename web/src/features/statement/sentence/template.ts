import type { Choice, Field, Scenario } from "@restband/solver";
import { setWord } from "../changes.ts";
import { readPath } from "../path.ts";
import { fieldAt } from "../scenario-fields.ts";
import { text, type Piece } from "./piece.ts";

/** What a template is about: a kind that describes itself, and where its values stand in the scenario. */
export interface Described {
  readonly path: string;
  readonly fields: readonly Field[];
  readonly choices?: readonly Choice[];
}

/** A kind's own sentence with each `{key}` made a value, a word or a row of numbers of this scenario. */
export function fromTemplate(scenario: Scenario, template: string, described: Described): Piece[] {
  const parts = template.split(/\{(\w+)\}/);
  const pieces = parts.flatMap((part, i) => (i % 2 === 0 ? words(part) : member(scenario, part, described)));
  return [...pieces, ...described.fields.flatMap((field) => clause(scenario, field, described))];
}

const words = (part: string): Piece[] => (part === "" ? [] : [text(part)]);

function member(scenario: Scenario, key: string, described: Described): Piece[] {
  const choice = described.choices?.find((each) => each.key === key);
  const path = `${described.path}.${key}`;
  if (choice) return word(scenario, path, choice);
  const field = fieldAt(scenario, path);
  return field ? [{ kind: "value", path, field }] : [rows(scenario, path)];
}

/** A word; where the word carries a number ("a given frequency"), the number after it. */
export function word(scenario: Scenario, path: string, { label, options }: Choice): Piece[] {
  const stored = readPath(scenario, path);
  const chosen =
    options.find(({ value, field }) => (field ? typeof stored === "object" : stored === value)) ?? options[0];
  const shown: Piece = {
    kind: "word",
    label,
    value: chosen.value,
    options,
    choose: (value) => setWord(path, options.find((option) => option.value === value) ?? options[0]),
  };
  const number = chosen.field && fieldAt(scenario, `${path}.${chosen.field.key}`);
  return number
    ? [
        shown,
        text(` ${number.dimension === "velocity" ? "moving at" : "of"} `),
        { kind: "value", path: `${path}.${number.key}`, field: number },
      ]
    : [shown];
}

/** How many rows a table or record holds, inline or stored. */
function rows(scenario: Scenario, path: string): Piece {
  const points = readPath(scenario, path) ?? readPath(scenario, path.replace(/\.points$/, ".times"));
  const count = Array.isArray(points) ? points.length : Number(points ?? 0);
  return { kind: "rows", path, label: "Points", text: `${count} ${count === 1 ? "point" : "points"}` };
}

/** An optional member that is given speaks for itself after the sentence. */
function clause(scenario: Scenario, field: Field, { path, ...described }: Described): Piece[] {
  if (!field.clause || typeof readPath(scenario, `${path}.${field.key}`) !== "number") return [];
  const fields = [...described.fields.map((each) => ({ ...each, clause: undefined }))];
  return fromTemplate(scenario, field.clause, { path, ...described, fields });
}
