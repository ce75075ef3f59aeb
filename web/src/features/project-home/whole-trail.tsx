import { useInfiniteQuery } from "@tanstack/react-query";
import { useState } from "react";
import { trailQuery, type TrailFilter } from "../../api/activity.ts";
import { Button } from "../../components/button.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { tellTrail } from "./lately-words.ts";
import { TrailFilterFields } from "./trail-filter-fields.tsx";
import { TrailList } from "./trail-list.tsx";

/** Everything that was ever done in the project, or what of it is asked for, a page at a time. */
export function WholeTrail({ projectId, ownId }: { projectId: string; ownId: string }) {
  const [filter, setFilter] = useState<TrailFilter>({});
  return (
    <>
      <TrailFilterFields projectId={projectId} filter={filter} onChange={setFilter} />
      <div className="min-h-0 overflow-y-auto" tabIndex={0} role="region" aria-label="Trail" data-first-focus>
        <Acts projectId={projectId} ownId={ownId} filter={filter} />
      </div>
    </>
  );
}

function Acts({ projectId, ownId, filter }: { projectId: string; ownId: string; filter: TrailFilter }) {
  const trail = useInfiniteQuery(trailQuery(projectId, filter));
  const { data, error, hasNextPage, isFetchingNextPage, fetchNextPage } = trail;
  if (!data)
    return error ? <ErrorNote>{error.message}</ErrorNote> : <p className="late text-quiet">Reading the trail</p>;
  const told = tellTrail(data.pages.flat(), ownId);
  if (told.length === 0) return <p className="py-4 text-quiet">Nothing of that kind was done here.</p>;
  return (
    <>
      <TrailList projectId={projectId} told={told} />
      {error && <ErrorNote className="mb-4">{error.message}</ErrorNote>}
      {hasNextPage && (
        <Button isBusy={isFetchingNextPage} onClick={() => void fetchNextPage()}>
          Older
        </Button>
      )}
    </>
  );
}
