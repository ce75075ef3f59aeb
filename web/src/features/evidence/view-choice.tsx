import { Option } from "./option.tsx";

/** A part of a run, s. */
export interface Range {
  readonly from: number;
  readonly to: number;
}

interface ViewChoiceProps {
  range: Range;
  /** End of the whole run. */
  whole: number;
  /** The last cycles, where there are any. */
  last: Range | null;
  /** The cursor, which closer and wider go about. */
  t: number;
  /** Null: the whole run. */
  onChoose: (range: Range | null) => void;
}

const FACTOR = 2;
/** Not closer than this share of the run. */
const CLOSEST = 1e-5;

/** What part of the run is seen. */
export function ViewChoice({ range, whole, last, t, onChoose }: ViewChoiceProps) {
  const isWhole = range.from === 0 && range.to === whole;
  const isLast = last !== null && range.from === last.from && range.to === last.to;
  const width = range.to - range.from;
  const about = (next: number): void => onChoose(next >= whole ? null : partAbout(t, next, whole));
  return (
    <div className="ml-auto flex flex-wrap items-center gap-x-3 text-13" role="group" aria-label="Part of the run">
      <Option label="whole run" isChosen={isWhole} onChoose={() => onChoose(null)} />
      {last && <Option label="last cycles" isChosen={isLast} onChoose={() => onChoose(last)} />}
      <Option label="closer" isDisabled={width / FACTOR < CLOSEST * whole} onChoose={() => about(width / FACTOR)} />
      <Option label="wider" isDisabled={isWhole} onChoose={() => about(width * FACTOR)} />
    </div>
  );
}

function partAbout(t: number, width: number, whole: number): Range {
  const from = Math.min(Math.max(0, t - width / 2), whole - width);
  return { from, to: from + width };
}
