import type { LimitLine, Scenario } from "@restband/solver";
import type { AxisScale } from "./axis-scale.ts";
import { isThick, lineName } from "./line-names.ts";
import { pointOf, type MapFrame } from "./map-frame.ts";
import type { RegionLabel } from "./region-labels.ts";
import type { Shown } from "./shown.ts";

interface MapLinesProps {
  frame: MapFrame;
  across: AxisScale;
  up: AxisScale;
  lines: readonly LimitLine[];
  shown: Shown;
  scenario: Scenario;
  /** Names that are there already. */
  taken: readonly RegionLabel[];
}

interface Place {
  readonly x: number;
  readonly y: number;
}

/** Thick, with their names: where smooth sliding ends or a limit breaks. Dashed: every other change. */
export function MapLines({ frame, across, up, lines, shown, scenario, taken }: MapLinesProps) {
  const drawn = lines.map((line) => ({ line, places: placesOf(line, frame, across, up) }));
  const named = longest(
    drawn.filter(({ line, places }) => places.length > 1 && lineName(line, shown, scenario) !== null),
  );
  return (
    <>
      {drawn.map(({ line, places }, i) => (
        <Line key={i} places={places} isThick={isThick(line)} />
      ))}
      {named && (
        <Name words={lineName(named.line, shown, scenario) ?? ""} places={named.places} frame={frame} taken={taken} />
      )}
    </>
  );
}

function placesOf({ points }: LimitLine, frame: MapFrame, across: AxisScale, up: AxisScale): Place[] {
  return points.flatMap((point) => {
    const [a, u] = [across.placeOf(point.across), up.placeOf(point.up)];
    return a === null || u === null ? [] : [pointOf(frame, a, u)];
  });
}

/** The one that spans most of the map. */
function longest<T extends { places: readonly Place[] }>(drawn: readonly T[]): T | null {
  return drawn.reduce<T | null>((a, b) => (a && spanOf(a.places) >= spanOf(b.places) ? a : b), null);
}

const spanOf = (places: readonly Place[]): number =>
  places.length === 0
    ? 0
    : Math.hypot(places[0].x - places[places.length - 1].x, places[0].y - places[places.length - 1].y);

function Line({ places, isThick: isBold }: { places: readonly Place[]; isThick: boolean }) {
  if (places.length === 0) return null;
  if (places.length === 1) return <circle cx={places[0].x} cy={places[0].y} r={3} className="fill-ink stroke-paper" />;
  const d = places.map(({ x, y }, k) => `${k === 0 ? "M" : "L"}${x.toFixed(1)} ${y.toFixed(1)}`).join("");
  return (
    <g>
      <path d={d} className="fill-none stroke-paper" strokeWidth={isBold ? 6.5 : 4} strokeLinejoin="round" />
      <path
        d={d}
        className="fill-none stroke-ink"
        strokeWidth={isBold ? 2.5 : 1.5}
        strokeDasharray={isBold ? undefined : "5 4"}
        strokeLinejoin="round"
      />
    </g>
  );
}

/** About so wide is a letter of the name, px. */
const LETTER = 6.9;
const HEIGHT = 21;
/** From the line to the middle of its name, px. */
const AWAY = 30;
/** Where along the line the name may stand, the best first. */
const SHARES = [0.75, 0.55, 0.9, 0.35, 0.2, 0.05];

interface NameProps {
  words: string;
  places: readonly Place[];
  frame: MapFrame;
  taken: readonly RegionLabel[];
}

/** The name beside the line, on plain ground, with a short leader to it. */
function Name({ words, places, frame, taken }: NameProps) {
  const { at, x, y, width } = nameBox(words, places, frame, taken);
  return (
    <g>
      <path d={`M${at.x} ${at.y}V${y < at.y ? y + 10 : y - 10}`} className="stroke-ink" strokeWidth={1.25} />
      <rect x={x - width / 2} y={y - 11} width={width} height={HEIGHT} rx={2} className="fill-paper" opacity={0.94} />
      <text x={x} y={y + 4} textAnchor="middle" className="fill-ink text-[13px] font-bold">
        {words}
      </text>
    </g>
  );
}

/** Above or below some place of the line, within the map and off the names of the regions; where there is none, the first. */
function nameBox(words: string, places: readonly Place[], frame: MapFrame, taken: readonly RegionLabel[]) {
  const width = words.length * LETTER + 12;
  const right = frame.left + frame.columns * frame.cellWidth;
  const bottom = frame.top + frame.rows * frame.cellHeight;
  const boxes = SHARES.flatMap((share) => {
    const at = places[Math.floor(share * (places.length - 1))];
    const x = Math.min(Math.max(at.x, frame.left + width / 2 + 2), right - width / 2 - 2);
    return [at.y - AWAY, at.y + AWAY].map((y) => ({ at, x, y, width }));
  });
  const free = boxes.find(
    ({ x, y }) =>
      y - HEIGHT / 2 > frame.top &&
      y + HEIGHT / 2 < bottom &&
      taken.every(
        (label) => Math.abs(label.y - y) > HEIGHT + 4 || Math.abs(label.x - x) > (label.width + width) / 2 + 4,
      ),
  );
  return free ?? boxes[0];
}
