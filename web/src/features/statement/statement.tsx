import type { Fault, Refusal } from "@restband/solver";
import { useUnitSystem } from "../../format/unit-system.ts";
import { useOtherUnits } from "../../format/other-units.ts";
import type { Dispatch, Draft } from "./draft/draft.ts";
import { DraftContext } from "./draft/draft-context.ts";
import { groupOf, groups } from "./groups.ts";
import { StatementGroup } from "./statement-group.tsx";
import { WithoutOrigin } from "./origin/without-origin.tsx";
import { memo, useMemo, useRef, type ReactNode } from "react";

interface StatementProps {
  draft: Draft;
  dispatch: Dispatch;
  /** A valid scenario that this version does not compute: said at the group it concerns. */
  refusal: Refusal["error"] | null;
  /** What the page offers beside the number at a path. */
  aside?: (path: string) => ReactNode;
}

/** What is asked, in five sentences whose values are edited in place. A new result leaves it as it is. */
export const Statement = memo(function Statement({ draft, dispatch, refusal, aside }: StatementProps) {
  // Values typed in a unit beyond our own table are shown in it once that can be read.
  useOtherUnits();
  useUnitSystem();
  const place = useRef<HTMLDivElement>(null);
  const context = useMemo(() => ({ draft, dispatch, aside }), [draft, dispatch, aside]);
  const remarks: readonly Fault[] = refusal?.faults.length ? refusal.faults : refusal ? [refusal] : [];
  return (
    <DraftContext.Provider value={context}>
      <div ref={place}>
        {groups.map((group) => (
          <StatementGroup
            key={group.key}
            group={group}
            remarks={remarks.filter(({ path }) => groupOf(path) === group)}
          />
        ))}
      </div>
      <WithoutOrigin statement={place} />
    </DraftContext.Provider>
  );
});
