import type { Replay, Review, Revision } from "@restband/api/contract";
import { useState } from "react";
import { ApiFailure } from "../../api/api-failure.ts";
import { useDecide, useSelfCheck } from "../../api/reviews.ts";
import { Button } from "../../components/button.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { PasswordField } from "../../components/password-field.tsx";
import { announce } from "../../components/status.tsx";
import { TextArea } from "../../components/text-field.tsx";
import { sayMoment } from "../../format/when.ts";
import { ChecklistFields } from "./checklist-fields.tsx";
import { faultAt, otherFault } from "./fault-of.ts";

interface DecideFormProps {
  revision: Revision;
  review: Review;
  /** The reader's own replays of it, newest first. */
  replays: readonly Replay[];
  /** Somebody else was faster: the server's sentence, and the reasons that were not sent. */
  onTooLate: (late: TooLate) => void;
}

export interface TooLate {
  readonly message: string;
  readonly reasons: string;
}

type Answer = Review["decisions"][number]["checklist"][number]["answer"];
type Kind = "accept" | "return" | "self-check";

const said: Record<Kind, string> = {
  accept: "accepted",
  return: "returned",
  "self-check": "marked self-checked",
};

const fields = ["reasons", "password"];

/** Reasons, checklist and password once more, then accept or return; or, working alone, mark it self-checked. */
export function DecideForm({ revision, review, replays, onTooLate }: DecideFormProps) {
  const { projectId, id, number, digest, frozenBy, openComments } = revision;
  const decide = useDecide(projectId, id);
  const selfCheck = useSelfCheck(projectId, id);
  const [reasons, setReasons] = useState("");
  const [password, setPassword] = useState("");
  const [given, setGiven] = useState<ReadonlyMap<string, Answer>>(new Map());
  const [tried, setTried] = useState<Kind | null>(null);
  const { points } = review.checklist;
  const checklist = points.flatMap((point) => {
    const answer = given.get(point);
    return answer === undefined ? [] : [{ point, answer }];
  });
  const faults = {
    reasons: reasons.trim() === "" ? "Say why: it is kept with the revision." : undefined,
    password: password === "" ? "Enter your password: it stands for your signature." : undefined,
    checklist: tried === "return" ? undefined : checklistFault(points, checklist),
  };
  const error = decide.error ?? selfCheck.error;
  const isBusy = decide.isPending || selfCheck.isPending;
  const act = (kind: Kind): void => {
    setTried(kind);
    const needsChecklist = kind !== "return" && checklistFault(points, checklist) !== undefined;
    if (faults.reasons || faults.password || needsChecklist) return;
    const isWhole = checklist.length === points.length;
    const body = { reasons, password, digest, replayId: replays[0]?.id ?? null, checklist: isWhole ? checklist : [] };
    const then = {
      onSuccess: () => announce(`Revision ${number} is ${said[kind]}.`),
      onError: (refusal: Error) => isDecided(refusal) && onTooLate({ message: refusal.message, reasons }),
    };
    if (kind === "self-check") selfCheck.mutate(body, then);
    else decide.mutate({ decision: kind, ...body }, then);
  };
  const failure = otherFault(error, fields);
  return (
    <div className="grid gap-x-12 gap-y-6 wide:grid-cols-[minmax(0,1fr)_400px]">
      <div className="flex flex-col gap-5">
        {points.length > 0 && (
          <ChecklistFields
            points={points}
            given={given}
            error={tried ? faults.checklist : undefined}
            onAnswer={(point, answer) => setGiven(new Map(given).set(point, answer))}
          />
        )}
        <TextArea
          label="Reasons, kept with the revision"
          rows={4}
          maxLength={4000}
          value={reasons}
          error={(tried && faults.reasons) ?? faultAt(error, "reasons")}
          onChange={(event) => setReasons(event.target.value)}
        />
        <PasswordField
          label="Your password, once more"
          autoComplete="current-password"
          className="max-w-[320px]"
          value={password}
          error={(tried && faults.password) ?? faultAt(error, "password")}
          onChange={(event) => setPassword(event.target.value)}
        />
      </div>
      <div>
        <div className="flex flex-wrap gap-3">
          {review.may.decide ? (
            <>
              <Button kind="primary" isBusy={isBusy} onClick={() => act("accept")}>
                Accept revision {number}
              </Button>
              <Button isBusy={isBusy} onClick={() => act("return")}>
                Return to {frozenBy.name.split(" ")[0]}
              </Button>
            </>
          ) : (
            <Button kind="primary" isBusy={isBusy} onClick={() => act("self-check")}>
              Mark it self-checked
            </Button>
          )}
        </div>
        {failure && <ErrorNote className="mt-4">{failure}</ErrorNote>}
        <p className="mt-3 text-13 text-quiet">{remarks(openComments, replays, review.may.decide)}</p>
      </div>
    </div>
  );
}

const isDecided = (error: Error): boolean => error instanceof ApiFailure && error.code === "decided";

function checklistFault(points: readonly string[], checklist: readonly { answer: Answer }[]): string | undefined {
  if (checklist.length < points.length) return "Answer each point.";
  return checklist.some(({ answer }) => answer === "no") ? "With a no, a revision is returned." : undefined;
}

function remarks(openComments: number, replays: readonly Replay[], isReview: boolean): string {
  const settled =
    openComments === 0
      ? ""
      : `${openComments} ${openComments === 1 ? "comment is" : "comments are"} not settled; you may still decide. `;
  const [last] = replays;
  const replay = last
    ? `It rests on your replay of ${sayMoment(new Date(last.at))}: ${last.verdict}. `
    : "You have not replayed it; the decision will say so. ";
  const rule = isReview
    ? "A decision cannot be changed or deleted. Nobody decides on a revision of their own."
    : "Self-checked is for work that nobody else in the project can look at. It is not a review.";
  return settled + replay + rule;
}
