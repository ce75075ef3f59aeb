import { cellOutcomes, type Outcome, type Scenario } from "@restband/solver";
import { usePlotTheme } from "../../../components/plot-theme.ts";
import { say } from "../../../format/format-quantity.ts";
import { outcomeWords } from "../../../format/outcomes.ts";
import { measureOfQuantity, quantityNamed } from "../../../format/quantities.ts";
import { rampColours } from "./colour-ramp.ts";
import { outcomeMarks, verdictMarks } from "./outcome-marks.ts";
import { valueOn, type Shown } from "./shown.ts";
import type { SweepCells } from "./sweep-cells.ts";

interface MapLegendProps {
  shown: Shown;
  cells: SweepCells;
  /** Name of the quantity shown. */
  quantity: string;
  scenario: Scenario;
  edition: number;
}

/** What the patterns of the map mean; or the scale of the quantity, with its ends. */
export function MapLegend({ shown, cells, quantity, scenario }: MapLegendProps) {
  if (shown.kind === "quantity")
    return <Scale shown={shown} quantity={quantity} scenario={scenario} hasLines={cells.plan.axes.length === 2} />;
  if (shown.kind === "limit") return <Verdicts />;
  const codes = new Set<number>();
  let isPending = false;
  for (let cell = 0; cell < cells.count; cell++) {
    const code = cells.code(cell);
    if (code === null) isPending = true;
    else codes.add(Math.max(-1, code));
  }
  return (
    <ul className="mt-3 flex flex-wrap gap-x-6 gap-y-2 text-13 text-quiet" aria-label="What the patterns mean">
      {cellOutcomes
        .filter((_, code) => codes.has(code))
        .map((outcome) => (
          <li key={outcome} className="flex items-center gap-2">
            <Swatch outcome={outcome} />
            {outcome === "stick-slip" ? "sticks and slips: hatched for the share of time stuck" : outcomeWords[outcome]}
          </li>
        ))}
      {codes.has(-1) && (
        <li className="flex items-center gap-2">
          <svg width="36" height="22" className="border border-line" aria-hidden="true">
            <path d="M2 2l32 18m0 -18l-32 18" className="stroke-edge" />
          </svg>
          refused or cut off
        </li>
      )}
      {isPending && (
        <li className="flex items-center gap-2">
          <svg width="36" height="22" className="border border-line" aria-hidden="true">
            <circle cx="18" cy="11" r="1.5" className="fill-quiet" />
          </svg>
          still to come
        </li>
      )}
    </ul>
  );
}

function Verdicts() {
  return (
    <ul className="mt-3 flex flex-wrap gap-x-6 gap-y-2 text-13 text-quiet" aria-label="What the patterns mean">
      {(["kept", "broken"] as const).map((verdict) => (
        <li key={verdict} className="flex items-center gap-2">
          <svg width="36" height="22" aria-hidden="true" className="bg-raised forced-color-adjust-none">
            <rect width={36} height={22} fill={verdictMarks[verdict].fill} />
          </svg>
          {verdict}
        </li>
      ))}
      <li>Open: cannot be judged, or no answer.</li>
    </ul>
  );
}

function Swatch({ outcome }: { outcome: Outcome }) {
  return (
    <svg width="36" height="22" aria-hidden="true" className="bg-raised forced-color-adjust-none">
      {outcome === "stick-slip" ? (
        <>
          <rect x={16} width={20} height={11} className="fill-slip" />
          <rect y={8} width={16} height={11} fill="url(#hatch-stick)" />
        </>
      ) : (
        <rect width={36} height={outcome === "smooth-sliding" ? 11 : 22} fill={outcomeMarks[outcome].fill} />
      )}
    </svg>
  );
}

interface ScaleProps {
  shown: Extract<Shown, { kind: "quantity" }>;
  quantity: string;
  scenario: Scenario;
  /** Of one field alone there are none. */
  hasLines: boolean;
}

function Scale({ shown, quantity, scenario, hasLines }: ScaleProps) {
  const colours = rampColours(usePlotTheme());
  const measure = measureOfQuantity(quantity, scenario.motion);
  const width = 220;
  return (
    <div className="mt-3 flex flex-wrap items-center gap-3 text-13 text-quiet">
      <span>{quantityNamed(quantity)?.label}</span>
      <span className="figures">{say(shown.low, measure)}</span>
      <svg width={width} height="14" aria-hidden="true" className="border border-edge forced-color-adjust-none">
        {colours.map((colour, i) => (
          <rect
            key={colour + i}
            x={(i * width) / colours.length}
            width={width / colours.length + 1}
            height={14}
            fill={colour}
          />
        ))}
      </svg>
      <span className="figures">{say(shown.high, measure)}</span>
      {shown.isLog && <span>By ratio; its middle is {say(valueOn(shown, 0.5), measure)}.</span>}
      {hasLines && <span>Lines part the scale in six.</span>}
    </div>
  );
}
