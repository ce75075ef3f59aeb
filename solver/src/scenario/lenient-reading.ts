import { isNumberOf, type Reading } from "./reading.ts";
import { z } from "./zod.ts";

const reads = (read: (value: unknown) => unknown) => z.transform(read);
const listFrom = (value: unknown) => (Array.isArray(value) ? Array.from(value as unknown[]) : []);
const objectFrom = (value: unknown) =>
  typeof value === "object" && value !== null && !Array.isArray(value) ? value : {};

/**
 * Reads anything without a fault: a number that is missing or faulty is NaN, which keeps every comparison with it silent;
 * a wrong word is "", a wrong list empty, an unknown kind the plainest one.
 */
export const lenientReading: Reading = {
  number: (field) => reads((value) => (isNumberOf(field, value) ? value : NaN)),
  word: (_label, words) => reads((value) => (words.includes(value as string) ? value : "")),
  text: () => reads(() => ""),
  digest: () => reads(() => ""),
  flag: () => reads((value) => value === true),
  object: (_label, members) => reads(objectFrom).pipe(z.object(members)),
  list: (_label, item) => reads(listFrom).pipe(z.array(item)),
  entries: (_label, item) =>
    reads((value) =>
      Object.fromEntries(Object.entries(objectFrom(value)).map(([key, each]) => [key, item.parse(each)])),
    ),
  column: (field) => reads((value) => listFrom(value).map((each) => (isNumberOf(field, each) ? each : NaN))),
  pairs: ({ columns }) =>
    reads((value) =>
      listFrom(value).map((row) =>
        columns.map((column, j) => (isNumberOf(column, listFrom(row)[j]) ? listFrom(row)[j] : NaN)),
      ),
    ),
  unknownKind: (_label, _key, _words, plain) => reads(() => plain),
};
