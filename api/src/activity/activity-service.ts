import type { Database } from "../database/database.ts";
import type { Activity } from "./activity.ts";
import type { ActivityQuery } from "./activity-schema.ts";
import { findSavers, insertActivity, listActivity } from "./activity-store.ts";

export type ActivityService = ReturnType<typeof createActivityService>;

/** Reads the trail of a project. */
export function createActivityService(database: Database) {
  return {
    /** A page of the trail, newest first, of what the query asks for. */
    list: (projectId: string, query: ActivityQuery) => listActivity(database, projectId, query),
  };
}

/** Who made a scenario or saved a change in it, by its versions: those after one up to another, counted from 1. */
export function saversOf(
  database: Database,
  scenarioId: string,
  versions: { readonly after: number; readonly upTo: number },
): Promise<{ accountId: string; name: string }[]> {
  return findSavers(database, scenarioId, versions);
}

/** Adds an act to the trail, in the transaction that does it: neither happens without the other. */
export function recordAct(transaction: Database, activity: Activity): Promise<void> {
  return insertActivity(transaction, activity);
}
