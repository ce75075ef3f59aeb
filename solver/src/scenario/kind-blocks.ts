import type { ExcitationTerm } from "../excitation/excitation-term.ts";
import { excitationTerms } from "../excitation/index.ts";
import { maximumPoints } from "../excitation/record-term.ts";
import type { Field } from "../field.ts";
import { frictionLaws } from "../friction/index.ts";
import { solidDampings } from "../solid/index.ts";
import { ownMember } from "./own-member.ts";
import { type Block, kindOf, membersOf, picked, type Reading } from "./reading.ts";
import { z } from "./zod.ts";

/*
 * Schemas of laws, solid damping and terms, made from what each kind says of itself.
 */

export function lawBlock(reading: Reading): Block {
  const laws = frictionLaws.map((law): [string, Block] => {
    const points = law.rows && { points: reading.pairs(law.rows) };
    const members = { model: z.literal(law.model), ...membersOf(reading, law), ...points };
    return [law.model, reading.object(law.label, members)];
  });
  return kindOf(reading, { label: "Friction law", key: "model", plain: { model: "none" } }, laws);
}

export function solidBlock(reading: Reading): Block {
  const models = solidDampings.map((solid): [string, Block] => {
    const members = { model: z.literal(solid.model), ...membersOf(reading, solid) };
    return [solid.model, reading.object(solid.label, members)];
  });
  return kindOf(reading, { label: "Solid damping", key: "model", plain: { model: "none" } }, models);
}

export function termBlock(reading: Reading): Block {
  const kinds = excitationTerms.map((term): [string, Block] => [term.kind, membersOfTerm(reading, term)]);
  return kindOf(reading, { label: "Excitation", key: "kind", plain: { kind: "constant", value: NaN } }, kinds);
}

const storedPoints: Field = {
  key: "points",
  label: "Points",
  dimension: "none",
  integer: true,
  minimum: 2,
  maximum: maximumPoints,
  initial: 2,
};

/** The members of a term; a record has its points inline, or their digest in place of them. */
function membersOfTerm(reading: Reading, term: ExcitationTerm): Block {
  const kind = z.literal(term.kind);
  if (!term.rows) return reading.object(term.label, { kind, ...membersOf(reading, term) });
  const columns = term.rows.columns.map((column): [string, Block] => [column.key, reading.column(column)]);
  const inline = reading.object(term.label, { kind, ...Object.fromEntries<Block>(columns) });
  const stored = reading.object(term.label, {
    kind,
    digest: reading.digest("Digest"),
    points: reading.number(storedPoints),
  });
  return picked((value) => (ownMember(value, "digest") === undefined ? inline : stored));
}
