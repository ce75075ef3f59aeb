import type { RevisionSummary } from "@restband/api/contract";

/** A project's revisions by the scenario they are of, each list in the order given. */
export function byScenario(revisions: readonly RevisionSummary[]): ReadonlyMap<string, readonly RevisionSummary[]> {
  const lists = new Map<string, RevisionSummary[]>();
  for (const revision of revisions) {
    const list = lists.get(revision.scenarioId) ?? [];
    lists.set(revision.scenarioId, [...list, revision]);
  }
  return lists;
}
