import type { AxisScale } from "./axis-scale.ts";
import { pointOf, type MapFrame } from "./map-frame.ts";

interface MapAxesProps {
  frame: MapFrame;
  across: AxisScale;
  up: AxisScale | null;
  /** The selected cell, counted within the branch. */
  selected: number | null;
}

/** So near to the bold tick of the selection no other has room, px. */
const ROOM_ACROSS = 46;
const ROOM_UP = 15;

/** Ticks and names of both axes; the values of the selected cell stand bold among them. */
export function MapAxes({ frame, across, up, selected }: MapAxesProps) {
  const bottom = frame.top + frame.rows * frame.cellHeight;
  const right = frame.left + frame.columns * frame.cellWidth;
  const own =
    selected === null ? null : { column: selected % frame.columns, row: Math.floor(selected / frame.columns) };
  const at = own && pointOf(frame, own.column + 0.5, own.row + 0.5);
  return (
    <g className="text-[12.5px]">
      {across.ticks.map(({ place, text }) => {
        const { x } = pointOf(frame, place, 0);
        const isNear = at && Math.abs(at.x - x) < ROOM_ACROSS;
        return isNear ? null : <TickAcross key={text} width={frame.width} {...{ x, bottom, text }} />;
      })}
      {at && own && (
        <TickAcross width={frame.width} x={at.x} bottom={bottom} text={across.text(across.values[own.column])} isBold />
      )}
      <text x={right} y={bottom + 40} textAnchor="end" className="fill-quiet text-[13px]">
        {nameOf(across)}
      </text>
      {up?.ticks.map(({ place, text }) => {
        const { y } = pointOf(frame, 0, place);
        return at && Math.abs(at.y - y) < ROOM_UP ? null : <TickUp key={text} left={frame.left} {...{ y, text }} />;
      })}
      {up && at && own && <TickUp left={frame.left} y={at.y} text={up.text(up.values[own.row])} isBold />}
      {up && (
        <text x={0} y={14} className="fill-quiet text-[13px]">
          {nameOf(up)}
        </text>
      )}
    </g>
  );
}

const nameOf = ({ name, unit }: AxisScale): string => (unit.label === "" ? name : `${name}, ${unit.label}`);

/** About half a figure of the mono face, px: a tick at the rim keeps its text on the sheet. */
const HALF_FIGURE = 3.8;

interface TickAcrossProps {
  /** Of the map. */
  width: number;
  x: number;
  bottom: number;
  text: string;
  isBold?: boolean;
}

function TickAcross({ width, x, bottom, text, isBold }: TickAcrossProps) {
  const half = text.length * HALF_FIGURE;
  return (
    <g>
      <path d={`M${x} ${bottom + 1}v${isBold ? 7 : 5}`} {...strokeOf(isBold)} />
      <text
        x={Math.min(Math.max(x, half), width - half)}
        y={bottom + 19}
        textAnchor="middle"
        className={isBold ? "figures fill-ink font-bold" : "figures fill-ink"}
      >
        {text}
      </text>
    </g>
  );
}

function TickUp({ left, y, text, isBold }: { left: number; y: number; text: string; isBold?: boolean }) {
  return (
    <g>
      <path d={`M${left - (isBold ? 9 : 6)} ${y}h${isBold ? 8 : 5}`} {...strokeOf(isBold)} />
      <text
        x={left - (isBold ? 12 : 10)}
        y={y + 4}
        textAnchor="end"
        className={isBold ? "figures fill-ink font-bold" : "figures fill-ink"}
      >
        {text}
      </text>
    </g>
  );
}

const strokeOf = (isBold?: boolean) =>
  isBold ? { className: "stroke-ink", strokeWidth: 3 } : { className: "stroke-edge" };
