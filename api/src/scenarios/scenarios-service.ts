import type { Scenario } from "@restband/solver";
import { recordAct } from "../activity/activity-service.ts";
import type { Act } from "../activity/activity.ts";
import type { Database } from "../database/database.ts";
import { archived, notAllowed, notFound, Refusal } from "../errors.ts";
import type { MembersService } from "../members/members-service.ts";
import {
  fillingOf,
  keepRecords,
  moveRecords,
  type NamedRecord,
  storedPoints,
  withPoints,
} from "../records/records-service.ts";
import { canonicalCases, canonicalOf, changedMembers } from "./canonical-scenario.ts";
import type { ScenarioSummary, StoredScenario, SwitchedOff } from "./scenarios-schema.ts";
import {
  findContents,
  findScenario,
  hasRevisions,
  insertScenario,
  insertScenarios,
  type KeptScenario,
  listScenarios,
  lockScenario,
  type LockedScenario,
  markScenarioArchived,
  moveScenario,
  textsOf,
  updateScenario,
} from "./scenarios-store.ts";
import { checkedSwitchedOff } from "./switched-off.ts";

export type ScenariosService = ReturnType<typeof createScenariosService>;

/** What a person sends to be kept; nothing of it is checked. */
interface Draft {
  readonly content: unknown;
  readonly switchedOff?: readonly SwitchedOff[];
}

/** What a request keeps: the scenario, and the records that it or its terms switched off name. */
type Kept = KeptScenario & { readonly records: readonly NamedRecord[] };

/** Points that one answer with several contents holds at most, beyond those of the first. */
const MOST_POINTS = 200_000;

/** A scenario by the ids in a path. */
interface Place {
  readonly projectId: string;
  readonly scenarioId: string;
}

export function createScenariosService(database: Database, members: MembersService) {
  /** Writes a new scenario and the act that made it. */
  const add = (projectId: string, content: Kept, accountId: string, act: Act) =>
    database.transaction(async (transaction) => {
      await keepRecords(transaction, projectId, content.records);
      const subjectId = await insertScenario(transaction, projectId, content, accountId);
      const detail = { version: 1, digest: content.digest, title: content.title };
      await recordAct(transaction, { projectId, accountId, act, subjectId, detail });
      return read(transaction, projectId, subjectId);
    });

  return {
    list: (projectId: string) => listScenarios(database, projectId),
    read: (projectId: string, id: string) => read(database, projectId, id),
    readContents: (projectId: string, ids: readonly string[]) => readContents(database, projectId, ids),
    create: async (projectId: string, draft: Draft, accountId: string): Promise<StoredScenario> =>
      add(projectId, keptOf(draft), accountId, "scenario.created"),

    createCases: (projectId: string, inputs: readonly unknown[], accountId: string) =>
      createCases(database, projectId, inputs, accountId),

    async duplicate({ projectId, scenarioId }: Place, title: string, accountId: string): Promise<StoredScenario> {
      const { content, switchedOff } = await read(database, projectId, scenarioId);
      return add(projectId, keptOf({ content: { ...content, title }, switchedOff }), accountId, "scenario.duplicated");
    },

    /**
     * Replaces the version the person has seen by the next one. What is answered is read before anybody else can save; its
     * long records come back as they were sent, with their points or named by digest.
     * @throws Refusal 409 with what is stored where somebody else was faster, 422 with every faulty field
     */
    async save(
      { projectId, scenarioId: subjectId }: Place,
      seen: number,
      draft: Draft,
      accountId: string,
    ): Promise<StoredScenario> {
      const content = keptOf(draft);
      return database.transaction(async (transaction) => {
        const stored = await lock(transaction, projectId, subjectId);
        if (stored.version !== seen) throw staleVersion(await read(transaction, projectId, subjectId));
        if (stored.isArchived) throw archived("scenario");
        await keepRecords(transaction, projectId, content.records);
        const version = seen + 1;
        await updateScenario(transaction, subjectId, version, content, accountId);
        const { digest, title, text } = content;
        const changed = changedMembers(stored.content, text);
        const detail = { version, digest, title, changed: changed.join(" ") };
        await recordAct(transaction, { projectId, accountId, act: "scenario.saved", subjectId, detail });
        return areNamed(content) ? demand(transaction, projectId, subjectId) : read(transaction, projectId, subjectId);
      });
    },

    move: (place: Place, toProjectId: string, accountId: string) =>
      move(database, members, { place, toProjectId, accountId }),
    archive: (place: Place, accountId: string) => mark(database, place, accountId, new Date()),
    restore: (place: Place, accountId: string) => mark(database, place, accountId, null),
  };
}

/**
 * The contents of those of the scenarios that are in the project, in the order asked: the first, and as many of the others
 * as an answer holds.
 */
async function readContents(database: Database, projectId: string, ids: readonly string[]) {
  const found = await findContents(database, projectId, ids);
  let points = 0;
  const held = found.filter(({ content }, i) => (points += storedPoints(content)) <= MOST_POINTS || i === 0);
  const fill = (content: Scenario) => withPoints(database, projectId, content);
  return Promise.all(held.map(async (each) => ({ ...each, content: await fill(each.content) })));
}

/** Makes a scenario of each input, or none of any. */
async function createCases(
  database: Database,
  projectId: string,
  inputs: readonly unknown[],
  accountId: string,
): Promise<ScenarioSummary[]> {
  const contents = canonicalCases(inputs);
  const records = contents.flatMap((content) => content.records);
  return database.transaction(async (transaction) => {
    await keepRecords(transaction, projectId, records);
    const ids = await insertScenarios(transaction, projectId, contents, accountId);
    await recordAct(transaction, { projectId, accountId, act: "cases.created", detail: { count: ids.length } });
    const made = await listScenarios(transaction, projectId, ids);
    return ids.flatMap((id) => made.find((each) => each.id === id) ?? []);
  });
}

/** Puts a scenario away or takes it out again. Doing it twice is no fault, and is told once. */
function mark(
  database: Database,
  { projectId, scenarioId: subjectId }: Place,
  accountId: string,
  at: Date | null,
): Promise<void> {
  return database.transaction(async (transaction) => {
    const { title, isArchived } = await lock(transaction, projectId, subjectId);
    if (isArchived === (at !== null)) return;
    await markScenarioArchived(transaction, subjectId, at);
    const act = at ? "scenario.archived" : "scenario.restored";
    await recordAct(transaction, { projectId, accountId, act, subjectId, detail: { title } });
  });
}

/**
 * Takes a scenario into another project in which the person may make scenarios. Both trails tell it.
 * @throws Refusal 404 for a project they are no member of, 403 for a role that does not reach, 409 for an archived one and
 * for a scenario that has revisions
 */
async function move(
  database: Database,
  members: MembersService,
  { place, toProjectId, accountId }: { place: Place; toProjectId: string; accountId: string },
): Promise<void> {
  const { projectId, scenarioId: subjectId } = place;
  await demandAuthor(members, accountId, toProjectId);
  await database.transaction(async (transaction) => {
    const { title } = await lock(transaction, projectId, subjectId);
    if (projectId === toProjectId) return;
    if (await hasRevisions(transaction, subjectId)) throw keptByRevisions();
    await moveRecords(transaction, await textsOf(transaction, subjectId), { from: projectId, to: toProjectId });
    await moveScenario(transaction, subjectId, toProjectId);
    const told = { accountId, subjectId, detail: { title } };
    await recordAct(transaction, { ...told, projectId, act: "scenario.moved-out" });
    await recordAct(transaction, { ...told, projectId: toProjectId, act: "scenario.moved-in" });
  });
}

/** @throws Refusal 422 with every faulty field */
function keptOf({ content, switchedOff }: Draft): Kept {
  const canonical = canonicalOf(content);
  if (!switchedOff) return canonical;
  const off = checkedSwitchedOff(switchedOff);
  return { ...canonical, switchedOff: off.kept, records: [...canonical.records, ...off.records] };
}

/**
 * The version of a scenario that a person has seen.
 * @throws Refusal 409 with what is stored where that is another
 */
export async function readVersion(
  database: Database,
  { projectId, scenarioId }: Place,
  seen: number,
): Promise<StoredScenario> {
  const stored = await read(database, projectId, scenarioId);
  if (stored.version !== seen) throw staleVersion(stored);
  return stored;
}

/** As `readVersion`, and nobody can save another version until the transaction ends. */
export async function holdVersion(transaction: Database, place: Place, seen: number): Promise<void> {
  const stored = await lock(transaction, place.projectId, place.scenarioId);
  if (stored.version !== seen) throw staleVersion(await read(transaction, place.projectId, place.scenarioId));
  if (stored.isArchived) throw archived("scenario");
}

/** True where all records were sent by their digests: their points are known to whoever sent them. */
const areNamed = ({ records }: Kept): boolean => records.every(({ given }) => given === null);

/** A scenario as it is kept, its long records named by digest. */
async function demand(database: Database, projectId: string, id: string): Promise<StoredScenario> {
  const scenario = await findScenario(database, projectId, id);
  if (!scenario) throw notFound();
  return scenario;
}

/** A scenario with the points of its records. */
async function read(database: Database, projectId: string, id: string): Promise<StoredScenario> {
  const scenario = await demand(database, projectId, id);
  const fill = await fillingOf(
    database,
    projectId,
    scenario.switchedOff.map(({ term }) => term),
  );
  return {
    ...scenario,
    content: await withPoints(database, projectId, scenario.content),
    switchedOff: scenario.switchedOff.map((off) => ({ ...off, term: fill(off.term) })),
  };
}

async function lock(transaction: Database, projectId: string, id: string): Promise<LockedScenario> {
  const scenario = await lockScenario(transaction, projectId, id);
  if (!scenario) throw notFound();
  return scenario;
}

async function demandAuthor(members: MembersService, accountId: string, projectId: string): Promise<void> {
  const caller = await members.findCaller(accountId, projectId);
  if (!caller?.role) throw notFound();
  if (caller.role !== "owner" && caller.role !== "editor") {
    throw notAllowed(`Your role in the other project is ${caller.role}; this takes owner or editor.`);
  }
  if (caller.isArchived) throw archived("project");
}

function keptByRevisions(): Refusal {
  const message = "Its revisions are part of this project's trail, so it stays here. Duplicate it and move the copy.";
  return new Refusal(409, "has-revisions", message);
}

function staleVersion(current: StoredScenario): Refusal {
  const message = `${current.updatedBy.name} saved version ${current.version} meanwhile. Nothing was overwritten.`;
  return new Refusal(409, "stale-version", message, { current });
}
