import type { Replay, Revision } from "@restband/api/contract";
import { solverVersion } from "@restband/solver";
import { useQuery } from "@tanstack/react-query";
import { useMemo } from "react";
import { replaysQuery } from "../../api/revisions.ts";
import { Button } from "../../components/button.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { ProgressLine } from "../../components/progress-line.tsx";
import { wayWords } from "./replay-words.ts";
import { ReplayRow } from "./replay-row.tsx";
import { ScriptPart } from "./script-part.tsx";
import { useReplay } from "./use-replay.ts";

/** A revision run again: here by two methods, elsewhere by a file; and every replay there was. */
export function ReplayPanel({ revision, ownId }: { revision: Revision; ownId: string }) {
  const { projectId, id, content, result } = revision;
  const frozen = useMemo(() => ({ scenario: content, result }), [content, result]);
  const { running, failure, begin, cancel } = useReplay(projectId, id, frozen);
  const replays = useQuery(replaysQuery(projectId, id));
  return (
    <>
      <div className="flex flex-wrap items-center gap-x-5 gap-y-3">
        <Button kind="primary" isBusy={running !== null} onClick={begin}>
          Replay it here
        </Button>
        {running ? (
          <ProgressLine
            label={wayWords(running.way, result.method)}
            fraction={(running.step + running.fraction) / running.of}
            remark={`${wayWords(running.way, result.method)}, ${running.step + 1} of ${running.of}`}
            onCancel={cancel}
          />
        ) : (
          <p className="text-13 text-quiet">On your own machine, by the same method and then by another.</p>
        )}
      </div>
      {solverVersion !== result.solverVersion && (
        <p className="mt-3 max-w-(--measure)">
          Frozen by solver {result.solverVersion}; this page computes with solver {solverVersion}. A difference can come
          from that.
        </p>
      )}
      {failure && <ErrorNote className="mt-4">{failure}</ErrorNote>}
      {replays.error && (
        <ErrorNote className="mt-4" action={<Button onClick={() => void replays.refetch()}>Try again</Button>}>
          {replays.error.message}
        </ErrorNote>
      )}
      {replays.data && <Kept replays={replays.data} revision={revision} ownId={ownId} />}
      <ScriptPart revision={revision} />
    </>
  );
}

function Kept({ replays, revision, ownId }: { replays: readonly Replay[]; revision: Revision; ownId: string }) {
  if (replays.length === 0) return <p className="mt-4 text-quiet">Nobody has replayed this revision yet.</p>;
  return (
    <ul className="mt-5 border-t border-edge" aria-label="Replays">
      {replays.map((replay) => (
        <ReplayRow key={replay.id} replay={replay} revision={revision} ownId={ownId} />
      ))}
    </ul>
  );
}
