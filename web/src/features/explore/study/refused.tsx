import type { CellRefusal, RefusedDraws, Scenario, ToleranceSummary } from "@restband/solver";
import { formatNumber } from "../../../format/format-number.ts";
import { exploreField } from "../explore-field.ts";

/** Draws without an answer by their reason, each with an example on demand; never dropped. */
export function Refused({ summary: { refused, runs }, scenario }: { summary: ToleranceSummary; scenario: Scenario }) {
  return (
    <div className="mb-6 max-w-(--measure)">
      <ul className="list-disc pl-5">
        {refused.map((group) => (
          <li key={`${group.refusal} ${group.first}`} className="mb-1">
            {formatNumber(group.count, 9)} of {formatNumber(runs, 9)} draws {group.count === 1 ? "has" : "have"} no
            answer: {reasonOf(group, scenario)}
            {group.example !== null && (
              <details className="text-13 text-quiet">
                <summary className="link w-fit">An example</summary>
                <p className="mt-1">
                  Draw {group.first + 1}: {exampleOf(group.example)}
                </p>
              </details>
            )}
          </li>
        ))}
      </ul>
      <p className="mt-2 text-13 text-quiet">They are counted for and against in the bounds.</p>
    </div>
  );
}

function reasonOf({ refusal, path }: RefusedDraws, scenario: Scenario): string {
  if (refusal !== "refused") return refusalWords[refusal];
  const name = path === null ? undefined : exploreField(scenario, path)?.name;
  return name === undefined ? "their values cannot stand together." : `their ${name} cannot stand with the rest.`;
}

const refusalWords: Record<Exclude<CellRefusal, "refused">, string> = {
  "not-computed": "this version has no method for them.",
  "max-events": "the run reached the most events it is allowed.",
  "max-work": "the run reached the most work it is allowed.",
  failed: "the run failed.",
};

/** What is wrong in its first sentence, the figures of the draw rounded as people read them. */
const exampleOf = (sentences: string): string =>
  sentences
    .replace(/(?<=\.) .*$/su, "")
    .replace(/-?\d+(?:\.\d+)?(?:e[-+]?\d+)?/gu, (figure) => formatNumber(Number(figure), 4));
