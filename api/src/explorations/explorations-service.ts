import { digestOf, type Scenario, type z } from "@restband/solver";
import { recordAct } from "../activity/activity-service.ts";
import type { Database } from "../database/database.ts";
import { Refusal } from "../errors.ts";
import { withPoints } from "../records/records-service.ts";
import type { ScenariosService } from "../scenarios/scenarios-service.ts";
import { explorationOf, missing, summaryOf } from "./exploration-rows.ts";
import { demandPlan } from "./plan-rules.ts";
import { createRunners, type Place } from "./exploration-runners.ts";
import type { explorationDraftSchema, ExplorationSummary, StoredExploration } from "./explorations-schema.ts";
import {
  deleteExploration,
  findExploration,
  insertExploration,
  listExplorations,
  listTileNumbers,
  lockBytes,
  lockExploration,
} from "./explorations-store.ts";

export type ExplorationsService = ReturnType<typeof createExplorationsService>;

/** What the explorations of one project may hold together. */
const MOST_BYTES = 200_000_000;
type Runners = ReturnType<typeof createRunners>;

/** Searches, sweeps and studies over scenarios, kept with the scenario they were asked of. The server computes none. */
export function createExplorationsService(database: Database, scenarios: ScenariosService) {
  const read = async (db: Database, { projectId, explorationId }: Place): Promise<StoredExploration> => {
    const row = (await findExploration(db, projectId, explorationId)) ?? missing();
    const { content } = await scenarios.read(projectId, row.scenario_id);
    const exploration = explorationOf(row, await listTileNumbers(db, explorationId), inputDigestOf(content));
    return { ...exploration, content: await withPoints(db, projectId, exploration.content) };
  };

  const runners = createRunners(database);

  return {
    ...runners,

    async list(projectId: string, scenarioId: string): Promise<ExplorationSummary[]> {
      const { content } = await scenarios.read(projectId, scenarioId);
      const digest = inputDigestOf(content);
      return (await listExplorations(database, scenarioId)).map((row) => summaryOf(row, digest));
    },

    read: (place: Place) => read(database, place),

    /**
     * @throws Refusal 409 where the scenario has another version by now, 422 for a plan that is none of it, 507 where the project's store is full
     */
    async create(
      projectId: string,
      scenarioId: string,
      draft: z.output<typeof explorationDraftSchema>,
      accountId: string,
    ): Promise<StoredExploration> {
      const { content, version } = await scenarios.read(projectId, scenarioId);
      if (version !== draft.scenarioVersion) throw otherVersion(version);
      const planned = { ...draft, plan: demandPlan(draft, content) };
      const id = await database.transaction(async (transaction) => {
        await demandRoom(transaction, projectId, draft);
        const inputDigest = inputDigestOf(content);
        const made = await insertExploration(transaction, {
          scenarioId,
          accountId,
          content,
          inputDigest,
          draft: planned,
        });
        await recordAct(transaction, trailed("exploration.created", { projectId, scenarioId, accountId }, draft));
        return made;
      });
      return read(database, { projectId, explorationId: id });
    },

    async claim(place: Place, claim: Parameters<Runners["claim"]>[1], accountId: string): Promise<StoredExploration> {
      await runners.claim(place, claim, accountId);
      return read(database, place);
    },

    async remove({ projectId, explorationId }: Place, accountId: string): Promise<void> {
      await database.transaction(async (transaction) => {
        const row = (await lockExploration(transaction, projectId, explorationId)) ?? missing();
        await deleteExploration(transaction, explorationId);
        const by = { projectId, scenarioId: row.scenario_id, accountId };
        await recordAct(transaction, trailed("exploration.deleted", by, row));
      });
    },
  };
}

/** What a run reads of a scenario; another title, purpose or origin makes nothing stale. */
const inputDigestOf = (content: Scenario): string => digestOf({ ...content, title: "", purpose: "other", origins: {} });

function trailed(
  act: "exploration.created" | "exploration.deleted",
  { projectId, scenarioId, accountId }: { projectId: string; scenarioId: string; accountId: string },
  { kind, title }: { kind: string; title: string },
) {
  return { projectId, accountId, act, subjectId: scenarioId, detail: { kind, asked: title } };
}

async function demandRoom(
  transaction: Database,
  projectId: string,
  { tileCells, cellValues }: { tileCells: readonly number[]; cellValues: number },
): Promise<void> {
  const held = await lockBytes(transaction, projectId);
  const cells = tileCells.reduce((sum, each) => sum + each, 0);
  if (held + cells * cellValues * 8 <= MOST_BYTES) return;
  const [used, most] = [held, MOST_BYTES].map((bytes) => Math.round(bytes / 1e6));
  const message = `The sweeps and studies of this project hold ${used} of ${most} MB. Delete one to make room, or ask for fewer cells.`;
  throw new Refusal(507, "full-store", message);
}

const otherVersion = (version: number): Refusal =>
  new Refusal(409, "other-version", `The scenario has version ${version} by now. Open it anew and ask again.`);
