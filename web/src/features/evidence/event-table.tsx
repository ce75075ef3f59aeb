import type { MotionEvent } from "@restband/solver";
import { useVirtualizer } from "@tanstack/react-virtual";
import { useRef } from "react";
import { classNames } from "../../components/class-names.ts";
import { announce } from "../../components/status.tsx";
import { formatNumber } from "../../format/format-number.ts";
import { columnsOf, eventsCsv, type EventColumn } from "./event-columns.ts";
import { eventWords } from "./event-words.ts";
import type { RunView } from "./run-view.ts";

interface EventTableProps {
  view: RunView;
  /** The cursor's time: its row is marked, and a press on a row moves it there. */
  t: number;
  onMove: (t: number) => void;
}

const ROW = 34;

/** Every event of the run. It scrolls within itself; of a long list only the rows in sight are there. */
export function EventTable({ view, t, onMove }: EventTableProps) {
  const scroller = useRef<HTMLDivElement>(null);
  const { events } = view.result;
  const columns = columnsOf(view);
  const rows = useVirtualizer({
    count: events.length,
    getScrollElement: () => scroller.current,
    estimateSize: () => ROW,
    overscan: 12,
    initialRect: { width: 800, height: 360 },
  });
  const current = currentIndex(events, t);
  const copy = (): void =>
    void navigator.clipboard.writeText(eventsCsv(view)).then(
      () => announce(`${events.length} events copied.`),
      () => announce("The browser does not allow copying here."),
    );
  return (
    <div>
      <div
        ref={scroller}
        tabIndex={0}
        role="region"
        aria-label="Events"
        className="max-h-[352px] overflow-auto border-b border-edge"
      >
        <table className="grid w-full min-w-[640px]" aria-rowcount={events.length + 1}>
          <thead className="sticky top-0 z-10 grid bg-paper">
            <tr className={rowClass(columns.length)}>
              <th scope="col" className="text-left text-13 font-semibold text-quiet">
                Event
              </th>
              {columns.map(({ head }) => (
                <th key={head} scope="col" className="text-right text-13 font-semibold text-quiet">
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody className="relative grid" style={{ height: rows.getTotalSize() }}>
            {rows.getVirtualItems().map(({ index, start }) => (
              <EventRow
                key={index}
                event={events[index]}
                index={index}
                top={start}
                columns={columns}
                isCurrent={index === current}
                onMove={onMove}
              />
            ))}
          </tbody>
        </table>
      </div>
      <p className="mt-2 text-13 text-quiet">
        {formatNumber(events.length, 7)} events ·{" "}
        <button type="button" className="link" onClick={copy}>
          copy as CSV
        </button>
      </p>
    </div>
  );
}

const rowClass = (columns: number): string =>
  classNames(
    "grid items-center gap-x-4 border-b border-line px-1",
    columns === 5 ? "grid-cols-[1.3fr_repeat(5,1fr)]" : "grid-cols-[1.3fr_repeat(4,1fr)]",
  );

interface EventRowProps {
  event: MotionEvent;
  index: number;
  top: number;
  columns: readonly EventColumn[];
  isCurrent: boolean;
  onMove: (t: number) => void;
}

function EventRow({ event, index, top, columns, isCurrent, onMove }: EventRowProps) {
  return (
    <tr
      aria-rowindex={index + 2}
      aria-current={isCurrent || undefined}
      className={classNames(rowClass(columns.length), "absolute inset-x-0 text-15", isCurrent && "bg-tint")}
      style={{ top, height: ROW }}
    >
      <th scope="row" className="truncate text-left font-normal">
        <button type="button" className="hover:underline" onClick={() => onMove(event.t)}>
          {eventWords[event.kind]}
        </button>
        {isCurrent && <span className="ml-1.5 text-13 text-quiet">cursor is here</span>}
      </th>
      {columns.map(({ head, cell }) => (
        <td key={head} className="figures text-right">
          {cell(event, index)}
        </td>
      ))}
    </tr>
  );
}

/** The row of the event the cursor stands on; −1 in between. */
function currentIndex(events: readonly MotionEvent[], t: number): number {
  return events.findIndex((event) => event.t === t);
}
