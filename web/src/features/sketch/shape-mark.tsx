import { classNames } from "../../components/class-names.ts";
import type { Fill, Point, Shape, Tone } from "./sketch-shapes.ts";

const strokes: Record<Tone, string> = {
  ink: "stroke-ink",
  quiet: "stroke-quiet",
  slip: "stroke-slip",
  stick: "stroke-stick",
  band: "stroke-band-line",
};
const fills: Record<Tone, string> = {
  ink: "fill-ink",
  quiet: "fill-quiet",
  slip: "fill-slip",
  stick: "fill-stick",
  band: "fill-band-line",
};

/** One shape of the sketch. */
export function ShapeMark({ shape }: { shape: Shape }) {
  switch (shape.kind) {
    case "line":
      return (
        <path
          d={pathOf(shape.points)}
          className={classNames("fill-none", strokes[shape.tone])}
          strokeWidth={shape.width}
          strokeDasharray={shape.isDashed ? "4 3" : undefined}
          strokeLinejoin="round"
        />
      );
    case "area":
      return <path d={`${pathOf(shape.points)}Z`} {...painted(shape.fill, shape.tone, shape.width)} />;
    case "disc":
      return (
        <circle
          cx={shape.centre[0]}
          cy={shape.centre[1]}
          r={shape.radius}
          {...painted(shape.fill, shape.tone, shape.width)}
        />
      );
    case "arrow":
      return <Arrow from={shape.from} to={shape.to} tone={shape.tone} />;
    case "label":
      return (
        <text
          x={shape.at[0]}
          y={shape.at[1]}
          textAnchor={shape.anchor}
          dominantBaseline="central"
          className={classNames(
            fills[shape.tone],
            shape.isFigure && "figures",
            shape.isBold && shape.isFigure ? "text-15 font-bold" : "text-13",
            shape.isBold && "font-semibold",
          )}
        >
          {shape.text}
        </text>
      );
  }
}

function painted(fill: Fill, tone: Tone, width: number) {
  const hatch = fill.startsWith("hatch") ? `url(#${fill})` : undefined;
  return {
    fill: hatch,
    className: classNames(
      fill === "solid" && fills[tone],
      fill === "raised" && "fill-raised",
      fill === "none" && "fill-none",
      width > 0 && strokes[tone],
    ),
    strokeWidth: width > 0 ? width : undefined,
  };
}

const head = 7;

function Arrow({ from, to, tone }: { from: Point; to: Point; tone: Tone }) {
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]) || 1;
  const [ux, uy] = [(to[0] - from[0]) / length, (to[1] - from[1]) / length];
  const neck: Point = [to[0] - head * ux, to[1] - head * uy];
  const side = (sign: number): Point => [neck[0] - sign * 3.5 * uy, neck[1] + sign * 3.5 * ux];
  return (
    <>
      <path d={pathOf([from, neck])} className={classNames("fill-none", strokes[tone])} strokeWidth={1.5} />
      <path d={`${pathOf([to, side(1), side(-1)])}Z`} className={fills[tone]} />
    </>
  );
}

const pathOf = (points: readonly Point[]): string =>
  points.map(([x, y], i) => `${i === 0 ? "M" : "L"}${round(x)} ${round(y)}`).join("");

const round = (value: number): number => Math.round(value * 100) / 100;
