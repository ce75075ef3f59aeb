import type { StoredExploration, StoredTile } from "@restband/api/contract";
import { queryOptions, useQueryClient } from "@tanstack/react-query";
import { call, type Input } from "./client.ts";

export type ExplorationDraft = Input<"createExploration">["body"];
export type Conclusion = Input<"concludeExploration">["body"];

/** The searches, sweeps and studies kept with a scenario, newest first. */
export const explorationsQuery = (projectId: string, scenarioId: string) =>
  queryOptions({
    queryKey: ["projects", projectId, "scenarios", scenarioId, "explorations"],
    queryFn: ({ signal }) => call("listExplorations", { params: { projectId, scenarioId }, signal }),
  });

/** One of them with its plan and answer. While somebody else computes it, it is read again every two seconds. */
export const explorationQuery = (projectId: string, explorationId: string) =>
  queryOptions({
    queryKey: ["projects", projectId, "explorations", explorationId],
    queryFn: ({ signal }) => call("readExploration", { params: { projectId, explorationId }, signal }),
    refetchInterval: ({ state }) => (state.data?.state === "running" ? 2000 : false),
  });

/** What can be done with the explorations of a project; lists are read anew after what changes them. */
export function useExplorationActs(projectId: string) {
  const client = useQueryClient();
  const refresh = (scenarioId: string): void =>
    void client.invalidateQueries({ queryKey: explorationsQuery(projectId, scenarioId).queryKey });
  return {
    async create(scenarioId: string, body: ExplorationDraft): Promise<StoredExploration> {
      const stored = await call("createExploration", { params: { projectId, scenarioId }, body });
      client.setQueryData(explorationQuery(projectId, stored.id).queryKey, stored);
      refresh(scenarioId);
      return stored;
    },
    async remove(scenarioId: string, explorationId: string): Promise<void> {
      await call("deleteExploration", { params: { projectId, explorationId } });
      refresh(scenarioId);
    },
  };
}

/** Rows of a tile as the server keeps them: little-endian Float64, base64. */
export const saveTile = (
  projectId: string,
  explorationId: string,
  number: number,
  runner: string,
  rows: Float64Array,
) =>
  call("saveTile", {
    params: { projectId, explorationId, number: String(number) },
    body: { runner, content: base64Of(rows) },
  });

/** Some tiles; those not there yet are missing. */
export async function readTiles(
  projectId: string,
  explorationId: string,
  numbers: readonly number[],
  signal?: AbortSignal,
): Promise<{ number: number; rows: Float64Array }[]> {
  const query = { numbers: numbers.join(",") };
  const tiles: StoredTile[] = await call("readTiles", { params: { projectId, explorationId }, query, signal });
  return tiles.map(({ number, content }) => ({ number, rows: rowsOf(content) }));
}

function base64Of({ buffer, byteOffset, byteLength }: Float64Array): string {
  let text = "";
  for (const byte of new Uint8Array(buffer, byteOffset, byteLength)) text += String.fromCharCode(byte);
  return btoa(text);
}

function rowsOf(content: string): Float64Array {
  const bytes = Uint8Array.from(atob(content), (sign) => sign.charCodeAt(0));
  return new Float64Array(bytes.buffer);
}
