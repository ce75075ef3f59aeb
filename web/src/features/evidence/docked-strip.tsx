import type { PointerEvent } from "react";
import { Button } from "../../components/button.tsx";
import { classNames } from "../../components/class-names.ts";
import { Figure } from "../../components/figure.tsx";
import { Icon } from "../../components/icon.tsx";
import { MotionStrip } from "../../components/motion-strip.tsx";
import { readQuantity } from "../../format/format-quantity.ts";
import { stripWords } from "./plot-words.ts";
import { isWhole, type Range } from "./part-of-run.ts";
import { phaseWords } from "./readings.ts";
import type { RunView } from "./run-view.ts";
import "./docked-strip.css";

interface DockedStripProps {
  view: RunView;
  /** What the plots show of the run. */
  range: Range;
  t: number;
  onMove: (t: number) => void;
  onStep: (direction: 1 | -1) => void;
}

/** On the phone the strip stands at the bottom of the screen and is the cursor: one button to each event, a finger in between. */
export function DockedStrip({ view, range, t, onMove, onStep }: DockedStripProps) {
  const { phase } = phaseWords(view, t);
  const share = (time: number): string => `${(time / view.end) * 100}%`;
  const move = ({ clientX, currentTarget }: PointerEvent<HTMLElement>): void => {
    const box = currentTarget.getBoundingClientRect();
    onMove(Math.min(1, Math.max(0, (clientX - box.left) / box.width)) * view.end);
  };
  return (
    <div className="docked-strip fixed inset-x-0 bottom-0 z-20 border-t border-edge bg-paper px-4 pt-2 pb-[max(8px,env(safe-area-inset-bottom))] print:hidden">
      <p className="mb-1 flex justify-between text-13">
        <span className={classNames("font-bold", phase === "stuck" ? "text-stick" : "text-slip")}>{phase}</span>
        <Figure {...readQuantity(t, { dimension: "time", motion: "linear" }, { digits: 4 })} />
      </p>
      <div className="flex items-center gap-3">
        <Button className="size-11 shrink-0 px-0!" aria-label="Event before" onClick={() => onStep(-1)}>
          <Icon name="previous" />
        </Button>
        <div
          className="relative min-w-0 grow touch-none py-3"
          onPointerDown={(event) => {
            event.currentTarget.setPointerCapture(event.pointerId);
            move(event);
          }}
          onPointerMove={(event) => event.buttons > 0 && move(event)}
        >
          <MotionStrip
            intervals={view.intervals}
            from={0}
            to={view.end}
            label={stripWords(view.intervals)}
            isNever={view.result.outcome === "never-moved"}
          />
          {!isWhole(range, view.end) && (
            <span
              className="pointer-events-none absolute inset-y-1.5 border-x-2 border-y border-quiet"
              style={{ left: share(range.from), width: share(range.to - range.from) }}
            />
          )}
          <span
            className="pointer-events-none absolute inset-y-1 w-[2px] -translate-x-1/2 bg-ink"
            style={{ left: share(t) }}
          />
        </div>
        <Button className="size-11 shrink-0 px-0!" aria-label="Next event" onClick={() => onStep(1)}>
          <Icon name="next" />
        </Button>
      </div>
    </div>
  );
}
