import { useState, type PointerEvent } from "react";
import { plotWidth, timeAt, type Frame } from "./frame.ts";

interface StripDragProps {
  frame: Frame;
  /** Pressed at an instant. */
  onMove: (t: number) => void;
  /** Dragged from one instant to another. */
  onSpan: (one: number, other: number) => void;
}

/** A pointer that moves less than this, px, has pressed and not dragged. */
const LEAST = 5;

/** Lies over the motion strip: pressed it moves the cursor, dragged it chooses a span. The same is in the fields above and on the keys. */
export function StripDrag({ frame, onMove, onSpan }: StripDragProps) {
  const [drag, setDrag] = useState<{ begin: number; now: number } | null>(null);
  const placeOf = ({ clientX, currentTarget }: PointerEvent<HTMLElement>): number =>
    frame.left + Math.min(plotWidth(frame), Math.max(0, clientX - currentTarget.getBoundingClientRect().left));
  const isDragged = drag !== null && Math.abs(drag.now - drag.begin) >= LEAST;
  const end = (): void => {
    if (!drag) return;
    if (isDragged) onSpan(timeAt(frame, drag.begin), timeAt(frame, drag.now));
    else onMove(timeAt(frame, drag.begin));
    setDrag(null);
  };
  return (
    <div
      data-strip
      className="absolute inset-y-0 cursor-crosshair touch-pan-y"
      style={{ left: frame.left, width: plotWidth(frame) }}
      title="Press to move the cursor, drag to see a span"
      onPointerDown={(event) => {
        if (!event.isPrimary) return;
        event.currentTarget.setPointerCapture(event.pointerId);
        const place = placeOf(event);
        setDrag({ begin: place, now: place });
      }}
      onPointerMove={(event) => drag && setDrag({ ...drag, now: placeOf(event) })}
      onPointerUp={end}
      onPointerCancel={() => setDrag(null)}
    >
      {isDragged && (
        <span
          className="absolute inset-y-0 border-x-2 border-ink bg-slip/20"
          style={{
            left: Math.min(drag.begin, drag.now) - frame.left,
            width: Math.abs(drag.now - drag.begin),
          }}
        />
      )}
    </div>
  );
}
