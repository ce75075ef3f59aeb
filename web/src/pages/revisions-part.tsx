import type { Revision } from "@restband/api/contract";
import { Suspense, useState } from "react";
import { useNavigate } from "react-router-dom";
import { Button } from "../components/button.tsx";
import { Dialog } from "../components/dialog.tsx";
import { lazyPart } from "../components/lazy-part.ts";
import { announce } from "../components/status.tsx";
import type { Freezable } from "../features/revision/freeze-form.tsx";
import { RevisionList } from "../features/revision/revision-list.tsx";
import { pathsWithoutOrigin } from "../features/statement/origin/without-origin.tsx";
import { paths } from "../paths.ts";

const FreezeForm = lazyPart(async () => (await import("../features/revision/freeze-form.tsx")).FreezeForm);

interface RevisionsPartProps {
  projectId: string;
  scenarioId: string;
  ownId: string;
  /** Digest of the version as it is stored. */
  digest: string;
  canEdit: boolean;
  /** Asked when somebody wants to freeze: what would be frozen, or a sentence where nothing can be just now. */
  subject: () => Freezable | string;
}

/** The revisions of the open scenario, and the way to freeze another. */
export function RevisionsPart({ projectId, scenarioId, ownId, digest, canEdit, subject }: RevisionsPartProps) {
  const [frozen, setFrozen] = useState<Freezable | null>(null);
  const navigate = useNavigate();
  const open = (): void => {
    const wanted = subject();
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
    <>
      <RevisionList {...{ projectId, scenarioId, ownId, digest, action }} />
      <Dialog isOpen={frozen !== null} isWide title="Freeze a revision" onClose={() => setFrozen(null)}>
        <Suspense fallback={<p className="late text-quiet">Opening</p>}>
          {frozen && (
            <FreezeForm
              subject={frozen}
              missing={pathsWithoutOrigin(frozen.scenario).map(({ label }) => label)}
              onFrozen={goTo}
              onClose={() => setFrozen(null)}
            />
          )}
        </Suspense>
      </Dialog>
    </>
  );
}
