import { formatNumber } from "../../../format/format-number.ts";
import { fromSi, type Measure } from "../../../format/unit.ts";
import { unitFor } from "../../../format/units.ts";
import { useWidth } from "../../../components/use-width.ts";

interface SmallTraceProps {
  label: string;
  times: readonly number[];
  values: readonly number[];
  /** SI. */
  measure: Measure;
  /** Drawn as a band about zero: the rest band. */
  band?: number | null;
}

const HEIGHT = 104;
const LEFT = 44;

/** One curve over a stretch of time, small: its ends on both axes, zero, the rest band where it belongs. */
export function SmallTrace({ label, times, values, measure, band }: SmallTraceProps) {
  const [ref, width] = useWidth<SVGSVGElement>(340);
  const most = Math.max(...values, band ?? -Infinity);
  const least = Math.min(...values, band ? -band : Infinity);
  const unit = unitFor(Math.max(Math.abs(most), Math.abs(least)), measure);
  const room = (most - least || Math.abs(most) || 1) * 0.06;
  const [low, high] = [least - room, most + room];
  const x = (t: number): number =>
    LEFT + ((t - times[0]) / (times[times.length - 1] - times[0] || 1)) * (width - LEFT - 2);
  const y = (value: number): number => 2 + (1 - (value - low) / (high - low)) * (HEIGHT - 4);
  const d = times.map((t, i) => `${i === 0 ? "M" : "L"}${x(t).toFixed(1)} ${y(values[i]).toFixed(1)}`).join("");
  const text = (value: number): string => formatNumber(fromSi(value, unit), 3);
  return (
    <figure className="mt-3">
      <figcaption className="mb-1 text-13 font-semibold">
        {label}
        {unit.label && `, ${unit.label}`}
      </figcaption>
      <svg
        ref={ref}
        width="100%"
        height={HEIGHT}
        role="img"
        aria-label={`${label}: from ${text(Math.min(...values))} to ${text(Math.max(...values))} ${unit.label}`}
        className="block text-[12.5px] forced-color-adjust-none"
      >
        {band && (
          <rect x={LEFT} width={width - LEFT - 2} y={y(band)} height={y(-band) - y(band)} fill="url(#hatch-band)" />
        )}
        {low < 0 && high > 0 && <path d={`M${LEFT} ${y(0)}H${width - 2}`} className="stroke-edge" />}
        <path d={`M${LEFT} 0V${HEIGHT}M${LEFT} ${HEIGHT - 0.5}H${width - 2}`} className="fill-none stroke-line" />
        <path d={d} className="fill-none stroke-slip" strokeWidth={1.75} />
        <text x={LEFT - 6} y={12} textAnchor="end" className="figures fill-ink">
          {text(most)}
        </text>
        <text x={LEFT - 6} y={HEIGHT - 3} textAnchor="end" className="figures fill-ink">
          {text(least)}
        </text>
      </svg>
    </figure>
  );
}
