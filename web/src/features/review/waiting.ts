import type { Notice } from "@restband/api/contract";

/** Notices of one kind by one person on one revision, told as one: the newest of them, and the ids of all. */
export interface Waiting {
  readonly notice: Notice;
  readonly ids: readonly string[];
}

/** Newest first, as the notices are; what is to be done comes before what is only told. */
export function grouped(notices: readonly Notice[]): Waiting[] {
  const groups = new Map<string, { notice: Notice; ids: string[] }>();
  for (const notice of notices) {
    const key = [notice.kind, notice.by.accountId, notice.revision.id].join(" ");
    const group = groups.get(key);
    if (group) group.ids.push(notice.id);
    else groups.set(key, { notice, ids: [notice.id] });
  }
  const isTask = ({ notice }: Waiting) => Number(notice.kind === "review-asked");
  return [...groups.values()].sort((a, b) => isTask(b) - isTask(a));
}
