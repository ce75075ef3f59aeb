import type { Scenario, Share, ToleranceSummary } from "@restband/solver";
import { DataTable } from "../../../components/data-table.tsx";
import { formatNumber } from "../../../format/format-number.ts";
import { outcomeWords } from "../../../format/outcomes.ts";
import { quantityNamed } from "../../../format/quantities.ts";
import { Refused } from "./refused.tsx";
import { sayChance, sayInterval } from "./study-words.ts";

interface LimitChancesProps {
  summary: ToleranceSummary;
  scenario: Scenario;
}

interface Row {
  readonly name: string;
  readonly share: Share;
}

/** How likely each limit is kept, each outcome comes, with intervals; what was refused is counted and bounds them. */
export function LimitChances({ summary, scenario }: LimitChancesProps) {
  const { limits, allLimits, outcomes, refused } = summary;
  const kept: Row[] = limits.map(({ kept: share }, i) => {
    const { quantity } = scenario.limits[i];
    return { name: `${quantityNamed(quantity)?.label ?? quantity} kept`, share };
  });
  return (
    <section aria-label="Limits and outcomes">
      {kept.length > 0 && (
        <ShareTable
          caption="How likely the limits are kept"
          rows={[
            ...kept,
            ...(allLimits && kept.length > 1 ? [{ name: "All of them together", share: allLimits }] : []),
          ]}
        />
      )}
      <ShareTable
        caption="What becomes of the draws"
        rows={outcomes.map(({ outcome, share }) => ({ name: outcomeWords[outcome], share }))}
      />
      {refused.length > 0 && <Refused summary={summary} scenario={scenario} />}
      {limits.length > 0 && <Convergence summary={summary} scenario={scenario} />}
    </section>
  );
}

function ShareTable({ caption, rows }: { caption: string; rows: readonly Row[] }) {
  return (
    <DataTable
      className="mb-6 max-w-[860px]"
      caption={caption}
      isCaptionShown
      rows={rows}
      keyOf={({ name }) => name}
      columns={[
        { key: "name", head: "what", cell: ({ name }) => name },
        { key: "share", head: "share", isFigure: true, cell: ({ share }) => sayChance(share.estimate.value) },
        { key: "interval", head: "95 % interval", isFigure: true, cell: ({ share }) => sayInterval(share.estimate) },
        { key: "bounded", head: "with refused draws", isFigure: true, cell: ({ share }) => sayInterval(share.bounded) },
        {
          key: "count",
          head: "draws",
          isFigure: true,
          cell: ({ share }) => `${formatNumber(share.count, 9)} of ${formatNumber(share.of, 9)}`,
        },
      ]}
    />
  );
}

/** How the share of the first limit has settled with the draws. */
function Convergence({ summary: { limits }, scenario }: LimitChancesProps) {
  return (
    <details>
      <summary className="link w-fit">How it has settled with the draws</summary>
      {limits.map(({ convergence }, i) => (
        <DataTable
          key={i}
          className="mt-4 max-w-[560px]"
          caption={`${quantityNamed(scenario.limits[i].quantity)?.label ?? ""} kept`}
          isCaptionShown
          rows={convergence}
          keyOf={({ runs }) => String(runs)}
          columns={[
            { key: "runs", head: "after draws", isFigure: true, cell: ({ runs }) => formatNumber(runs, 9) },
            { key: "share", head: "share", isFigure: true, cell: ({ estimate }) => sayChance(estimate.value) },
            { key: "interval", head: "95 % interval", isFigure: true, cell: ({ estimate }) => sayInterval(estimate) },
          ]}
        />
      ))}
    </details>
  );
}
