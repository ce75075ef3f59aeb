import type { MotionEvent } from "@restband/solver";
import { useVirtualizer } from "@tanstack/react-virtual";
import { useRef, type ReactNode } from "react";
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
/** Up to here all rows are there; of longer lists only those in sight. */
const ALL_UP_TO = 200;

/** Every event of the run. It scrolls within itself. */
export function EventTable({ view, t, onMove }: EventTableProps) {
  const scroller = useRef<HTMLDivElement>(null);
  const { events } = view.result;
  const isLong = events.length > ALL_UP_TO;
  const rows = useVirtualizer({
    count: isLong ? events.length : 0,
    getScrollElement: () => scroller.current,
    estimateSize: () => ROW,
    overscan: 12,
  });
  const columns = columnsOf(view);
  const current = events.findIndex((event) => event.t === t);
  const row = (index: number, top?: number): ReactNode => (
    <EventRow
      key={index}
      event={events[index]}
      index={index}
      top={top}
      columns={columns}
      isCurrent={index === current}
      onMove={onMove}
    />
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
          <EventHead columns={columns} />
          {isLong ? (
            <tbody className="relative grid" style={{ height: rows.getTotalSize() }}>
              {rows.getVirtualItems().map(({ index, start }) => row(index, start))}
            </tbody>
          ) : (
            <tbody className="grid">{events.map((_, index) => row(index))}</tbody>
          )}
        </table>
      </div>
      <EventFoot view={view} />
    </div>
  );
}

function EventHead({ columns }: { columns: readonly EventColumn[] }) {
  return (
    <thead className="sticky top-0 z-10 grid bg-paper">
      <tr className={rowClass(columns.length)}>
        <th scope="col" className="pb-1 text-left text-13 font-semibold text-quiet">
          Event
        </th>
        {columns.map(({ head }) => (
          <th key={head} scope="col" className="pb-1 text-right text-13 font-semibold text-quiet">
            {head}
          </th>
        ))}
      </tr>
    </thead>
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
  /** Where a row stands that is laid out by its place in a long list, px. */
  top: number | undefined;
  columns: readonly EventColumn[];
  isCurrent: boolean;
  onMove: (t: number) => void;
}

function EventRow({ event, index, top, columns, isCurrent, onMove }: EventRowProps) {
  return (
    <tr
      aria-rowindex={index + 2}
      aria-current={isCurrent || undefined}
      className={classNames(
        rowClass(columns.length),
        "text-15",
        top !== undefined && "absolute inset-x-0",
        isCurrent && "bg-tint",
      )}
      style={{ top, height: ROW }}
    >
      <th scope="row" className="truncate text-left font-normal">
        {/* No stop of the Tab key each: the cursor itself goes from event to event by the arrow keys. */}
        <button type="button" tabIndex={-1} className="hover:underline" onClick={() => onMove(event.t)}>
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

function EventFoot({ view }: { view: RunView }) {
  const { events } = view.result;
  const copy = (): void =>
    void navigator.clipboard.writeText(eventsCsv(view)).then(
      () => announce(`${events.length} events copied.`),
      () => announce("The browser does not allow copying here."),
    );
  return (
    <p className="mt-2 text-13 text-quiet">
      {formatNumber(events.length, 7)} events ·{" "}
      <button type="button" className="link" onClick={copy}>
        copy as CSV
      </button>
    </p>
  );
}
