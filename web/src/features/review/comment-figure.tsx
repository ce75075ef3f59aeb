import type { Anchor, Comment, Revision } from "@restband/api/contract";
import { useMemo, useState } from "react";
import { MotionStrip } from "../../components/motion-strip.tsx";
import { formatNumber } from "../../format/format-number.ts";
import { fromSi, type Measure } from "../../format/unit.ts";
import { unitFor } from "../../format/units.ts";
import { pathOf, stretchesOf, ticksOf } from "./curve.ts";
import { pinsOf, timeOfX, turnsOf, xOfTime, type Pin, type PlotPlace } from "./leaders.ts";

const LEFT = 56;
const STRIP = 20;
const TOP = 56;
const HEIGHT = 132;
const BOTTOM = TOP + HEIGHT;
/** Where spans are bracketed, and where leaders begin to turn. */
const BRACKET = BOTTOM + 40;
const TURN = BOTTOM + 62;
const STEP = 10;
/** Fingers shake: less is a press. */
const DRAG = 5;

interface CommentFigureProps {
  revision: Revision;
  /** The revision before it, drawn behind. */
  before: Revision | undefined;
  /** In the order of their columns. */
  comments: readonly Comment[];
  width: number;
  /** Left edges of the columns below; empty where they stand one below the other. */
  columns: readonly number[];
  /** A press or a drag on the time axis; absent for those who may not comment. */
  onPick?: (anchor: Anchor) => void;
}

/** The velocity as it was frozen, with the comments pinned to it and leaders to what they say. */
export function CommentFigure({ revision, before, comments, width, columns, onPick }: CommentFigureProps) {
  const { trace, content } = revision;
  const plot: PlotPlace = {
    left: LEFT,
    right: width - (width > 700 ? 132 : 12),
    from: 0,
    to: trace.t.at(-1) ?? content.span.seconds,
  };
  const pins = pinsOf(comments, plot, columns);
  const turns = turnsOf(pins, TURN, STEP);
  const height = columns.length > 0 && pins.length > 0 ? TURN + STEP * pins.length + 8 : BOTTOM + 56;
  return (
    <div className="relative">
      <p className="mb-1 text-13 font-semibold">velocity of the body</p>
      <div className="absolute" style={{ left: plot.left, width: plot.right - plot.left }}>
        <MotionStrip
          intervals={useMemo(() => stretchesOf(trace), [trace])}
          from={plot.from}
          to={plot.to}
          height={STRIP}
          isNever={revision.result.outcome === "never-moved"}
          label="Motion as it was frozen: slip forward, slip back and stick over time"
        />
      </div>
      <svg width={width} height={height} className="block" role="img" aria-label={labelOf(revision, comments)}>
        <Curves {...{ revision, before, plot }} />
        {pins.map((pin, i) => (
          <Leader key={pin.number} pin={pin} turn={turns[i]} height={height} isLow={isCrowded(pins, i)} />
        ))}
        {onPick && <Picker plot={plot} onPick={onPick} />}
      </svg>
    </div>
  );
}

function labelOf({ number }: Revision, comments: readonly Comment[]): string {
  return `Velocity of revision ${number} over time, with ${comments.length} comments; they are listed below.`;
}

/** Numbers closer than their rings are wide do not stand beside each other. */
const isCrowded = (pins: readonly Pin[], i: number): boolean =>
  i > 0 && Math.abs(pins[i].x - pins[i - 1].x) < 22 && !isCrowded(pins, i - 1);

interface CurvesProps {
  revision: Revision;
  before: Revision | undefined;
  plot: PlotPlace;
}

function Curves({ revision, before, plot }: CurvesProps) {
  const measure: Measure = { dimension: "velocity", motion: revision.content.motion };
  const all = [...revision.trace.v, ...(before?.trace.v ?? [])];
  const low = all.reduce((least, v) => Math.min(least, v), 0);
  const high = all.reduce((most, v) => Math.max(most, v), 0);
  const unit = unitFor(Math.max(-low, high), measure);
  const span = high - low || unit.factor;
  const y = (v: number) => BOTTOM - 6 - ((v - low) / span) * (HEIGHT - 12);
  const ticks = ticksOf(fromSi(low, unit), fromSi(low + span, unit));
  return (
    <g className="text-[12.5px]">
      <text x={plot.left - 10} y={TOP - 8} textAnchor="end" className="fill-quiet text-[13px]">
        {unit.label}
      </text>
      {ticks.map((tick) => (
        <g key={tick}>
          <path
            d={`M${plot.left} ${y(tick * unit.factor)}H${plot.right}`}
            className={tick === 0 ? "stroke-edge" : "stroke-line"}
          />
          <text x={plot.left - 10} y={y(tick * unit.factor) + 4} textAnchor="end" className="figures fill-quiet">
            {formatNumber(tick)}
          </text>
        </g>
      ))}
      <path d={`M${plot.left} ${BOTTOM}H${plot.right}`} className="stroke-ink" />
      {ticksOf(plot.from, plot.to, plot.right - plot.left > 500 ? 8 : 4).map((t) => (
        <text key={t} x={xOfTime(plot, t)} y={BOTTOM + 18} textAnchor="middle" className="figures fill-quiet">
          {formatNumber(t)}
        </text>
      ))}
      <text x={plot.right + 24} y={BOTTOM + 18} className="fill-quiet text-[13px] max-desk:hidden">
        s
      </text>
      {before && <path d={pathOf(before.trace, plot, y)} className="fill-none stroke-quiet" strokeOpacity={0.55} />}
      <path d={pathOf(revision.trace, plot, y)} className="fill-none stroke-slip" strokeWidth={2} />
      <Names {...{ revision, before, plot, y }} />
    </g>
  );
}

/** Names at the right end of the curves, kept apart. */
function Names({ revision, before, plot, y }: CurvesProps & { y: (v: number) => number }) {
  const own = y(revision.trace.v.at(-1) ?? 0);
  const other = before ? y(before.trace.v.at(-1) ?? 0) : own;
  const apart = Math.abs(own - other) < 16 ? (other >= own ? own + 16 : own - 16) : other;
  return (
    <g className="text-[13px] max-desk:hidden">
      <text x={plot.right + 10} y={own + 4} className="fill-slip">
        revision {revision.number}
      </text>
      {before && (
        <text x={plot.right + 10} y={apart + 4} className="fill-quiet">
          revision {before.number}
        </text>
      )}
    </g>
  );
}

/** The number of a comment at its instant or span, and the line to where it is said. */
function Leader({ pin, turn, height, isLow }: { pin: Pin; turn: number; height: number; isLow: boolean }) {
  const { number, x, ends, column } = pin;
  const ring = ends ? BRACKET : TOP - 14 + (isLow ? 22 : 0);
  const foot = column === null ? BOTTOM + 6 : height;
  const away = column === null ? "" : `V${turn}H${column + 18}V${foot}`;
  return (
    <g>
      {ends ? (
        <path d={`M${ends[0]} ${BRACKET - 6}v6H${ends[1]}v-6M${x} ${BRACKET}${away}`} className={lineClass} />
      ) : (
        <path d={`M${x} ${STRIP + 2}V${BOTTOM}${away}`} className={lineClass} />
      )}
      <circle cx={x} cy={ring} r={9.5} className="fill-ink" />
      <text x={x} y={ring + 4.5} textAnchor="middle" className="fill-paper text-[12.5px] font-bold">
        {number}
      </text>
    </g>
  );
}

const lineClass = "fill-none stroke-ink stroke-[1.25px]";

/** Takes presses and drags on the plot and its axis. */
function Picker({ plot, onPick }: { plot: PlotPlace; onPick: (anchor: Anchor) => void }) {
  const [drag, setDrag] = useState<{ start: number; now: number } | null>(null);
  const xOf = (event: React.PointerEvent<SVGRectElement>): number =>
    event.clientX - (event.currentTarget.ownerSVGElement?.getBoundingClientRect().left ?? 0);
  const end = (): void => {
    if (!drag) return;
    const [from, to] = [drag.start, drag.now].map((x) => timeOfX(plot, x)).sort((a, b) => a - b);
    const isPress = Math.abs(drag.now - drag.start) < DRAG;
    onPick(isPress ? { kind: "instant", t: from } : { kind: "span", from, to });
    setDrag(null);
  };
  return (
    <>
      {drag && Math.abs(drag.now - drag.start) >= DRAG && (
        <rect
          x={Math.min(drag.start, drag.now)}
          y={TOP}
          width={Math.abs(drag.now - drag.start)}
          height={HEIGHT}
          className="fill-slip"
          fillOpacity={0.12}
        />
      )}
      <rect
        x={plot.left}
        y={TOP}
        width={Math.max(0, plot.right - plot.left)}
        height={HEIGHT + 26}
        fill="transparent"
        className="cursor-crosshair touch-pan-y"
        data-axis
        onPointerDown={(event) => {
          event.currentTarget.setPointerCapture(event.pointerId);
          setDrag({ start: xOf(event), now: xOf(event) });
        }}
        onPointerMove={(event) => drag && setDrag({ ...drag, now: xOf(event) })}
        onPointerUp={end}
        onPointerCancel={() => setDrag(null)}
      />
    </>
  );
}
