import { Refusal } from "../errors.ts";

/** Members and items of a body, points of records not counted: a table of 500 cases has some 40,000. */
const MOST_MEMBERS = 100_000;
/** Numbers of all records of a body, times and values: two records as long as the format allows. */
const MOST_NUMBERS = 800_000;
const DEEPEST = 64;

const columns = new Set(["times", "values"]);

/**
 * Refuses a body that is small in bytes but would take seconds to be checked: garbage in a million pieces, or lists in lists
 * in lists. Goes through it without recursion.
 * @throws Refusal 413
 */
export function demandModest(body: unknown): void {
  let [members, numbers] = [0, 0];
  const left: { value: object; depth: number }[] = isBranch(body) ? [{ value: body, depth: 1 }] : [];
  for (let next = left.pop(); next; next = left.pop()) {
    const { value, depth } = next;
    if (depth > DEEPEST) throw tooLarge(`is nested more than ${DEEPEST} levels deep`);
    for (const key in value) {
      const inner = (value as Record<string, unknown>)[key];
      members += 1;
      if (columns.has(key) && isOfNumbers(inner)) numbers += inner.length;
      else if (isBranch(inner)) left.push({ value: inner, depth: depth + 1 });
      if (members > MOST_MEMBERS) throw tooLarge("has more than 100,000 members");
      if (numbers > MOST_NUMBERS) throw tooLarge("has records of more than 400,000 points");
    }
  }
}

const isBranch = (value: unknown): value is object => typeof value === "object" && value !== null;

const isOfNumbers = (value: unknown): value is number[] =>
  Array.isArray(value) && value.every((item) => typeof item === "number");

const tooLarge = (what: string): Refusal => new Refusal(413, "too-large", `The body ${what}.`);
