import type { StoredScenario } from "@restband/api/contract";
import { use, useCallback, useEffect, useMemo, useReducer, useRef, useState } from "react";
import { ApiFailure } from "../../../api/api-failure.ts";
import { useSaveScenario } from "../../../api/scenarios.ts";
import { useHasSessionEnded } from "../../../api/session-end.ts";
import type { Dispatch, Draft, DraftAction } from "../draft/draft.ts";
import { editing, type Editing } from "../draft/editing-part.ts";
import { openDraft } from "../draft/open-draft.ts";
import { Autosave, type Base, type SaveReply, type Saving } from "./autosave.ts";
import { dropLocal, keepLocally, localText, type LocalDraft } from "./local-draft.ts";
import { isSameWork, type Work } from "./work.ts";

interface UseDraftSettings {
  stored: StoredScenario;
  /** Whose draft it is: another person on the same browser has their own. */
  accountId: string;
  /** False for those who may only read: everything can be tried, nothing is sent or kept. */
  canEdit: boolean;
}

export interface OpenDraft {
  readonly draft: Draft;
  readonly dispatch: Dispatch;
  readonly saving: Saving;
  /** The version the draft is a change of. */
  readonly base: Base;
  /** What is kept of the draft. */
  readonly work: Work;
  /** Decides a conflict: what to go on with, over the version now stored. */
  readonly decide: (current: StoredScenario, work: Work) => void;
}

/**
 * The open scenario: what is typed, undone and kept. It begins from what was left in this browser, else from the server's
 * copy, and takes a newer version of the server's over only while nothing of its own is waiting.
 */
export function useDraft({ stored, accountId, canEdit }: UseDraftSettings): OpenDraft {
  const left = useLeftBehind(accountId, stored, canEdit);
  const [draft, dispatch] = useChecked(() => left?.draft ?? openDraft(stored.content, stored.switchedOff));
  const [saving, setSaving] = useState<Saving>({ kind: "saved", at: null });
  const [base, setBase] = useState<Base>(left?.base ?? stored);
  const autosave = useAutosave(stored, base, setSaving, setBase);
  const hasEnded = useHasSessionEnded();
  const hasFaults = draft.faults.length > 0;
  const work = useMemo(
    () => ({ content: draft.inForce, switchedOff: draft.sheet.off }),
    [draft.inForce, draft.sheet.off],
  );

  useEffect(() => {
    if (!canEdit) return;
    if (hasFaults || !isSameWork(work, autosave.base)) keepLocally(accountId, stored.id, draft, autosave.base);
    else dropLocal(accountId, stored.id);
  }, [canEdit, accountId, stored.id, draft, work, base, hasFaults, autosave]);

  useEffect(() => {
    if (canEdit && !hasEnded) autosave.want(work);
  }, [canEdit, hasEnded, work, autosave]);

  // A newer version of the server's, read again in the background: shown at once where nothing of one's own is waiting.
  const seen = useRef(stored.version);
  useEffect(() => {
    if (stored.version <= seen.current || stored.version <= autosave.base.version) return;
    seen.current = stored.version;
    if (hasFaults || !autosave.isIdle || !isSameWork(work, autosave.base)) return;
    autosave.adopt(stored);
    dispatch(replaceBy(stored));
  }, [stored, work, hasFaults, autosave, dispatch]);

  const decide = (current: StoredScenario, decided: Work): void => {
    autosave.decide(current, decided);
    dispatch(replaceBy(decided));
  };
  return { draft, dispatch, saving, base, work, decide };
}

const replaceBy = ({ content, switchedOff }: Work): DraftAction => ({
  type: "replace",
  scenario: content,
  off: switchedOff,
});

/** A draft and the way to change it. What is done before the check is there waits for it, in its order. */
function useChecked(open: () => Draft): [Draft, Dispatch] {
  const [draft, apply] = useReducer(
    (before: Draft, [{ draftReducer }, action]: [Editing, DraftAction]) => draftReducer(before, action),
    null,
    open,
  );
  useEffect(() => void editing.ask(), []);
  const dispatch = useCallback((action: DraftAction): void => {
    const there = editing.now();
    if (there) apply([there, action]);
    else void editing.ask().then((come) => apply([come, action]));
  }, []);
  return [draft, dispatch];
}

interface Left {
  readonly base: Base;
  readonly draft: Draft;
}

/** What this browser kept of the draft when the page was opened. Only where there is something the check is waited for. */
function useLeftBehind(accountId: string, stored: StoredScenario, canEdit: boolean): Left | null {
  const [isThere] = useState(() => canEdit && localText(accountId, stored.id) !== null);
  const come = isThere ? (editing.now() ?? use(editing.ask())) : null;
  const [left] = useState(() => come && leftBehind(accountId, stored, come));
  return left;
}

/** What this browser kept, unless the server has it by now. */
function leftBehind(accountId: string, stored: StoredScenario, { readLocal, resumeDraft }: Editing): Left | null {
  const left = readLocal(accountId, stored.id);
  if (!left) return null;
  if (!isStored(left, stored)) return { base: left.base, draft: resumeDraft(left.inForce, left.sheet) };
  dropLocal(accountId, stored.id);
  return null;
}

function isStored({ inForce, sheet }: LocalDraft, stored: StoredScenario): boolean {
  const isAllThere = isSameWork({ content: inForce, switchedOff: sheet.off }, stored) && sheet.wanted === inForce;
  return isAllThere && Object.keys(sheet.unread).length === 0;
}

function useAutosave(
  { projectId, id }: StoredScenario,
  base: Base,
  tell: (saving: Saving) => void,
  onKept: (base: Base) => void,
): Autosave {
  const mutation = useSaveScenario(projectId, id);
  const save = useRef<(work: Work, version: number) => Promise<SaveReply>>(null);
  useEffect(() => {
    save.current = (work, version) =>
      mutation.mutateAsync({ ...work, version }).then((stored) => ({ kind: "saved", stored }), replyOf);
  });
  const [autosave] = useState(
    () =>
      new Autosave({
        base,
        tell,
        onKept,
        save: (work, version) => save.current?.(work, version) ?? Promise.resolve({ kind: "unreachable" }),
      }),
  );
  useEffect(() => {
    autosave.open();
    return () => autosave.close();
  }, [autosave]);
  return autosave;
}

/** A failed call as what it means for saving. */
function replyOf(error: unknown): SaveReply {
  if (!(error instanceof ApiFailure))
    return { kind: "refused", message: "The page failed to send it. Load the page again; the draft is kept." };
  if (error.isUnreachable) return { kind: "unreachable" };
  if (error.isSignedOut) return { kind: "signed-out" };
  if (error.status === 409 && error.current) return { kind: "conflict", current: error.current };
  return { kind: "refused", message: error.message };
}
