import type { Project, Replay, Review, Revision } from "@restband/api/contract";
import { useQuery } from "@tanstack/react-query";
import { useState } from "react";
import { reviewQuery } from "../../api/reviews.ts";
import { Button } from "../../components/button.tsx";
import { Dialog } from "../../components/dialog.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { sayWhen } from "../../format/when.ts";
import { sayMany } from "../../format/words.ts";
import { AskForm } from "./ask-form.tsx";
import { ChecklistForm } from "./checklist-form.tsx";
import { DecideForm, type TooLate } from "./decide-form.tsx";
import { DecisionList } from "./decision-list.tsx";
import { WithdrawForm } from "./withdraw-form.tsx";

interface ReviewPanelProps {
  project: Project;
  revision: Revision;
  ownId: string;
  replays: readonly Replay[];
}

type Open = "ask" | "withdraw" | "checklist" | null;

const titles = { ask: "Ask for a review", withdraw: "Withdraw the revision", checklist: "The project’s checklist" };

/** Who was asked, what was decided, and what the reader may do about it. */
export function ReviewPanel({ project, revision, ownId, replays }: ReviewPanelProps) {
  const { data: review, error, refetch } = useQuery(reviewQuery(revision.projectId, revision.id));
  const [open, setOpen] = useState<Open>(null);
  const [late, setLate] = useState<TooLate | null>(null);
  if (!review)
    return error ? (
      <ErrorNote action={<Button onClick={() => void refetch()}>Try again</Button>}>{error.message}</ErrorNote>
    ) : (
      <p className="late text-quiet">Reading the review</p>
    );
  const isInUse = project.archivedAt === null;
  const may = isInUse ? review.may : nothing;
  const own = replays.filter(({ by }) => by.accountId === ownId);
  const close = () => setOpen(null);
  return (
    <>
      {late && <Late {...late} />}
      <Asked review={review} ownId={ownId} />
      {review.decisions.length > 0 && <DecisionList decisions={review.decisions} replays={replays} />}
      {may.decide || may.selfCheck ? (
        <DecideForm revision={revision} review={review} replays={own} onTooLate={setLate} />
      ) : (
        <p className="max-w-(--measure)">{isInUse ? hindranceOf(review) : "The project is archived."}</p>
      )}
      <div className="mt-5 flex flex-wrap items-center gap-x-5 gap-y-3">
        {may.ask && (
          <Button aria-haspopup="dialog" onClick={() => setOpen("ask")}>
            Ask for a review
          </Button>
        )}
        {may.withdraw && (
          <Button kind="danger" aria-haspopup="dialog" onClick={() => setOpen("withdraw")}>
            Withdraw
          </Button>
        )}
        {project.role === "owner" && isInUse && (
          <button type="button" className="link hit text-13" onClick={() => setOpen("checklist")}>
            {checklistWords(review.checklist.points.length)}
          </button>
        )}
      </div>
      <Dialog isOpen={open !== null} title={open ? titles[open] : ""} onClose={close}>
        {open === "ask" && <AskForm revision={revision} candidates={review.candidates} onClose={close} />}
        {open === "withdraw" && <WithdrawForm revision={revision} onClose={close} />}
        {open === "checklist" && <ChecklistForm projectId={project.id} checklist={review.checklist} onClose={close} />}
      </Dialog>
    </>
  );
}

/** Two decided at once: what one has written is not lost. */
function Late({ message, reasons }: TooLate) {
  return (
    <ErrorNote className="mb-5">
      <p>{message} That decision stands; yours was not kept.</p>
      <p className="mt-1 whitespace-pre-wrap wrap-anywhere">You had written: “{reasons}”</p>
    </ErrorNote>
  );
}

const nothing: Review["may"] = { ask: false, decide: false, selfCheck: false, withdraw: false };

/** Where it is decided the decision itself stands above. */
const hindranceOf = ({ decisions, hindrance }: Review): string => (decisions.length > 0 ? "" : (hindrance ?? ""));

const checklistWords = (count: number): string =>
  count === 0 ? "Set a checklist for the project" : `The project’s checklist, ${sayMany(count, "point")}`;

function Asked({ review: { requests }, ownId }: { review: Review; ownId: string }) {
  if (requests.length === 0) return null;
  return (
    <ul aria-label="Asked to review" className="mb-5 flex flex-col gap-1">
      {requests.map(({ reviewer, by, at, message }) => (
        <li key={reviewer.accountId} className="max-w-(--measure)">
          {by.accountId === ownId ? "You" : by.name} asked{" "}
          <strong>{reviewer.accountId === ownId ? "you" : reviewer.name}</strong>{" "}
          <time dateTime={at} className="text-13 text-quiet">
            {sayWhen(new Date(at))}
          </time>
          {message && <span className="block wrap-anywhere text-quiet">“{message}”</span>}
        </li>
      ))}
    </ul>
  );
}
