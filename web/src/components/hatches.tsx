/**
 * The patterns of the look, drawn once for the whole page and used by `fill="url(#hatch-stick)"`. They lie in the
 * user space of whoever uses them, so stripes of neighbouring shapes meet; never rotate or scale a shape filled so.
 * Colours follow the theme by themselves.
 */
export function Hatches() {
  return (
    <svg width="0" height="0" aria-hidden="true" focusable="false" style={{ position: "absolute" }}>
      <defs>
        <Hatch id="hatch-stick" width={6} height={6} colour="--stick" ground="16%" line={1.7} d={diagonal(6)} />
        <Hatch
          id="hatch-band"
          width={8}
          height={5}
          colour="--band-line"
          groundColour="--band"
          ground="var(--band-fill)"
          line={1}
          opacity={0.5}
          crisp
          d="M0 2.5h8"
        />
        <Hatch id="hatch-broken" width={7} height={7} colour="--broken" ground="7%" line={0.9} d="M0 0l7 7M7 0l-7 7" />
        <Hatch id="hatch-ground" width={7} height={7} colour="--ink" ground="0%" line={1} d={diagonal(7)} />
        <Hatch
          id="hatch-loop"
          width={6}
          height={6}
          colour="--stick"
          ground="0%"
          line={1}
          opacity={0.45}
          d={diagonal(6)}
        />
        <Hatch id="hatch-back" width={4} height={6} colour="--slip" ground="15%" line={1.5} d="M2 0v6" />
        <Hatch id="hatch-never" width={6} height={6} colour="--quiet" ground="0%" dot={1} />
        <Hatch
          id="hatch-not-settled"
          width={8}
          height={8}
          colour="--slip"
          ground="0%"
          line={1.2}
          d="M0 4q2-4 4 0t4 0"
        />
        <Hatch id="hatch-rest" width={8} height={4} colour="--band-line" ground="0%" line={1} crisp d="M0 2h8" />
      </defs>
    </svg>
  );
}

interface HatchProps {
  id: string;
  width: number;
  height: number;
  /** Name of the token of the lines. */
  colour: string;
  /** Name of the token of the tint under them; that of the lines unless given. */
  groundColour?: string;
  /** Share of the tint. */
  ground: string;
  line?: number;
  opacity?: number;
  crisp?: boolean;
  d?: string;
  dot?: number;
}

function Hatch({ id, width, height, colour, groundColour = colour, ground, line, opacity, crisp, d, dot }: HatchProps) {
  const paint = `var(${colour})`;
  const tint = `color-mix(in srgb, var(${groundColour}) ${ground}, transparent)`;
  return (
    <pattern id={id} width={width} height={height} patternUnits="userSpaceOnUse">
      <rect width={width} height={height} style={{ fill: tint }} />
      {d && (
        <path
          d={d}
          strokeWidth={line}
          opacity={opacity}
          shapeRendering={crisp ? "crispEdges" : undefined}
          style={{ fill: "none", stroke: paint }}
        />
      )}
      {dot && <circle cx={width / 2} cy={height / 2} r={dot} style={{ fill: paint }} />}
    </pattern>
  );
}

/** A 45° stripe across a square tile, with the two corners that make it meet its neighbours. */
function diagonal(size: number): string {
  const half = size / 2;
  return `M0 ${size}l${size} -${size}M-${half} ${half}l${size} -${size}M${half} ${size + half}l${size} -${size}`;
}
