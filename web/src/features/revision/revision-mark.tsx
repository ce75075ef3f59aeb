import type { RevisionState } from "@restband/api/contract";
import { StateMark } from "../../components/state-mark.tsx";
import { revisionStates } from "../../format/revision-states.ts";

/** How a revision stands. */
export function RevisionMark({ state, className }: { state: RevisionState; className?: string }) {
  const { word, tone, says } = revisionStates[state];
  return <StateMark word={word} tone={tone} says={says} className={className} />;
}
