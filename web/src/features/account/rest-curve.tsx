import { decayPoints, swingsToRest } from "./decay.ts";

const swings = swingsToRest(9.95, 0.485);
const points = decayPoints(swings, 24);
const rest = swings[swings.length - 1].to;

// The drawing is 1000 wide and as high as ±10.5 half widths of the band; it is stretched to its place, lines are not.
const reach = 10.5;
const firstAt = -20;
const perSwing = 75;
const restAt = firstAt + perSwing * swings.length;
const path = points
  .map(([t, x], i) => `${i ? "L" : "M"}${(firstAt + perSwing * t).toFixed(1)} ${(-x).toFixed(3)}`)
  .join("");
const percent = (x: number) => `${(50 - (x / reach) * 50).toFixed(2)}%`;

/** What the product is about, in one line: a motion that dies away and stays where it stops, inside the rest band. */
export function RestCurve() {
  return (
    <figure
      className="relative h-[220px] w-full overflow-hidden desk:h-[340px]"
      role="img"
      aria-label="A motion that dies away, swing by swing, and stays where it stops, inside the rest band."
    >
      <svg
        className="absolute inset-x-0 w-full"
        style={{ top: percent(1), height: `${100 / reach}%` }}
        aria-hidden="true"
      >
        <rect width="100%" height="100%" fill="url(#hatch-band)" />
      </svg>
      <div
        className="absolute inset-x-0 border-y-2 border-band-line"
        style={{ top: percent(1), height: `${100 / reach}%` }}
      />
      <svg
        className="absolute inset-0 size-full"
        viewBox={`0 ${-reach} 1000 ${2 * reach}`}
        preserveAspectRatio="none"
        aria-hidden="true"
      >
        <path d={path} className="fill-none stroke-slip stroke-[2.25px]" vectorEffect="non-scaling-stroke" />
        <path
          d={`M${restAt} ${-rest}H1000`}
          className="fill-none stroke-stick stroke-[4px]"
          vectorEffect="non-scaling-stroke"
        />
      </svg>
      <span
        className="absolute size-3.5 -translate-1/2 rounded-full border-2 border-ink bg-paper"
        style={{ left: `${restAt / 10}%`, top: percent(rest) }}
      />
      <span
        className="absolute -translate-x-1/4 -translate-y-full pb-2.5 text-13 whitespace-nowrap desk:-translate-x-1/2"
        style={{ left: `${restAt / 10}%`, top: percent(1) }}
      >
        stops here, and stays
      </span>
      <span
        className="absolute right-(--page-pad) pt-2 text-right text-13 text-band-line max-desk:w-[38%]"
        style={{ top: percent(-1) }}
      >
        rest band: wherever it stops in here, friction holds it
      </span>
    </figure>
  );
}
