import { type KeyboardEvent, type PointerEvent } from "react";
import { instantAt } from "../../compute/instant.ts";
import { say } from "../../format/format-quantity.ts";
import { timeAt, xOf, yOf, type Frame } from "./frame.ts";
import { phaseWords } from "./readings.ts";
import { neighbourEvent, type RunView } from "./run-view.ts";
import { useGestures } from "./use-gestures.ts";
import type { SeenPart } from "./use-part.ts";

interface TimeCursorProps {
  view: RunView;
  frame: Frame;
  t: number;
  onMove: (t: number) => void;
  part: SeenPart;
}

/** The one time cursor over all panels: pressed or dragged with the pointer, moved from event to event by the arrow keys; Page up and down move what is seen. */
export function TimeCursor({ view, frame, t, onMove, part }: TimeCursorProps) {
  const area = useGestures(frame, part);
  const moveTo = ({ clientX }: PointerEvent): void => {
    const box = area.current?.getBoundingClientRect();
    if (box) onMove(timeAt(frame, clientX - box.left));
  };
  const press = (event: KeyboardEvent): void => {
    const pages = { PageUp: -0.5, PageDown: 0.5 }[event.key];
    if (pages !== undefined) {
      event.preventDefault();
      part.pan(pages);
      return;
    }
    const next = targetOf(event, view, frame, t);
    if (next === null) return;
    event.preventDefault();
    event.stopPropagation();
    onMove(next);
  };
  const { phase, since } = phaseWords(view, t);
  const measure = { dimension: "time", motion: view.scenario.motion } as const;
  return (
    <div
      ref={area}
      role="slider"
      tabIndex={0}
      aria-label="Time cursor"
      aria-valuemin={0}
      aria-valuemax={view.end}
      aria-valuenow={t}
      aria-valuetext={`${say(t, measure, { digits: 5 })}, ${phase}${since}`}
      className="absolute inset-x-0 top-0 cursor-ew-resize touch-pan-y"
      style={{ height: frame.height }}
      onKeyDown={press}
      onPointerDown={(event) => {
        if (!event.isPrimary) return;
        event.currentTarget.setPointerCapture(event.pointerId);
        moveTo(event);
      }}
      onPointerMove={(event) => event.isPrimary && event.buttons > 0 && moveTo(event)}
    >
      <CursorLine view={view} frame={frame} t={t} />
    </div>
  );
}

/** ← → from event to event, with Shift by a hundredth of what is seen; Home and End to the ends. */
function targetOf(event: KeyboardEvent, view: RunView, { from, to }: Frame, t: number): number | null {
  const direction = event.key === "ArrowRight" ? 1 : event.key === "ArrowLeft" ? -1 : 0;
  if (event.key === "Home") return 0;
  if (event.key === "End") return view.end;
  if (direction === 0) return null;
  if (event.shiftKey) return Math.min(view.end, Math.max(0, t + (direction * (to - from)) / 100));
  return neighbourEvent(view, t, direction) ?? t;
}

/** The line through all panels and a ring on each curve; nothing where the cursor is outside what is seen. */
function CursorLine({ view, frame, t }: Omit<TimeCursorProps, "onMove" | "part">) {
  if (t < frame.from || t > frame.to) return null;
  const x = xOf(frame, t);
  const here = instantAt(view.samples, t);
  const values = {
    displacement: here.x,
    velocity: here.v,
    acceleration: here.a,
    friction: here.f,
    drive: view.drive?.at(here) ?? 0,
  };
  const last = frame.panels[frame.panels.length - 1];
  return (
    <svg
      width="100%"
      height={frame.height}
      className="pointer-events-none absolute inset-0 overflow-visible"
      aria-hidden="true"
    >
      <path d={`M${x} 0V${last.top + last.height}`} className="stroke-ink" strokeWidth={1.25} />
      {frame.panels.map((panel) => (
        <circle
          key={panel.key}
          cx={x}
          cy={yOf(panel, values[panel.key])}
          r={4.5}
          className="fill-raised stroke-ink"
          strokeWidth={1.75}
        />
      ))}
    </svg>
  );
}
