import type { QuantitySpread } from "@restband/solver";
import { useWidth } from "../../../components/use-width.ts";
import { formatNumber } from "../../../format/format-number.ts";
import { quantityNamed } from "../../../format/quantities.ts";
import { fromSi, toSi, type Measure } from "../../../format/unit.ts";
import { unitFor } from "../../../format/units.ts";
import { roundSteps } from "../round-steps.ts";

const HEIGHT = 240;
const LEFT = 44;
const TOP = 24;
const BOTTOM = 44;

/** How many draws fall where. */
export function Histogram({ spread, measure }: { spread: QuantitySpread; measure: Measure }) {
  const [ref, width] = useWidth<SVGSVGElement>(520);
  const { edges, counts } = spread.histogram;
  const most = Math.max(...counts, 1);
  const unit = unitFor(Math.max(Math.abs(spread.least), Math.abs(spread.largest)), measure);
  const [low, high] = [edges[0], edges[edges.length - 1]];
  const x = (value: number): number => LEFT + ((value - low) / (high - low || 1)) * (width - LEFT - 8);
  const y = (count: number): number => TOP + (1 - count / most) * (HEIGHT - TOP - BOTTOM);
  const text = (value: number): string => formatNumber(fromSi(value, unit), 3);
  // Of a value that does not scatter there is but one.
  const ticks = low < high ? roundSteps(fromSi(low, unit), fromSi(high, unit), 5) : [fromSi(low, unit)];
  const name = quantityNamed(spread.quantity)?.label ?? spread.quantity;
  const bottom = HEIGHT - BOTTOM;
  return (
    <svg
      ref={ref}
      width="100%"
      height={HEIGHT}
      role="img"
      aria-label={`${name} over ${spread.count} draws, from ${text(spread.least)} to ${text(spread.largest)} ${unit.label}`}
      className="block bg-raised text-[12.5px] forced-color-adjust-none"
    >
      <text x={0} y={14} className="fill-quiet text-[13px]">
        draws
      </text>
      {[most, Math.round(most / 2)].map((count) => (
        <g key={count}>
          <path d={`M${LEFT} ${y(count)}H${width - 8}`} className="stroke-line" />
          <text x={LEFT - 8} y={y(count) + 4} textAnchor="end" className="figures fill-ink">
            {count}
          </text>
        </g>
      ))}
      {counts.map((count, i) => (
        <rect
          key={i}
          x={x(edges[i])}
          y={y(count)}
          width={Math.max(1, x(edges[i + 1]) - x(edges[i]) - 1)}
          height={bottom - y(count)}
          className="fill-slip"
        />
      ))}
      <path d={`M${LEFT} ${bottom}H${width - 8}`} className="stroke-ink" />
      {ticks.map((value) => (
        <text
          key={value}
          x={Math.min(x(toSi(value, unit)), width - 12)}
          y={bottom + 18}
          textAnchor="middle"
          className="figures fill-ink"
        >
          {formatNumber(value, 4)}
        </text>
      ))}
      <text x={width - 8} y={bottom + 38} textAnchor="end" className="fill-quiet text-[13px]">
        {name}
        {unit.label && `, ${unit.label}`}
      </text>
    </svg>
  );
}
