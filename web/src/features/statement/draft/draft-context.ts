import { createContext, useContext } from "react";
import type { Dispatch, Draft } from "./draft.ts";

/** The open draft and the one way to change it, for everything inside the statement. */
export const DraftContext = createContext<{ draft: Draft; dispatch: Dispatch } | null>(null);

export function useDraftContext(): { draft: Draft; dispatch: Dispatch } {
  const context = useContext(DraftContext);
  if (!context) throw new Error("A part of the statement stands outside its draft.");
  return context;
}
