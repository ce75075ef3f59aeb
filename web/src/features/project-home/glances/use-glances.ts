import { mostContents } from "@restband/api/contract";
import { useEffect, useSyncExternalStore } from "react";
import { readContents } from "../../../api/scenarios.ts";
import { solverPool } from "../../../compute/solver-pool.ts";
import { GlanceBook, type Glance, type Wanted } from "./glance-book.ts";

/** One for the page: a project opened again shows its answers at once. Samples only mark where phases change. */
const book = new GlanceBook({
  read: readContents,
  run: (scenario, client) => solverPool.request(client, { scenario, options: { samples: 2, energy: false } }),
  lanes: 2,
  batch: mostContents,
  pause: 3000,
});

export interface Glances {
  readonly of: (digest: string) => Glance | undefined;
  /** Changes with every new glance. */
  readonly edition: number;
  /** Says what is looked at now, the first first. */
  readonly want: (wanted: readonly Wanted[]) => void;
}

/** The glances of a project's scenarios, and a new render as they come. Leaving the project ends the work. */
export function useGlances(projectId: string): Glances {
  const edition = useSyncExternalStore(book.subscribe, book.editionNow);
  useEffect(() => () => book.want(projectId, []), [projectId]);
  return { of: book.get, edition, want: (wanted) => book.want(projectId, wanted) };
}
