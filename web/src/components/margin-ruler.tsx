import { useWidth } from "./use-width.ts";

/** What a limit came to: kept, broken, or not to be judged. */
export type RulerVerdict = "kept" | "broken" | "unknown";

interface MarginRulerProps {
  min?: number;
  max?: number;
  /** Null where there is no value: the ruler then shows the limit alone. */
  value: number | null;
  verdict: RulerVerdict;
  /** The scale's ends. */
  from: number;
  to: number;
  /** A number of the scale as text, unit included. */
  format: (value: number) => string;
  /** The whole of it in words. */
  label: string;
}

const TOP = 11;
const BAR = 6;

/** A limit as a notch, the value as a needle: a solid bar where the limit is kept, cross-hatched where it is broken. */
export function MarginRuler({ min, max, value, verdict, from, to, format, label }: MarginRulerProps) {
  const [ref, width] = useWidth<SVGSVGElement>(360);
  const x = (at: number): number => {
    const share = (Math.min(Math.max(at, from), to) - from) / (to - from);
    return Math.round(100 * (share * (width - 2) + 1)) / 100;
  };
  const [keptFrom, keptTo] = [x(min ?? from), x(max ?? to)];
  const bounds = [min, max].filter((bound) => bound !== undefined);
  return (
    <svg ref={ref} role="img" aria-label={label} width="100%" height={40} className="block overflow-visible">
      <rect x={1} y={TOP} width={width - 2} height={BAR} fill="url(#hatch-broken)" className="stroke-broken" />
      <rect x={keptFrom} y={TOP} width={Math.max(0, keptTo - keptFrom)} height={BAR} className="fill-kept" />
      <Scale from={from} to={to} x={x} />
      {bounds.map((bound) => (
        <path key={bound} d={`M${x(bound)} ${TOP - 6}V${TOP + BAR + 6}`} className="stroke-ink" strokeWidth={2} />
      ))}
      {value !== null && <Needle x={x(value)} verdict={verdict} />}
      <Ends from={from} to={to} bounds={bounds} x={x} width={width} format={format} />
    </svg>
  );
}

const TICKS = 8;

function Scale({ from, to, x }: { from: number; to: number; x: (at: number) => number }) {
  const ticks = Array.from({ length: TICKS + 1 }, (_, i) => from + (i * (to - from)) / TICKS);
  const line = (at: number, i: number): string => `M${x(at)} ${TOP}v${i % 4 === 0 ? -6 : -3}`;
  return <path d={ticks.map(line).join("")} className="stroke-edge" strokeWidth={1} />;
}

const needles: Record<RulerVerdict, string> = { kept: "fill-kept", broken: "fill-broken", unknown: "fill-quiet" };

function Needle({ x, verdict }: { x: number; verdict: RulerVerdict }) {
  return <path d={`M${x} ${TOP + 1}l-5-10h10z`} className={`${needles[verdict]} stroke-paper`} strokeWidth={1} />;
}

interface EndsProps {
  from: number;
  to: number;
  bounds: readonly number[];
  x: (at: number) => number;
  width: number;
  format: (value: number) => string;
}

/** Figures under the scale: the bounds in ink; the ends only where they leave room. */
function Ends({ from, to, bounds, x, width, format }: EndsProps) {
  const room = 64;
  const isFree = (at: number): boolean => bounds.every((bound) => Math.abs(x(bound) - x(at)) > room);
  return (
    <g className="figures text-[12.5px]">
      {isFree(from) && <Figure x={0} text={format(from)} anchor="start" className="fill-quiet" />}
      {isFree(to) && <Figure x={width} text={format(to)} anchor="end" className="fill-quiet" />}
      {bounds.map((bound) => (
        <Figure
          key={bound}
          x={x(bound)}
          text={format(bound)}
          anchor={anchorAt(x(bound), width)}
          className="fill-ink font-bold"
        />
      ))}
    </g>
  );
}

interface FigureProps {
  x: number;
  text: string;
  anchor: "start" | "middle" | "end";
  className: string;
}

function Figure({ x, text, anchor, className }: FigureProps) {
  return (
    <text x={x} y={TOP + BAR + 20} textAnchor={anchor} className={className}>
      {text}
    </text>
  );
}

function anchorAt(x: number, width: number): "start" | "middle" | "end" {
  if (x < 40) return "start";
  return x > width - 40 ? "end" : "middle";
}
