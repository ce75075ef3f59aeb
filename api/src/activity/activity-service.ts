import type { Database } from "../database/database.ts";
import type { Activity } from "./activity.ts";
import { insertActivity, listActivity } from "./activity-store.ts";

export type ActivityService = ReturnType<typeof createActivityService>;

/** Reads the trail of a project. */
export function createActivityService(database: Database) {
  return {
    /** A page of the trail, newest first: the newest of all, or those older than the act `before`. */
    list: (projectId: string, before: number | null) => listActivity(database, projectId, before),
  };
}

/** Adds an act to the trail, in the transaction that does it: neither happens without the other. */
export function recordAct(transaction: Database, activity: Activity): Promise<void> {
  return insertActivity(transaction, activity);
}
