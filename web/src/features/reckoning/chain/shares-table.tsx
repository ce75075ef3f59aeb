import { DataTable, type Column } from "../../../components/data-table.tsx";
import { PowerText } from "../../../components/power-text.tsx";
import { say, sayShare } from "../../../format/format-quantity.ts";
import type { Measure } from "../../../format/unit.ts";
import type { Kit } from "./kit.ts";
import type { Share } from "./network.ts";

/** What each member is by itself, what the body feels of it, and its part in the whole, drawn and in figures. */
export function SharesTable({ shares, kit, measure }: { shares: readonly Share[]; kit: Kit; measure: Measure }) {
  const columns: readonly Column<Share>[] = [
    { key: "name", head: "Member", cell: ({ name }) => name, className: "max-desk:whitespace-normal" },
    { key: "share", head: kit.shareHead, isFigure: true, cell: ({ share }) => sayShare(share) },
    {
      key: "bar",
      head: <span className="sr-only">Drawn</span>,
      cell: ({ share }) => <Bar share={share} />,
      className: "w-32 max-desk:hidden",
    },
    {
      key: "own",
      head: "by itself",
      isFigure: true,
      cell: (share) => <PowerText text={say(share.value, share.measure, { unit: share.unit })} />,
    },
    { key: "seen", head: "at the body", isFigure: true, cell: ({ seen }) => <PowerText text={say(seen, measure)} /> },
  ];
  return (
    <DataTable
      caption="Each member’s part in the whole"
      columns={columns}
      rows={shares}
      keyOf={({ id }) => String(id)}
    />
  );
}

function Bar({ share }: { share: number }) {
  return (
    <svg width="120" height="10" aria-hidden="true" className="block">
      <rect x="0.5" y="0.5" width="119" height="9" className="fill-none stroke-line" />
      <rect width={120 * share} height="10" className="fill-slip" />
    </svg>
  );
}
