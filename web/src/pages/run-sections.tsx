import { Section } from "../components/section.tsx";
import type { Computed } from "../compute/use-run.ts";
import { Cautions } from "../features/cautions/cautions.tsx";
import { useCursor, viewOf, type Cursor } from "./cursor.ts";
import { eventKeys, RunEvidence } from "./run-evidence.tsx";

interface RunSectionsProps {
  computed: Computed | null;
  cursor: Cursor;
  isStale: boolean;
}

/** Everything that shows the run itself, under one time cursor. */
export function RunSections({ computed, cursor, isStale }: RunSectionsProps) {
  const view = computed && viewOf(computed);
  const t = useCursor(cursor, view);
  if (!computed || !view) return computed && <CautionSection computed={computed} />;
  return (
    <>
      <RunEvidence
        view={view}
        t={t}
        onMove={cursor.set}
        isStale={isStale}
        help={{
          evidence: <>One cursor for everything. {eventKeys} next event, space plays.</>,
          checks: "The run checks itself each time it is computed.",
        }}
      />
      <CautionSection computed={computed} />
    </>
  );
}

function CautionSection({ computed }: { computed: Computed }) {
  return (
    <Section name="Cautions" help="Always shown where they apply.">
      <Cautions scenario={computed.scenario} result={"result" in computed ? computed.result : null} />
    </Section>
  );
}
