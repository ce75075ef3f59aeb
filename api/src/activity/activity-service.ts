import type { Database } from "../database/database.ts";
import type { Activity } from "./activity.ts";
import { insertActivity } from "./activity-store.ts";

/** Adds an act to the trail, in the transaction that does it: neither happens without the other. */
export function recordAct(transaction: Database, activity: Activity): Promise<void> {
  return insertActivity(transaction, activity);
}
