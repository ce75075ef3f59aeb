import type { Choice, Field, Rows } from "../field.ts";
import { ownMember } from "./own-member.ts";
import { z } from "./zod.ts";

/** A schema of one part of the format. */
export type Block = z.ZodType;

/**
 * The blocks the format's schema is built of. There are two sets: `strictReading` refuses what is faulty, each block with
 * one sentence of what it asks for; `lenientReading` reads what can be read, so that rules across members can be judged
 * although another member is faulty.
 */
export interface Reading {
  /** A number within the field's bounds. */
  number(field: Field): Block;
  word(label: string, words: readonly string[]): Block;
  text(label: string): Block;
  /** A SHA-256 in lower-case hex. */
  digest(label: string): Block;
  flag(label: string): Block;
  /** An object with these members and no others. */
  object(label: string, members: Members): Block;
  list(label: string, item: Block): Block;
  /** An object of any keys. */
  entries(label: string, item: Block): Block;
  /** One column of a record. */
  column(field: Field): Block;
  /** The points of a table, a pair of numbers each. */
  pairs(rows: Rows): Block;
  /** Stands where `key` holds none of the words; `plain` is what the lenient reading takes for it. */
  unknownKind(label: string, key: string, words: readonly string[], plain: object): Block;
}

export type Members = Readonly<Record<string, Block>>;

/** True for a finite number within the field's bounds. */
export function isNumberOf(field: Field, value: unknown): value is number {
  const { minimum = -Infinity, exclusiveMinimum = -Infinity, maximum = Infinity, exclusiveMaximum = Infinity } = field;
  if (typeof value !== "number" || !Number.isFinite(value) || (field.integer && !Number.isInteger(value))) return false;
  return value >= minimum && value > exclusiveMinimum && value <= maximum && value < exclusiveMaximum;
}

/** A schema picked by a look at the value: its faults are those of the one meant, not of every alternative. */
export function picked(pick: (value: unknown) => Block): Block {
  return z.transform((value: unknown, context) => readPart(pick(value), value, [], context));
}

/** Where a schema that reads its parts itself puts their faults. */
export type Faulty = Parameters<Parameters<typeof z.transform>[0]>[1];

/** Reads a part by its own schema; its faults become those of the whole, at `path`. */
export function readPart(block: Block, value: unknown, path: PropertyKey[], whole: Faulty): unknown {
  const parsed = block.safeParse(value);
  if (parsed.success) return parsed.data;
  for (const issue of parsed.error.issues)
    whole.issues.push({ ...issue, path: [...path, ...issue.path], input: value } as z.core.$ZodRawIssue);
  return z.NEVER;
}

/** A field as a member of an object: its default where left out, "none" where it may be absent altogether. */
export function memberOf(reading: Reading, field: Field): Block {
  const number = reading.number(field);
  if (field.optional) return picked((value) => (value === "none" ? z.literal("none") : number)).default("none");
  return field.default === undefined ? number : number.default(field.default);
}

/** The members that fields and choices make, by key. */
export function membersOf(reading: Reading, kind: { fields: readonly Field[]; choices?: readonly Choice[] }): Members {
  const fields = kind.fields.map((field) => [field.key, memberOf(reading, field)]);
  const choices = (kind.choices ?? []).map((choice) => [choice.key, choiceOf(reading, choice)]);
  return Object.fromEntries([...fields, ...choices]) as Members;
}

/** The words of a choice, and the numbers that stand in place of some of them. */
export function choiceOf(reading: Reading, { label, options }: Choice): Block {
  const words = options.filter((option) => option.field === undefined).map((option) => option.value);
  const fields = options.flatMap((option) => option.field ?? []);
  const word = reading.word(label, words);
  if (fields.length === 0) return word;
  const number = reading.object(label, membersOf(reading, { fields }));
  return picked((value) => (typeof value === "object" && value !== null ? number : word));
}

/** The member under `key` picks the schema of the kind it names. */
export function kindOf(
  reading: Reading,
  { label, key, plain }: { label: string; key: string; plain: object },
  kinds: readonly (readonly [string, Block])[],
): Block {
  const byName = new Map(kinds);
  const unknown = reading.unknownKind(label, key, [...byName.keys()], plain);
  return picked((value) => byName.get(ownMember(value, key) as string) ?? unknown);
}
