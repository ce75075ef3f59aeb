import { PlainSelect } from "../../components/select.tsx";
import { Option } from "./option.tsx";
import { isClosest, isWhole, type Range } from "./part-of-run.ts";
import { lastCycles, type RunView } from "./run-view.ts";
import { SpanFields } from "./span-fields.tsx";
import type { SeenPart } from "./use-part.ts";

const counts = [1, 2, 3, 5, 10, 20, 50, 100] as const;

/** What part of the run is seen: all of it, its last cycles, or a span given by its two ends. */
export function ViewChoice({ view, part }: { view: RunView; part: SeenPart }) {
  const { range, choose, zoom } = part;
  const isAll = isWhole(range, view.end);
  return (
    <div
      className="flex flex-wrap items-center gap-x-4 gap-y-1 text-13 desk:ml-auto"
      role="group"
      aria-label="Part of the run"
    >
      <Option label="whole run" isChosen={isAll} onChoose={() => choose(null)} />
      <LastCycles view={view} range={range} onChoose={choose} />
      <SpanFields part={part} whole={view.end} />
      <Option label="closer" isDisabled={isClosest(range, view.end)} onChoose={() => zoom(0.5)} />
      <Option label="wider" isDisabled={isAll} onChoose={() => zoom(2)} />
    </div>
  );
}

interface LastCyclesProps {
  view: RunView;
  range: Range;
  onChoose: (range: Range) => void;
}

/** How many of the last cycles; nothing where a run has none. */
function LastCycles({ view, range, onChoose }: LastCyclesProps) {
  const cycles = counts.flatMap((count) => {
    const last = lastCycles(view, count);
    return last ? [{ count, last }] : [];
  });
  if (cycles.length === 0) return null;
  const chosen = cycles.find(({ last }) => range.from === last.from && range.to === last.to);
  const choices = cycles.map(({ count }) => ({
    value: String(count),
    label: count === 1 ? "last cycle" : `last ${count} cycles`,
  }));
  return (
    <PlainSelect
      isQuiet
      aria-label="Last cycles"
      choices={[...(chosen ? [] : [{ value: "", label: "last cycles" }]), ...choices]}
      value={chosen ? String(chosen.count) : ""}
      onChange={({ target }) => {
        const last = lastCycles(view, Number(target.value));
        if (last) onChoose(last);
      }}
    />
  );
}
