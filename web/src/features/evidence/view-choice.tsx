import { Option } from "./option.tsx";
import { isClosest, isWhole, type Range } from "./part-of-run.ts";
import type { SeenPart } from "./use-part.ts";

interface ViewChoiceProps {
  part: SeenPart;
  /** End of the whole run. */
  whole: number;
  /** The last cycles, where there are any. */
  last: Range | null;
}

/** What part of the run is seen. */
export function ViewChoice({ part: { range, choose, zoom }, whole, last }: ViewChoiceProps) {
  const isAll = isWhole(range, whole);
  const isLast = last !== null && range.from === last.from && range.to === last.to;
  return (
    <div className="ml-auto flex flex-wrap items-center gap-x-3 text-13" role="group" aria-label="Part of the run">
      <Option label="whole run" isChosen={isAll} onChoose={() => choose(null)} />
      {last && <Option label="last cycles" isChosen={isLast} onChoose={() => choose(last)} />}
      <Option label="closer" isDisabled={isClosest(range, whole)} onChoose={() => zoom(0.5)} />
      <Option label="wider" isDisabled={isAll} onChoose={() => zoom(2)} />
    </div>
  );
}
