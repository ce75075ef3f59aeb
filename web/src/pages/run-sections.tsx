import { Suspense } from "react";
import { lazyPart } from "../components/lazy-part.ts";
import { Section } from "../components/section.tsx";
import type { Computed } from "../compute/use-run.ts";
import { Cautions } from "../features/cautions/cautions.tsx";
import { useCursor, viewOf, type Cursor } from "./cursor.ts";

const Evidence = lazyPart(async () => (await import("../features/evidence/evidence.tsx")).Evidence);
const Checks = lazyPart(async () => (await import("../features/checks/checks.tsx")).Checks);
const EventTable = lazyPart(async () => (await import("../features/evidence/event-table.tsx")).EventTable);

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
      <Section
        id="evidence"
        name="Evidence"
        help={
          <>
            One cursor for everything. <span className="whitespace-nowrap">← →</span> next event, space plays.
          </>
        }
      >
        <Suspense fallback={<div className="min-h-[600px]" />}>
          <Evidence view={view} t={t} onMove={cursor.set} isStale={isStale} />
        </Suspense>
      </Section>
      <Section id="checks" name="Checks" help="The run checks itself each time it is computed.">
        <Suspense fallback={<div className="min-h-[420px]" />}>
          <Checks scenario={view.scenario} result={view.result} />
        </Suspense>
        <h3 className="mt-8 mb-2 text-15 font-semibold">Events</h3>
        <Suspense fallback={<div className="min-h-[380px]" />}>
          <EventTable view={view} t={t} onMove={cursor.set} />
        </Suspense>
      </Section>
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
