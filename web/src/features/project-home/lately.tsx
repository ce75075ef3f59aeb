import { useState } from "react";
import { useLately } from "../../api/activity.ts";
import { Dialog } from "../../components/dialog.tsx";
import { lazyPart } from "../../components/lazy-part.ts";
import { tellTrail } from "./lately-words.ts";
import { TrailList } from "./trail-list.tsx";
import { TrailSeal } from "./trail-seal.tsx";

// Loaded when it is opened: it is no part of the first paint.
const WholeTrail = lazyPart(async () => (await import("./whole-trail.tsx")).WholeTrail);

const SHOWN = 8;

/** Who changed what in the project, the newest first. */
export function Lately({ projectId, ownId }: { projectId: string; ownId: string }) {
  const { data, error } = useLately(projectId);
  const [isOpen, setOpen] = useState(false);
  const told = tellTrail(data ?? [], ownId);
  return (
    <section aria-labelledby="lately">
      <h2 id="lately" className="border-b border-edge pb-2.5 text-15 font-bold">
        Lately
      </h2>
      {!data && !error && <p className="late py-4 text-13 text-quiet">Reading the trail</p>}
      {!data && error && <p className="py-4 text-13 text-quiet">The trail cannot be read just now. {error.message}</p>}
      <TrailList projectId={projectId} told={told.slice(0, SHOWN)} />
      {told.length > SHOWN && (
        <button type="button" className="link" onClick={() => setOpen(true)}>
          The whole trail
        </button>
      )}
      <TrailSeal projectId={projectId} />
      <Dialog isOpen={isOpen} isWide title="The whole trail" onClose={() => setOpen(false)}>
        <WholeTrail projectId={projectId} ownId={ownId} />
      </Dialog>
    </section>
  );
}
