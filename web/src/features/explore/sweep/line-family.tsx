import type { Scenario } from "@restband/solver";
import { useWidth } from "../../../components/use-width.ts";
import { formatNumber } from "../../../format/format-number.ts";
import { measureOfQuantity, quantityNamed } from "../../../format/quantities.ts";
import { fromSi, toSi } from "../../../format/unit.ts";
import { unitFor } from "../../../format/units.ts";
import { roundSteps } from "../round-steps.ts";
import type { AxisScale } from "./axis-scale.ts";
import type { SweepCells } from "./sweep-cells.ts";

interface LineFamilyProps {
  cells: SweepCells;
  scenario: Scenario;
  across: AxisScale;
  up: AxisScale | null;
  /** Place of the quantity in the plan. */
  place: number;
}

const LEFT = 58;
const RIGHT = 96;
const TOP = 26;
const HEIGHT = 260;
const BOTTOM = 46;
const MOST_LINES = 6;

interface Line {
  readonly label: string;
  readonly isDown: boolean;
  readonly values: readonly (number | null)[];
}

/** A quantity over the first field: one line, one for each of a few values of the second, or one for each branch. */
export function LineFamily({ cells, scenario, across, up, place }: LineFamilyProps) {
  const [ref, width] = useWidth<SVGSVGElement>(834);
  const name = cells.plan.quantities[place];
  const measure = measureOfQuantity(name, scenario.motion);
  const lines = linesOf(cells, across, up, place);
  const all = lines.flatMap(({ values }) => values.filter((value) => value !== null));
  if (all.length === 0) return <p className="text-quiet">No cell has a value of this yet.</p>;
  const low = Math.min(0, ...all);
  const high = Math.max(...all, low + 1e-300);
  const unit = unitFor(Math.max(Math.abs(low), Math.abs(high)), measure);
  const x = (i: number): number => LEFT + ((i + 0.5) / across.count) * (width - LEFT - RIGHT);
  const y = (value: number): number => TOP + (1 - (value - low) / (high - low)) * (HEIGHT - TOP - BOTTOM);
  const label = quantityNamed(name)?.label ?? name;
  const bottom = HEIGHT - BOTTOM;
  return (
    <svg
      ref={ref}
      width="100%"
      height={HEIGHT}
      role="img"
      aria-label={`${label} over ${across.name}, from ${formatNumber(fromSi(Math.min(...all), unit))} to ${formatNumber(fromSi(Math.max(...all), unit))} ${unit.label}`}
      className="block bg-raised text-[12.5px] forced-color-adjust-none"
    >
      <text x={0} y={14} className="fill-quiet text-[13px]">
        {label}
        {unit.label && `, ${unit.label}`}
      </text>
      {roundSteps(fromSi(low, unit), fromSi(high, unit), 5).map((value) => {
        const at = y(toSi(value, unit));
        return (
          <g key={value}>
            <path d={`M${LEFT} ${at}H${width - RIGHT}`} className={value === 0 ? "stroke-edge" : "stroke-line"} />
            <text x={LEFT - 8} y={at + 4} textAnchor="end" className="figures fill-ink">
              {formatNumber(value, 4)}
            </text>
          </g>
        );
      })}
      {across.ticks.map(({ place: at, text }) => (
        <text key={text} x={x(at - 0.5)} y={bottom + 18} textAnchor="middle" className="figures fill-ink">
          {text}
        </text>
      ))}
      <text x={width - RIGHT} y={bottom + 38} textAnchor="end" className="fill-quiet text-[13px]">
        {across.name}
        {across.unit.label && `, ${across.unit.label}`}
      </text>
      {lines.map((line) => (
        <LinePath key={line.label} line={line} x={x} y={y} />
      ))}
      {endLabels(lines, x, y).map(({ text, x: left, y: base }) => (
        <text key={text} x={left} y={base} className="fill-ink">
          {text}
        </text>
      ))}
    </svg>
  );
}

function LinePath({ line, x, y }: { line: Line; x: (i: number) => number; y: (value: number) => number }) {
  let d = "";
  let isDrawing = false;
  line.values.forEach((value, i) => {
    if (value !== null) d += `${isDrawing ? "L" : "M"}${x(i).toFixed(1)} ${y(value).toFixed(1)}`;
    isDrawing = value !== null;
  });
  return (
    <path
      d={d}
      className={line.isDown ? "fill-none stroke-stick" : "fill-none stroke-slip"}
      strokeWidth={2}
      strokeLinecap="round"
      strokeDasharray={line.isDown ? "7 4" : undefined}
    />
  );
}

const LABEL_HEIGHT = 14;

/** What each line is, behind its last value; moved apart where they would lie on each other. */
function endLabels(lines: readonly Line[], x: (i: number) => number, y: (value: number) => number) {
  const labels = lines.flatMap(({ label, values }) => {
    const there = values.flatMap((value, i) => (value === null ? [] : [{ i, value }]));
    const last = there.at(-1);
    return label === "" || !last ? [] : [{ text: label, x: x(last.i) + 8, y: y(last.value) + 4 }];
  });
  labels.sort((a, b) => b.y - a.y);
  for (let i = 1; i < labels.length; i++) labels[i].y = Math.min(labels[i].y, labels[i - 1].y - LABEL_HEIGHT);
  return labels;
}

function linesOf(cells: SweepCells, across: AxisScale, up: AxisScale | null, place: number): Line[] {
  const isBoth = cells.plan.continuation === "both";
  const rows = up?.count ?? 1;
  const every = Math.max(1, Math.ceil(rows / MOST_LINES));
  const branches = isBoth ? [false, true] : [cells.plan.continuation === "down"];
  return branches.flatMap((isDown) =>
    Array.from({ length: Math.ceil(rows / every) }, (_, k) => {
      const row = k * every;
      const first = row * across.count + (isBoth && isDown ? across.count * rows : 0);
      const name = up ? `${up.text(up.values[row])} ${up.unit.label}`.trim() : "";
      return {
        label: [name, isBoth ? (isDown ? "down" : "up") : ""].filter(Boolean).join(", "),
        isDown,
        values: Array.from({ length: across.count }, (_, i) => cells.read(first + i)?.quantities[place] ?? null),
      };
    }),
  );
}
