import { useInfiniteQuery } from "@tanstack/react-query";
import { trailQuery } from "../../api/activity.ts";
import { Button } from "../../components/button.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { tellTrail } from "./lately-words.ts";
import { TrailList } from "./trail-list.tsx";

/** Everything that was ever done in the project, a page at a time. */
export function WholeTrail({ projectId, ownId }: { projectId: string; ownId: string }) {
  const { data, error, hasNextPage, isFetchingNextPage, fetchNextPage } = useInfiniteQuery(trailQuery(projectId));
  if (!data)
    return error ? <ErrorNote>{error.message}</ErrorNote> : <p className="late text-quiet">Reading the trail</p>;
  return (
    <div className="min-h-0 overflow-y-auto" tabIndex={0} role="region" aria-label="Trail" data-first-focus>
      <TrailList projectId={projectId} told={tellTrail(data.pages.flat(), ownId)} />
      {error && <ErrorNote className="mb-4">{error.message}</ErrorNote>}
      {hasNextPage && (
        <Button isBusy={isFetchingNextPage} onClick={() => void fetchNextPage()}>
          Older
        </Button>
      )}
    </div>
  );
}
