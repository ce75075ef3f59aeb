import type { ScenarioSummary } from "@restband/api/contract";
import { useWindowVirtualizer } from "@tanstack/react-virtual";
import { useEffect, useLayoutEffect, useRef, useState, type ReactNode } from "react";

interface ScenarioRowsProps {
  rows: readonly ScenarioSummary[];
  row: (summary: ScenarioSummary) => ReactNode;
  /** Told which rows are near the visible part of the page, from the top. */
  onSeen: (seen: readonly ScenarioSummary[]) => void;
}

/** Up to here all rows are there; of longer lists only those near the visible part. */
const ALL_UP_TO = 60;
const ROW = 89;

/** The scenarios of a project, a row each. */
export function ScenarioRows({ rows, row, onSeen }: ScenarioRowsProps) {
  if (rows.length > ALL_UP_TO) return <VirtualRows rows={rows} row={row} onSeen={onSeen} />;
  return (
    <ul>
      {rows.map((summary) => (
        <li key={summary.id} className="border-b border-line">
          {row(summary)}
        </li>
      ))}
    </ul>
  );
}

function VirtualRows({ rows, row, onSeen }: ScenarioRowsProps) {
  const list = useRef<HTMLUListElement>(null);
  const top = useTop(list);
  const virtual = useWindowVirtualizer({
    count: rows.length,
    estimateSize: () => ROW,
    overscan: 8,
    scrollMargin: top,
    getItemKey: (index) => rows[index].id,
  });
  const items = virtual.getVirtualItems();
  const seen = items.map(({ index }) => rows[index].digest).join();
  useEffect(() => {
    onSeen(items.map(({ index }) => rows[index]));
    // Told when other rows come into sight; the callback is a new one with each render.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [seen]);
  return (
    <ul ref={list} className="relative" style={{ height: virtual.getTotalSize() }}>
      {items.map(({ index, key, start }) => (
        <li
          key={key}
          ref={virtual.measureElement}
          data-index={index}
          aria-setsize={rows.length}
          aria-posinset={index + 1}
          className="absolute inset-x-0 border-b border-line"
          style={{ top: start - top }}
        >
          {row(rows[index])}
        </li>
      ))}
    </ul>
  );
}

/** How far below the head of the page a list begins, px; what stands above it may grow. */
function useTop(list: { current: HTMLElement | null }): number {
  const [top, setTop] = useState(0);
  useLayoutEffect(() => {
    const measure = (): void => {
      if (list.current) setTop(Math.round(list.current.getBoundingClientRect().top + window.scrollY));
    };
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(document.body);
    return () => observer.disconnect();
  }, [list]);
  return top;
}
