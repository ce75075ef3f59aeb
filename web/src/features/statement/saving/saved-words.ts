import { sayClock } from "../../../format/words.ts";
import type { Saving } from "./autosave.ts";

interface SavedStateProps {
  saving: Saving;
  canEdit: boolean;
  /** The role's name, for those who may only read. */
  role: string;
  /** What is archived, so that nobody may change it until that is restored. */
  archived?: "project" | "scenario" | null;
  /** Whether something was tried that is not the stored version. */
  isTrying: boolean;
  faults: number;
}

/** The state of saving in one short phrase, for the page's header. */
export function savedWords({ saving, canEdit, role, archived, isTrying, faults }: SavedStateProps): string {
  if (archived) return `${isTrying ? "not saved: " : ""}the ${archived} is archived`;
  if (!canEdit) return isTrying ? `not saved: you are a ${role}` : `you read this as a ${role}`;
  const open = faults > 0 ? `, ${faults === 1 ? "1 field" : `${faults} fields`} to put right` : "";
  return phrase(saving) + open;
}

function phrase(saving: Saving): string {
  switch (saving.kind) {
    case "saved":
      return saving.at ? `saved ${sayClock(saving.at)}` : "saved";
    case "saving":
      return "draft, saving…";
    case "unreachable":
      return `not saved since ${sayClock(saving.since)}, trying again`;
    case "conflict":
      return "not saved: changed by somebody else meanwhile";
    case "signed-out":
      return "not saved: the session has ended";
    case "refused":
      return `not saved: ${saving.message}`;
  }
}
