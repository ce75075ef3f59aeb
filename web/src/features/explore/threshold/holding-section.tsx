import type { HoldingEnd, HoldingRange, Scenario } from "@restband/solver";
import { DataTable } from "../../../components/data-table.tsx";
import { joined, readInput } from "../../../format/format-quantity.ts";
import { quantityNamed } from "../../../format/quantities.ts";
import { exploreField } from "../explore-field.ts";
import { sayTowards } from "../say-value.ts";
import { useHolding } from "./use-holding.ts";

/** How far each value may go alone before the outcome or a limit changes; computed beside everything else. */
export function HoldingSection({ scenario }: { scenario: Scenario }) {
  const ranges = useHolding(scenario);
  if (ranges === null) return <p className="late text-quiet">Running what lies around each value</p>;
  if (ranges.length === 0)
    return <p className="text-18 text-quiet">There is no value to be moved, or no answer to hold.</p>;
  return (
    <>
      <DataTable
        caption="Room around each value"
        rows={ranges}
        keyOf={({ path }) => path}
        columns={[
          { key: "field", head: "value", cell: ({ path, label }) => exploreField(scenario, path)?.name ?? label },
          { key: "entered", head: "as entered", isFigure: true, cell: (range) => entered(range, scenario) },
          { key: "low", head: "down to", isFigure: true, cell: (range) => endWords(range, "low", scenario) },
          { key: "low-change", head: "where", cell: ({ low }) => changeWords(low, scenario) },
          { key: "high", head: "up to", isFigure: true, cell: (range) => endWords(range, "high", scenario) },
          { key: "high-change", head: "where", cell: ({ high }) => changeWords(high, scenario) },
        ]}
      />
      <p className="mt-2 max-w-(--measure) text-13 text-quiet">
        Each value alone, the others as entered, looked at from a tenth to ten times. Between the values run, more can
        happen unseen.
      </p>
    </>
  );
}

const measureOf = ({ dimension }: HoldingRange, { motion }: Scenario) => ({ dimension, motion });

const entered = (range: HoldingRange, scenario: Scenario): string =>
  joined(readInput(range.entered, measureOf(range, scenario)));

/** Rounded to the side on which it still holds. */
function endWords(range: HoldingRange, side: "low" | "high", scenario: Scenario): string {
  const end = range[side];
  if (end.value === range.entered && end.flip === null) return "–";
  const words = sayTowards(end.value, measureOf(range, scenario), side === "low" ? "up" : "down");
  return end.flip === null ? `beyond ${words}` : words;
}

function changeWords({ change }: HoldingEnd, { limits }: Scenario): string {
  if (change === null) return "nothing changes";
  if (change.kind === "outcome") return "another outcome";
  return `${(quantityNamed(limits[change.limit].quantity)?.label ?? limits[change.limit].quantity).toLowerCase()}: other verdict`;
}
