import { curesOf, type Cure, type Cures, type Exploring, type Scenario } from "@restband/solver";
import { useEffect, useMemo } from "react";
import { Button } from "../../../components/button.tsx";
import { DataTable } from "../../../components/data-table.tsx";
import { ErrorNote } from "../../../components/error-note.tsx";
import { ProgressLine } from "../../../components/progress-line.tsx";
import { useExploring } from "../../../compute/use-exploring.ts";
import { useRun } from "../../../compute/use-run.ts";
import { formatNumber } from "../../../format/format-number.ts";
import { joined, readInput } from "../../../format/format-quantity.ts";
import { quantityNamed } from "../../../format/quantities.ts";
import { capitalised, listed } from "../../../format/words.ts";
import { unitFor } from "../../../format/units.ts";
import { exploreField } from "../explore-field.ts";
import type { ExploreFrame } from "../explore-frame.ts";
import { rateWords } from "../rate-words.ts";
import { sayTowards, type Side } from "../say-value.ts";

/** For each limit that is broken as entered: the change needed in each sensible field alone, the smallest first. */
export function CuresSection({ scenario, open }: ExploreFrame) {
  const broken = useBroken(scenario);
  const run = useExploring<Cures[]>();
  const { begin } = run;
  useEffect(() => {
    if (broken && broken.length > 0) void begin(allCures(scenario, broken));
  }, [begin, broken, scenario]);
  if (scenario.limits.length === 0)
    return (
      <p className="text-18 text-quiet">The scenario has no limits. Set one in its statement to have cures searched.</p>
    );
  if (broken === null) return <p className="late text-quiet">Running the scenario</p>;
  if (broken.length === 0) return <p className="text-18">No limit is broken as entered: nothing is to be cured.</p>;
  return (
    <div aria-live="polite">
      {run.state.kind === "running" && (
        <ProgressLine
          label="Searching cures"
          fraction={run.state.total > 0 ? run.state.done / run.state.total : null}
          remark={rateWords(run.state.done, run.state.total, run.state.elapsed, "runs")}
          onCancel={run.stop}
        />
      )}
      {run.state.kind === "failed" && <ErrorNote>{run.state.message}</ErrorNote>}
      {run.state.kind === "stopped" && (
        <Button onClick={() => void begin(allCures(scenario, broken))}>Search the cures</Button>
      )}
      {run.state.kind === "done" &&
        run.state.value.map((cures) => <CuresTable key={cures.limit} cures={cures} scenario={scenario} open={open} />)}
    </div>
  );
}

const runOptions = { samples: 0, events: false, energy: false, quantities: [] };

/** Places of the limits that are broken as entered; null until that is known. */
function useBroken(scenario: Scenario): readonly number[] | null {
  const { computed } = useRun(scenario, runOptions);
  return useMemo(() => {
    if (!computed) return null;
    if ("refusal" in computed) return [];
    return computed.result.limits.flatMap(({ kept }, i) => (kept === false ? [i] : []));
  }, [computed]);
}

function* allCures(scenario: Scenario, limits: readonly number[]): Exploring<Cures[]> {
  const all: Cures[] = [];
  for (const limit of limits) all.push(yield* curesOf(scenario, limit));
  return all.filter(({ isBroken }) => isBroken);
}

interface CuresTableProps extends ExploreFrame {
  cures: Cures;
}

function CuresTable({ cures: { limit, cures, withoutCure }, scenario, open }: CuresTableProps) {
  const name = quantityNamed(scenario.limits[limit].quantity)?.label ?? scenario.limits[limit].quantity;
  if (cures.length === 0)
    return (
      <p className="mb-8 max-w-(--measure)">
        <strong>{name}:</strong> {outOfReach(withoutCure, scenario)}
      </p>
    );
  return (
    <div className="mb-8">
      <DataTable
        caption={`${name}: any one of these cures it`}
        isCaptionShown
        rows={cures}
        keyOf={({ path }) => path}
        columns={[
          { key: "change", head: "change", cell: ({ path, label }) => exploreField(scenario, path)?.name ?? label },
          { key: "now", head: "now", isFigure: true, cell: (cure) => entered(cure, scenario) },
          { key: "needed", head: "needed", isFigure: true, cell: (cure) => needed(cure, scenario) },
          {
            key: "remark",
            head: "remark",
            cell: (cure) => <span className="block min-w-52 whitespace-normal">{remark(cure)}</span>,
          },
          ...(open
            ? [
                {
                  key: "act",
                  head: <span className="sr-only">act</span>,
                  cell: (cure: Cure) => (
                    <Button
                      onClick={() =>
                        open(
                          cure.scenario,
                          `${exploreField(scenario, cure.path)?.name ?? cure.label} ${valueWords(cure, scenario)}`,
                        )
                      }
                    >
                      Make a scenario
                    </Button>
                  ),
                },
              ]
            : []),
        ]}
      />
      {withoutCure.length > 0 && (
        <p className="mt-2 max-w-(--measure) text-13 text-quiet">{capitalised(outOfReach(withoutCure, scenario))}</p>
      )}
    </div>
  );
}

/** What does not cure a limit alone, as far as was looked. */
function outOfReach(paths: Cures["withoutCure"], scenario: Scenario): string {
  const names = paths.map(({ path, label }) => exploreField(scenario, path)?.name ?? label);
  return `out of reach alone by ${listed(names)}, from a tenth to ten times of what is entered.`;
}

const measureOf = (scenario: Scenario, { dimension }: Cure) => ({ dimension, motion: scenario.motion });
const sideOf = ({ value, entered: before }: Cure): Side => (value > before ? "up" : "down");

const entered = (cure: Cure, scenario: Scenario): string => joined(readInput(cure.entered, measureOf(scenario, cure)));

/** Rounded to the side on which the limit is kept. */
const valueWords = (cure: Cure, scenario: Scenario): string => {
  const measure = measureOf(scenario, cure);
  return sayTowards(cure.value, measure, sideOf(cure), { unit: unitFor(cure.value, measure) });
};

const needed = (cure: Cure, scenario: Scenario): string =>
  `${cure.value > cure.entered ? "≥" : "≤"} ${valueWords(cure, scenario)}`;

function remark({ entered: before, value, keepsOthers }: Cure): string {
  const ratio = before === 0 ? null : value / before;
  const size = ratio === null ? "from nothing" : sizeWords(ratio);
  return keepsOthers ? `${size}, all other limits kept` : `${size}; another limit stays broken`;
}

function sizeWords(ratio: number): string {
  if (ratio >= 2) return `${formatNumber(ratio, 3)} times as much`;
  const percent = formatNumber(100 * Math.abs(ratio - 1), 2);
  return ratio >= 1 ? `${percent} % more` : `${percent} % less`;
}
