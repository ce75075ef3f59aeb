import type { Revision, StoredScenario } from "@restband/api/contract";
import type { Scenario } from "@restband/solver";
import { useEffect, useState } from "react";
import { useLocation, useNavigate } from "react-router-dom";
import { Button } from "../components/button.tsx";
import { Dialog } from "../components/dialog.tsx";
import { lazyPart } from "../components/lazy-part.ts";
import { Section } from "../components/section.tsx";
import { announce } from "../components/status.tsx";
import type { Run } from "../compute/use-run.ts";
import type { Freezable } from "../features/revision/freeze-form.tsx";
import { RevisionList } from "../features/revision/revision-list.tsx";
import { withoutOrigin } from "../features/statement/origin/without-origin.tsx";
import type { Saving } from "../features/statement/saving/autosave.ts";
import { isSameScenario } from "../features/statement/saving/work.ts";
import { paths } from "../paths.ts";

const FreezeForm = lazyPart(async () => (await import("../features/revision/freeze-form.tsx")).FreezeForm);

interface RevisionsSectionProps {
  /** The version the server has. */
  stored: StoredScenario;
  ownId: string;
  canEdit: boolean;
  run: Run;
  /** What is shown. */
  inForce: Scenario;
  saving: Saving;
  /** Fields to put right. */
  faults: number;
}

/** The revisions of the open scenario, and the way to freeze another. */
export function RevisionsSection(props: RevisionsSectionProps) {
  const { stored, ownId, canEdit } = props;
  const { projectId, id: scenarioId, digest } = stored;
  const [frozen, setFrozen] = useState<Freezable | null>(null);
  const navigate = useNavigate();
  useArrival(props.run.computed !== null);
  const open = (): void => {
    const wanted = freezableOf(props);
    if (typeof wanted === "string") announce(wanted);
    else setFrozen(wanted);
  };
  const goTo = (revision: Revision): void => {
    announce(`Revision ${revision.number} is frozen.`);
    void navigate(paths.revision(projectId, revision.id));
  };
  const action = canEdit && (
    <Button aria-haspopup="dialog" onClick={open}>
      Freeze a revision
    </Button>
  );
  return (
    <Section id="revisions" name="Revisions" help="Frozen for a review or for the record.">
      <RevisionList {...{ projectId, scenarioId, ownId, digest, action }} />
      <Dialog isOpen={frozen !== null} isWide title="Freeze a revision" onClose={() => setFrozen(null)}>
        {frozen && (
          <FreezeForm subject={frozen} missing={missingIn(frozen)} onFrozen={goTo} onClose={() => setFrozen(null)} />
        )}
      </Dialog>
    </Section>
  );
}

/** Who followed a link to the revisions is taken to them, once the answer above has its room. */
function useArrival(isAnswered: boolean): void {
  const { hash } = useLocation();
  useEffect(() => {
    if (hash === "#revisions" && isAnswered)
      requestAnimationFrame(() => document.getElementById("revisions")?.scrollIntoView());
  }, [hash, isAnswered]);
}

/** What can be frozen: the stored version with its answer; a sentence where there is no such thing just now. */
function freezableOf({ stored, run, inForce, saving, faults }: RevisionsSectionProps): Freezable | string {
  const { computed, isStale } = run;
  if (faults > 0) return "Put every field right first: what is frozen is what is shown.";
  if (saving.kind !== "saved" || !isSameScenario(inForce, stored.content))
    return "The last change is not saved yet. Try again in a moment.";
  if (!computed || isStale) return "The answer is not there yet. Try again in a moment.";
  if ("refusal" in computed) return "This version computes no answer to it, so there is nothing to freeze.";
  const { projectId, id: scenarioId, version, digest } = stored;
  return { projectId, scenarioId, version, digest, scenario: computed.scenario, result: computed.result };
}

/** What the revision will list. */
const missingIn = ({ scenario }: Freezable): string[] => withoutOrigin(scenario).map(({ label }) => label);
