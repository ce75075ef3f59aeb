import type { z } from "@restband/solver";
import type { FieldFault } from "../errors.ts";

type Issue = z.core.$ZodIssue;

/** All faults of a refused request, each with the path of its field (`content.force[0]`) and a sentence. */
export function faultsOf(error: z.ZodError): FieldFault[] {
  return error.issues.flatMap((issue) =>
    issue.code === "unrecognized_keys"
      ? issue.keys.map((key) => ({ path: pathOf([...issue.path, key]), message: "There is no such field." }))
      : [{ path: pathOf(issue.path), message: sentenceOf(issue) }],
  );
}

function pathOf(path: readonly PropertyKey[]): string {
  return path.reduce<string>((text, key) => {
    if (typeof key === "number") return `${text}[${key}]`;
    return text === "" ? String(key) : `${text}.${String(key)}`;
  }, "");
}

function sentenceOf(issue: Issue): string {
  switch (issue.code) {
    case "invalid_type":
      return issue.input === undefined ? "This is missing." : `This has to be ${withArticle(issue.expected)}.`;
    case "too_small":
      return issue.origin === "string" ? atLeast(Number(issue.minimum)) : `At least ${issue.minimum}.`;
    case "too_big":
      return issue.origin === "string" ? `At most ${issue.maximum} characters.` : `At most ${issue.maximum}.`;
    case "invalid_format":
      return issue.format === "email" ? "This is no e-mail address." : `This is no ${issue.format}.`;
    case "invalid_value":
      return `One of ${issue.values.join(", ")}.`;
    default:
      return issue.message;
  }
}

function atLeast(minimum: number): string {
  return minimum === 1 ? "This is empty." : `At least ${minimum} characters.`;
}

function withArticle(type: string): string {
  return /^[aeiou]/.test(type) ? `an ${type}` : `a ${type}`;
}
