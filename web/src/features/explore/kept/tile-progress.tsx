import type { StoredExploration } from "@restband/api/contract";
import { Button } from "../../../components/button.tsx";
import { ErrorNote } from "../../../components/error-note.tsx";
import { ProgressLine } from "../../../components/progress-line.tsx";
import { rateWords } from "../rate-words.ts";
import type { TileRun, TileStore } from "./tile-run.ts";

interface TileProgressProps {
  run: TileRun<TileStore>;
  stored: StoredExploration;
  canEdit: boolean;
  /** What its rows are: "cells", "draws". */
  noun: string;
}

/** How far a sweep or a study is, here or on somebody else's page; what goes wrong with it; and the way to stop or resume. */
export function TileProgress({ run, stored, canEdit, noun }: TileProgressProps) {
  const { state, done, store, trouble, failed } = run;
  const isElsewhere = stored.state === "running" && state.kind !== "running" && !run.isComplete;
  return (
    <div className="flex flex-col gap-3" aria-live="polite">
      {state.kind === "running" && (
        <ProgressLine
          label={`Running the ${noun}`}
          fraction={done / store.count}
          remark={progressWords(done, state.doneBefore, store.count, state.elapsed, noun)}
          onCancel={() => run.stop()}
        />
      )}
      {isElsewhere && (
        <p className="text-13 text-quiet">
          {stored.runner?.name ?? "Somebody"} computes this just now. {store.done} of {store.count} {noun} are here.
        </p>
      )}
      {state.kind !== "running" && !run.isComplete && !isElsewhere && (
        <div className="flex flex-wrap items-center gap-4">
          <span className="text-13 text-quiet">
            {store.done} of {store.count} {noun} are here.
          </span>
          <Button onClick={() => void run.start(canEdit)}>Resume</Button>
          {!canEdit && <span className="text-13 text-quiet">Your role may not save: it runs for you alone.</span>}
        </div>
      )}
      {state.kind === "failed" && <ErrorNote>{state.message}</ErrorNote>}
      {trouble && run.unsavedCount > 0 && (
        <ErrorNote>
          {run.unsavedCount} finished parts are not saved yet: {trouble} It is tried again.
        </ErrorNote>
      )}
      {[...failed].slice(0, 1).map(([tile, reason]) => (
        <ErrorNote key={tile}>A part could not be computed: {reason} Resume tries it again.</ErrorNote>
      ))}
    </div>
  );
}

/** The rate counts what was done since it began, not what was there before. */
function progressWords(done: number, before: number, count: number, elapsed: number, noun: string): string {
  const words = rateWords(done - before, count - before, elapsed, noun);
  return before === 0 ? words : `${words}, ${before} were there`;
}
