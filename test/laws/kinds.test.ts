import {
  canonicalText,
  checkScenario,
  type Choice,
  excitationTerms,
  type Field,
  frictionLaws,
  type Scenario,
  solidDampings,
} from "@restband/solver";
import { describe, expect, it } from "vitest";

/** What every kind says of itself, by the name of its list. */
interface Described {
  list: string;
  name: string;
  label: string;
  summary: string;
  source: string;
  sentences: readonly string[];
  fields: readonly Field[];
  choices: readonly Choice[];
  hasRows: boolean;
}

const kinds: Described[] = [
  ...frictionLaws.map((law) => ({ ...law, list: "friction", name: law.model, sentences: [law.sentence] })),
  ...solidDampings.map((solid) => ({ ...solid, list: "solid", name: solid.model, sentences: [solid.sentence] })),
  ...excitationTerms.map((term) => ({
    ...term,
    list: "excitation",
    name: term.kind,
    sentences: term.places.map((place) => term.sentence[place] ?? ""),
  })),
].map((kind) => ({
  ...kind,
  choices: "choices" in kind && kind.choices ? kind.choices : [],
  hasRows: "rows" in kind && kind.rows !== undefined,
}));

const marksOf = (text: string) => [...text.matchAll(/\{(\w+)\}/g)].map((match) => match[1]);

describe.each(kinds)("$list $name", ({ label, summary, source, sentences, fields, choices, hasRows }) => {
  const keys = [...fields.map((field) => field.key), ...choices.map((choice) => choice.key)];
  const asked = hasRows ? [...keys, "points"] : keys;

  it("has a label, one quiet line, a sentence for each place and a source", () => {
    for (const text of [label, summary, source, ...sentences]) expect(text).not.toBe("");
    for (const sentence of sentences) expect(sentence).not.toMatch(/[.!]$/);
  });

  it("names every member in each sentence, once, and nothing else", () => {
    const clauses = fields.map((field) => field.clause ?? "").join("");
    for (const sentence of sentences) expect(marksOf(sentence + clauses).sort()).toEqual([...asked].sort());
  });

  it("describes each number: a label, and a start within its own bounds", () => {
    for (const field of fields) {
      expect(field.label).not.toBe("");
      for (const start of [field.initial, field.initialOnBase ?? field.initial, field.default ?? field.initial])
        expect(isWithin(field, start)).toBe(true);
    }
  });

  it("uses each key once", () => expect(new Set(keys).size).toBe(keys.length));
});

function isWithin(field: Field, value: number): boolean {
  const { minimum = -Infinity, exclusiveMinimum = -Infinity, maximum = Infinity, exclusiveMaximum = Infinity } = field;
  return value >= minimum && value > exclusiveMinimum && value <= maximum && value < exclusiveMaximum;
}

/** Values a new scenario starts a kind from. */
function startOf(
  { fields, choices, rows }: (typeof excitationTerms)[number],
  onBase: boolean,
): Record<string, unknown> {
  const columns = rows?.columns.map((column, j) => [column.key, rows.initial.map((row) => row[j])]) ?? [];
  const numbers = fields
    .filter((field) => !field.optional)
    .map((field) => [field.key, (onBase ? field.initialOnBase : undefined) ?? field.initial]);
  const words = (choices ?? []).map((choice) => [choice.key, choice.options[0].value]);
  return Object.fromEntries([...columns, ...numbers, ...words]) as Record<string, unknown>;
}

const bare = (part: object) => ({
  format: "restband-scenario/1",
  motion: "linear",
  body: { inertia: 2, stiffness: 800 },
  contact: { law: { model: "coulomb", static: 0.2, kinetic: 0.1 }, normal: { preload: 40 }, counterface: "base" },
  span: { seconds: 1 },
  ...part,
});

/** Checks, writes and reads back a scenario around one kind. */
function roundTrip(part: object): Scenario {
  const { scenario, faults } = checkScenario(bare(part));
  expect(faults).toEqual([]);
  const text = canonicalText(scenario as Scenario);
  const again = checkScenario(JSON.parse(text));
  expect(again.faults).toEqual([]);
  expect(again.scenario).toEqual(scenario);
  expect(canonicalText(again.scenario as Scenario)).toBe(text);
  return scenario as Scenario;
}

describe("a scenario that starts from a kind", () => {
  const placed = excitationTerms.flatMap((term) => term.places.map((place) => ({ term, place, name: term.kind })));

  it.each(placed)("checks and survives its canonical text: $name in $place", ({ term, place }) => {
    const scenario = roundTrip({ [place]: [{ kind: term.kind, ...startOf(term, place === "base") }] });
    expect(scenario[place][0].kind).toBe(term.kind);
  });

  it.each(frictionLaws.map((law) => ({ law, name: law.model })))("checks and survives: law $name", ({ law }) => {
    const numbers = Object.fromEntries(law.fields.map((field) => [field.key, field.initial]));
    const points = law.rows && { points: law.rows.initial };
    roundTrip({ contact: { law: { model: law.model, ...numbers, ...points }, normal: { preload: 40 } } });
  });

  it.each(solidDampings.map((solid) => ({ solid, name: solid.model })))(
    "checks and survives: solid $name",
    ({ solid }) => {
      const numbers = Object.fromEntries(solid.fields.map((field) => [field.key, field.initial]));
      const words = Object.fromEntries((solid.choices ?? []).map((choice) => [choice.key, choice.options[0].value]));
      roundTrip({ solid: { model: solid.model, ...numbers, ...words } });
    },
  );
});
