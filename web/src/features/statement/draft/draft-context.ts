import { createContext, useContext, type ReactNode } from "react";
import type { Dispatch, Draft } from "./draft.ts";

interface DraftAccess {
  draft: Draft;
  dispatch: Dispatch;
  /** What the page offers beside the number at a path: a way to work it out, as a rule. */
  aside?: (path: string) => ReactNode;
}

/** The open draft and the one way to change it, for everything inside the statement. */
export const DraftContext = createContext<DraftAccess | null>(null);

export function useDraftContext(): DraftAccess {
  const context = useContext(DraftContext);
  if (!context) throw new Error("A part of the statement stands outside its draft.");
  return context;
}
