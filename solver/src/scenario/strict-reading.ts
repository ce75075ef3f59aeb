import { type Block, type Faulty, isNumberOf, readPart, type Reading } from "./reading.ts";
import { demand, numberSentence, oneOf } from "./sentences.ts";
import { z } from "./zod.ts";

/**
 * A list stops reporting after so many faults, so that a garbled record of 200,000 points cannot flood the answer: zod
 * hands faults on as arguments of a call, and a hundred thousand of them overflow the stack.
 */
const faultsPerList = 50;

/** An error of zod that asks for something in words, whatever is wrong with the value. */
const asks = (label: string, what: string) => ({
  error: (issue: { input?: unknown }) => demand(label, what, issue.input),
});

/** Of an object only its being one is asked here: what its members lack they say themselves. */
const asksObject = (label: string) => ({
  error: (issue: { code: string; input?: unknown }) =>
    issue.code === "invalid_type" ? demand(label, "an object", issue.input) : undefined,
});

export const strictReading: Reading = {
  number: (field) =>
    z.custom((value) => isNumberOf(field, value), { error: (issue) => numberSentence(field, issue.input) }),
  word: (label, words) => z.enum(words, asks(label, oneOf(words))),
  text: (label) => z.string(asks(label, "a text")),
  digest: (label) => {
    const what = asks(label, "64 hexadecimal digits in lower case");
    return z.string(what).regex(/^[0-9a-f]{64}$/, what);
  },
  flag: (label) => z.boolean(asks(label, "true or false")),
  object: (label, members) => z.strictObject(members, asksObject(label)),
  list: (label, item) => listOf(label, (value, i, list) => readPart(item, value, [i], list)),
  entries,
  column: (field) =>
    listOf(field.label, (value, i, list) => {
      if (!isNumberOf(field, value)) addFault(list, [i], numberSentence(field, value));
      return value;
    }),
  pairs: ({ columns }) => {
    const shape = `a pair, [${columns.map((column) => column.key).join(", ")}]`;
    return listOf("Points", (row, i, list) => {
      if (!Array.isArray(row) || row.length !== 2) return addFault(list, [i], demand("A point", shape, row));
      const pair = Array.from(row as unknown[]);
      columns.forEach((column, j) => {
        if (!isNumberOf(column, pair[j])) addFault(list, [i, j], numberSentence(column, pair[j]));
      });
      return pair;
    });
  },
  unknownKind: (label, key, words) => z.looseObject({ [key]: strictReading.word(label, words) }, asksObject(label)),
};

function addFault(whole: Faulty, path: PropertyKey[], message: string): void {
  whole.issues.push({ code: "custom", path, message, input: undefined });
}

/** Lists are read by a plain loop: a schema run for each of 200,000 numbers would cost more than the run. */
function listOf(label: string, read: (item: unknown, i: number, list: Faulty) => unknown): Block {
  return z.transform((value: unknown, list) => {
    if (!Array.isArray(value)) return addFault(list, [], demand(label, "a list", value));
    const items: unknown[] = [];
    for (let i = 0; i < value.length && list.issues.length < faultsPerList; i++) items.push(read(value[i], i, list));
    return items;
  });
}

function entries(label: string, item: Block): Block {
  const object = z.custom<Record<string, unknown>>(
    (value) => typeof value === "object" && value !== null && !Array.isArray(value),
    asks(label, "an object"),
  );
  return object.transform((value, whole) => {
    const read: [string, unknown][] = [];
    for (const [key, member] of Object.entries(value)) {
      if (whole.issues.length >= faultsPerList) break;
      read.push([key, readPart(item, member, [key], whole)]);
    }
    return Object.fromEntries(read);
  });
}
