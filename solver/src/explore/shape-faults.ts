import { pathText } from "../scenario/path.ts";
import type { Fault } from "../scenario/scenario.ts";
import { oneOf, quoted } from "../scenario/sentences.ts";
import type { z } from "../scenario/zod.ts";

/** What is wrong with the shape of a plan, each fault as a sentence at its path. */
export function shapeFaults(issues: readonly z.core.$ZodIssue[]): Fault[] {
  return issues.flatMap((issue) => {
    if (issue.code !== "unrecognized_keys") return [{ path: pathText(issue.path), message: sentenceOf(issue) }];
    return issue.keys.map((key) => ({
      path: pathText([...issue.path, key]),
      message: `${quoted(key)} is not known here. Remove it, or correct its name.`,
    }));
  });
}

function sentenceOf(issue: z.core.$ZodIssue): string {
  switch (issue.code) {
    case "invalid_type":
      return `This must be ${nouns[issue.expected] ?? "given"}.`;
    case "invalid_value":
      return `This must be ${oneOf(issue.values.map(String))}.`;
    case "too_small":
      return `This must be at least ${issue.minimum}${ofThem(issue.origin)}.`;
    case "too_big":
      return `This must be at most ${issue.maximum}${ofThem(issue.origin)}.`;
    default:
      return "This is none of the forms known here.";
  }
}

const nouns: Readonly<Record<string, string>> = {
  number: "a finite number",
  int: "a whole number",
  string: "a text",
  array: "a list",
  object: "an object",
  record: "an object",
};

const ofThem = (origin: string): string => (origin === "array" ? " entries" : "");
