import { Refusal, refusedContent } from "../errors.ts";
import type { Checklist, Decision } from "./reviews-schema.ts";

/**
 * The answers have to be to the checklist as it is now, and none of them a no where a revision is accepted.
 * @throws Refusal 409 where the checklist has changed meanwhile, 422 naming the points that stand against accepting
 */
export function demandAnswers(
  answers: Decision["checklist"],
  { points }: Checklist,
  { isAccepting }: { isAccepting: boolean },
): void {
  const isSame = answers.length === points.length && answers.every(({ point }, i) => point === points[i]);
  if (!isSame && (isAccepting || answers.length > 0)) {
    throw new Refusal(409, "other-checklist", "The project's checklist has changed meanwhile. Look at it again.");
  }
  if (!isAccepting) return;
  const message = "A revision with a no here is returned, not accepted.";
  const faults = answers.flatMap(({ answer }, i) =>
    answer === "no" ? [{ path: `checklist[${i}].answer`, message }] : [],
  );
  if (faults.length > 0) throw refusedContent("refused-checklist", faults);
}
