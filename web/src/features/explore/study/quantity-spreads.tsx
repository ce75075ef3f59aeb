import type { QuantitySpread, Scenario, ToleranceSummary } from "@restband/solver";
import { useState } from "react";
import { DataTable } from "../../../components/data-table.tsx";
import { SelectField } from "../../../components/select.tsx";
import { formatNumber } from "../../../format/format-number.ts";
import { say } from "../../../format/format-quantity.ts";
import { measureOfQuantity, quantityNamed } from "../../../format/quantities.ts";
import { exploreField } from "../explore-field.ts";
import { Histogram } from "./histogram.tsx";
import { sayChance, sayInterval } from "./study-words.ts";

/** How one quantity scatters: its histogram, percentiles, and what it hangs on. */
export function QuantitySpreads({ summary, scenario }: { summary: ToleranceSummary; scenario: Scenario }) {
  const [name, setName] = useState("");
  const { spreads } = summary;
  const spread = spreads.find(({ quantity }) => quantity === name) ?? spreads.at(0);
  if (!spread) return null;
  const measure = measureOfQuantity(spread.quantity, scenario.motion);
  const words = (value: number): string => say(value, measure, { digits: 4 });
  return (
    <section aria-label="How quantities scatter">
      <SelectField
        label="Quantity"
        className="mb-5 w-80 max-w-full"
        choices={spreads.map(({ quantity }) => ({
          value: quantity,
          label: quantityNamed(quantity)?.label ?? quantity,
        }))}
        value={spread.quantity}
        onChange={(event) => setName(event.target.value)}
      />
      {spread.count === 0 ? (
        <p className="text-quiet">No draw has a value of this.</p>
      ) : (
        <div className="grid gap-x-12 gap-y-8 wide:grid-cols-2">
          <div className="min-w-0">
            <Histogram spread={spread} measure={measure} />
            <p className="mt-2 text-13 text-quiet">
              Mean {words(spread.mean)}, deviation {words(spread.deviation)}, from {words(spread.least)} to{" "}
              {words(spread.largest)}, of {formatNumber(spread.count, 9)} draws.
            </p>
          </div>
          <div className="min-w-0">
            <Influences spread={spread} scenario={scenario} />
            <Percentiles spread={spread} words={words} />
          </div>
        </div>
      )}
    </section>
  );
}

function Influences({ spread: { influences }, scenario }: { spread: QuantitySpread; scenario: Scenario }) {
  return (
    <DataTable
      className="mb-6"
      caption="What matters most"
      isCaptionShown
      rows={influences}
      keyOf={({ path }) => path}
      columns={[
        { key: "name", head: "value", cell: ({ path }) => exploreField(scenario, path)?.name ?? path },
        {
          key: "rank",
          head: "rank correlation",
          isFigure: true,
          cell: ({ rankCorrelation }) => (rankCorrelation === null ? "–" : formatNumber(rankCorrelation, 2)),
        },
        {
          key: "share",
          head: "share of the variance",
          isFigure: true,
          cell: ({ varianceShare }) =>
            varianceShare === null
              ? "from 1000 values on"
              : `${sayChance(varianceShare.value)} (${sayInterval(varianceShare)})`,
        },
      ]}
    />
  );
}

function Percentiles({ spread: { percentiles }, words }: { spread: QuantitySpread; words: (value: number) => string }) {
  return (
    <DataTable
      caption="Percentiles"
      isCaptionShown
      rows={percentiles}
      keyOf={({ share }) => String(share)}
      columns={[
        { key: "share", head: "of the draws", cell: ({ share }) => `${formatNumber(100 * share)} % lie below` },
        { key: "value", head: "value", isFigure: true, cell: ({ value }) => words(value) },
      ]}
    />
  );
}
