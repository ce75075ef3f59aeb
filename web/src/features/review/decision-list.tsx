import type { Decision, Replay } from "@restband/api/contract";
import { StateMark } from "../../components/state-mark.tsx";
import { sayMoment } from "../../format/when.ts";

const words = {
  accept: { word: "accepted", tone: "kept" },
  return: { word: "returned", tone: "broken" },
  "self-check": { word: "self-checked", tone: "quiet" },
  withdraw: { word: "withdrawn", tone: "broken" },
} as const;

const answerWords = { yes: "yes", no: "no", "not-applicable": "does not apply" };

interface DecisionListProps {
  decisions: readonly Decision[];
  replays: readonly Replay[];
}

/** What was decided, by whom, why, and on which replay; each signed by the server. */
export function DecisionList({ decisions, replays }: DecisionListProps) {
  return (
    <ol aria-label="Decisions" className="mb-6 border-t border-edge">
      {decisions.map((decision) => (
        <li key={decision.id} className="border-b border-line py-3">
          <p>
            <StateMark {...words[decision.kind]} /> by <strong>{decision.by.name}</strong>{" "}
            <time dateTime={decision.at} className="text-13 text-quiet">
              {sayMoment(new Date(decision.at))}
            </time>
          </p>
          {decision.faults.length > 0 && (
            <p className="mt-1">
              <StateMark word="not as it was signed" tone="broken" /> {decision.faults.join(" ")}
            </p>
          )}
          <p className="mt-1 max-w-(--measure) whitespace-pre-wrap wrap-anywhere">{decision.reasons}</p>
          {decision.kind !== "withdraw" && <p className="mt-1 text-13 text-quiet">{replayWords(decision, replays)}</p>}
          {decision.checklist.length > 0 && (
            <ul className="mt-1 text-13 text-quiet">
              {decision.checklist.map(({ point, answer }) => (
                <li key={point}>
                  {point} <strong>{answerWords[answer]}</strong>
                </li>
              ))}
            </ul>
          )}
        </li>
      ))}
    </ol>
  );
}

function replayWords({ replayId }: Decision, replays: readonly Replay[]): string {
  if (replayId === null) return "Decided without a replay.";
  const replay = replays.find(({ id }) => id === replayId);
  return replay ? `Rests on the replay of ${sayMoment(new Date(replay.at))}: ${replay.verdict}.` : "Rests on a replay.";
}
