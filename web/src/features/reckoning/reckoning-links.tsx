import type { Scenario } from "@restband/solver";
import { useState } from "react";
import { ReckoningDialog } from "./reckoning-dialog.tsx";
import { reckoningsFor, type Reckoning } from "./reckonings.ts";
import type { Taken } from "./taken.ts";

interface ReckoningLinksProps {
  path: string;
  scenario: Scenario;
  /** Names the open scenario, as in `ReckoningBodyProps`. */
  keptUnder: string;
  onTake: (taken: readonly Taken[]) => void;
}

/** The ways to the value at a path, as links; nothing where there is none. */
export function ReckoningLinks(props: ReckoningLinksProps) {
  const reckonings = reckoningsFor(props.path, props.scenario.motion);
  if (reckonings.length === 0) return null;
  return (
    <div className="mt-1.5 flex flex-wrap gap-x-4 text-13">
      {reckonings.map((reckoning) => (
        <ReckoningLink key={reckoning.key} reckoning={reckoning} {...props} />
      ))}
    </div>
  );
}

function ReckoningLink({ reckoning, onTake, ...props }: ReckoningLinksProps & { reckoning: Reckoning }) {
  const [isOpen, setOpen] = useState(false);
  const take = (taken: readonly Taken[]): void => {
    onTake(taken);
    setOpen(false);
  };
  return (
    <>
      <button type="button" className="link hit" aria-haspopup="dialog" onClick={() => setOpen(true)}>
        {reckoning.link}
      </button>
      <ReckoningDialog {...props} isOpen={isOpen} reckoning={reckoning} onTake={take} onClose={() => setOpen(false)} />
    </>
  );
}
