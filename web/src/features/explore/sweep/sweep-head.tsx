import type { StoredExploration } from "@restband/api/contract";
import type { LimitLine, Scenario } from "@restband/solver";
import { proportionWords } from "./proportion-words.ts";
import type { SweepCells } from "./sweep-cells.ts";
import { sweepHeadline } from "./sweep-headline.ts";
import { SweepSentence } from "./sweep-sentence.tsx";

interface SweepHeadProps {
  stored: StoredExploration;
  /** The one whose cells are run. */
  scenario: Scenario;
  cells: SweepCells;
  lines: readonly LimitLine[];
  edition: number;
}

/** What the sweep says, large; what was asked, beside it. */
export function SweepHead({ stored, scenario, cells, lines }: SweepHeadProps) {
  const rule = proportionWords(lines, cells.plan, scenario);
  return (
    <div className="grid gap-x-12 gap-y-5 pb-8 wide:grid-cols-[minmax(0,1fr)_388px]">
      <div>
        <h1 className="text-24 leading-[1.25] font-semibold desk:text-34">{rule ?? sweepHeadline(cells)}</h1>
        {rule && <p className="mt-3 text-18 text-quiet">{sweepHeadline(cells)}</p>}
      </div>
      <div>
        <SweepSentence plan={cells.plan} scenario={scenario} />
        {stored.isStale && (
          <p className="mt-3 border-l-4 border-band-line pl-3 text-15">
            The scenario has other numbers by now. This map is of its version {stored.scenarioVersion}.
          </p>
        )}
      </div>
    </div>
  );
}
