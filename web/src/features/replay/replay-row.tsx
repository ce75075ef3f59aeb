import type { Replay, Revision } from "@restband/api/contract";
import { useState } from "react";
import { DataTable, type Column } from "../../components/data-table.tsx";
import { Figure } from "../../components/figure.tsx";
import { PowerText } from "../../components/power-text.tsx";
import { sensitiveWords, VerdictMark } from "../../components/verdict-mark.tsx";
import { formatNumber } from "../../format/format-number.ts";
import { readQuantity } from "../../format/format-quantity.ts";
import { sayWhen } from "../../format/when.ts";
import { deviationMeasure, deviationName, largestWords, shareOfPeak, wayWords } from "./replay-words.ts";

interface ReplayRowProps {
  replay: Replay;
  revision: Revision;
  ownId: string;
}

/** One replay: how, by whom and when, its largest deviation and its verdict; all figures on request. */
export function ReplayRow({ replay, revision, ownId }: ReplayRowProps) {
  const [isOpen, setOpen] = useState(false);
  const { content, result } = revision;
  const who = replay.by.accountId === ownId ? "you" : replay.by.name;
  const version = replay.solverVersion === result.solverVersion ? "" : `, solver ${replay.solverVersion}`;
  return (
    <li className="border-b border-line py-2">
      <div className="grid items-baseline gap-x-6 gap-y-1 desk:grid-cols-[250px_minmax(0,1fr)_90px_240px]">
        <p>
          {wayWords(replay.way, result.method)}
          {version}
        </p>
        <p className="min-w-0 text-15">
          <span className="text-13 text-quiet">largest difference </span>
          <PowerText text={largestWords(replay, content.motion)} />
        </p>
        <VerdictMark verdict={replay.verdict} />
        <p className="text-13 text-quiet desk:text-right">
          {who}, <time dateTime={replay.at}>{sayWhen(new Date(replay.at))}</time>
          {" · "}
          <button type="button" className="link" aria-expanded={isOpen} onClick={() => setOpen(!isOpen)}>
            {isOpen ? "hide the figures" : "all figures"}
          </button>
        </p>
      </div>
      {replay.verdict === "sensitive" && (
        <p className="mt-1 text-13 text-quiet">
          <PowerText text={sensitiveWords} />
        </p>
      )}
      {replay.convergence.length > 0 && <Convergence replay={replay} />}
      {isOpen && <Figures replay={replay} motion={content.motion} />}
    </li>
  );
}

/** How far each tolerance was from the frozen run: what falls with the tolerance is the integration's own error. */
function Convergence({ replay }: { replay: Replay }) {
  return (
    <p className="mt-1 text-13 text-quiet">
      <PowerText
        text={replay.convergence
          .map(({ tolerance, relative }) => `at tolerance ${formatNumber(tolerance, 1)}: ${shareOfPeak(relative)}`)
          .join("; ")}
      />
    </p>
  );
}

type Deviation = Replay["deviations"][number];

function Figures({ replay, motion }: { replay: Replay; motion: "linear" | "angular" }) {
  const value = (which: 0 | 1) => (deviation: Deviation) => (
    <Figure {...readQuantity(deviation.values[which], deviationMeasure(deviation, motion), { digits: 12 })} />
  );
  const columns: Column<Deviation>[] = [
    { key: "what", head: "", cell: (deviation) => deviationName(deviation) },
    { key: "frozen", head: "frozen", isFigure: true, cell: value(0) },
    { key: "replay", head: "replay", isFigure: true, cell: value(1) },
    {
      key: "absolute",
      head: "apart",
      isFigure: true,
      cell: (deviation) => (
        <Figure {...readQuantity(deviation.absolute, deviationMeasure(deviation, motion), { digits: 2 })} />
      ),
    },
    {
      key: "relative",
      head: "share of the peak",
      isFigure: true,
      cell: ({ relative }) => <PowerText text={formatNumber(relative, 2)} />,
    },
  ];
  return (
    <div className="mt-3">
      {replay.differences.map((difference) => (
        <p key={difference} className="mb-2 text-broken">
          {difference}
        </p>
      ))}
      <p className="mb-2 text-13 text-quiet">
        Allowed: <PowerText text={shareOfPeak(replay.allowed)} /> in each unit. Largest first.
      </p>
      <DataTable
        caption="All figures of this replay"
        columns={columns}
        rows={replay.deviations}
        keyOf={({ what, event }) => `${what} ${event ?? ""}`}
      />
    </div>
  );
}
