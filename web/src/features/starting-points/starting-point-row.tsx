import type { ReactNode } from "react";
import { Button } from "../../components/button.tsx";

interface StartingPointRowProps {
  name: string;
  why: string;
  /** What its answer shows; nothing for plain numbers. */
  shows?: string;
  /** The motion strip, computed here. */
  strip: ReactNode;
  isBusy: boolean;
  onBegin: () => void;
}

/** One case to begin from: how it moves | what it asks and what its answer shows | the way in. */
export function StartingPointRow({ name, why, shows, strip, isBusy, onBegin }: StartingPointRowProps) {
  return (
    <li className="grid items-start gap-x-7 gap-y-3 border-b border-line py-4 desk:grid-cols-[188px_minmax(0,1fr)_auto]">
      <div className="min-h-11 max-desk:order-2">{strip}</div>
      <div className="min-w-0 max-w-(--measure)">
        <h2 className="text-18 font-bold">{name}</h2>
        <p>{why}</p>
        {shows && <p className="mt-1 text-quiet">{shows}</p>}
      </div>
      <div className="max-desk:order-3">
        <Button isBusy={isBusy} aria-label={`Begin with: ${name}`} onClick={onBegin}>
          Begin
        </Button>
      </div>
    </li>
  );
}
