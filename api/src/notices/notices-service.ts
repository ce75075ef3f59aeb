import type { Database } from "../database/database.ts";
import { closeNotice, closeNoticesOf, insertNotices, listNotices, type NewNotice } from "./notices-store.ts";

export type NoticesService = ReturnType<typeof createNoticesService>;

/** What waits for people. */
export function createNoticesService(database: Database) {
  return {
    list: (accountId: string) => listNotices(database, accountId),
    close: (accountId: string, id: string) => closeNotice(database, accountId, id),
  };
}

/**
 * The one place that tells people something, in the transaction that does it. Nobody is told of what they did themselves,
 * nor of one thing twice: the first notice to somebody counts.
 */
export async function tell(transaction: Database, notices: readonly NewNotice[]): Promise<void> {
  const told = new Set<string>();
  const first = notices.filter(({ to, by }) => {
    const isNew = to !== by && !told.has(to);
    told.add(to);
    return isNew;
  });
  await insertNotices(transaction, first);
}

/** A review that was asked for is over: it waits for nobody any more. */
export function endWaiting(transaction: Database, revisionId: string): Promise<void> {
  return closeNoticesOf(transaction, revisionId, "review-asked");
}
