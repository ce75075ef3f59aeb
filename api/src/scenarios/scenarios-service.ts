import { canonicalText, checkScenario, digestOf } from "@restband/solver";
import { recordAct } from "../activity/activity-service.ts";
import type { Database } from "../database/database.ts";
import { notFound, Refusal, refusedContent } from "../errors.ts";
import type { StoredScenario } from "./scenarios-schema.ts";
import {
  type CanonicalScenario,
  findScenario,
  insertScenario,
  listScenarios,
  lockVersion,
  updateScenario,
} from "./scenarios-store.ts";

export type ScenariosService = ReturnType<typeof createScenariosService>;

export function createScenariosService(database: Database) {
  return {
    list: (projectId: string) => listScenarios(database, projectId),
    read: (projectId: string, id: string) => read(database, projectId, id),

    async create(projectId: string, input: unknown, accountId: string): Promise<StoredScenario> {
      const content = canonicalOf(input);
      return database.transaction(async (transaction) => {
        const subjectId = await insertScenario(transaction, projectId, content, accountId);
        const detail = { version: 1, digest: content.digest };
        await recordAct(transaction, { projectId, accountId, act: "scenario.created", subjectId, detail });
        return read(transaction, projectId, subjectId);
      });
    },

    /**
     * Replaces the version the person has seen by the next one. What is answered is read before anybody else can save.
     * @throws Refusal 409 with what is stored where somebody else was faster, 422 with every faulty field
     */
    async save(
      { projectId, scenarioId: subjectId }: { projectId: string; scenarioId: string },
      seen: number,
      input: unknown,
      accountId: string,
    ): Promise<StoredScenario> {
      const content = canonicalOf(input);
      return database.transaction(async (transaction) => {
        const stored = await lockVersion(transaction, projectId, subjectId);
        if (stored !== seen) throw staleVersion(await read(transaction, projectId, subjectId));
        const version = seen + 1;
        await updateScenario(transaction, subjectId, version, content, accountId);
        const detail = { version, digest: content.digest };
        await recordAct(transaction, { projectId, accountId, act: "scenario.saved", subjectId, detail });
        return read(transaction, projectId, subjectId);
      });
    },
  };
}

async function read(database: Database, projectId: string, id: string): Promise<StoredScenario> {
  const scenario = await findScenario(database, projectId, id);
  if (!scenario) throw notFound();
  return scenario;
}

/** Checks a scenario by the solver's own rules; faults keep the paths of the format. */
export function canonicalOf(input: unknown): CanonicalScenario {
  const { scenario, faults } = checkScenario(input);
  if (!scenario) throw refusedContent("refused-scenario", faults);
  return { text: canonicalText(scenario), digest: digestOf(scenario) };
}

function staleVersion(current: StoredScenario): Refusal {
  const message = `${current.updatedBy.name} saved version ${current.version} meanwhile. Nothing was overwritten.`;
  return new Refusal(409, "stale-version", message, { current });
}
