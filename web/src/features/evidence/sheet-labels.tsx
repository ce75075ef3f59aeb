import type { LoopLabel } from "./loop-labels.ts";

const tones: Record<LoopLabel["tone"], string> = {
  slip: "fill-slip",
  stick: "fill-stick",
  quiet: "fill-quiet",
  ink: "fill-ink",
};

/** Words at the lines of a sheet, each on a ground of its own, so that lines do not run through it. */
export function SheetLabels({ labels }: { labels: readonly LoopLabel[] }) {
  return labels.map(({ text, x, y, anchor, tone }) => (
    <text
      key={`${text} ${x} ${y}`}
      x={x}
      y={y}
      textAnchor={anchor}
      className={`${tones[tone]} stroke-raised text-13`}
      strokeWidth={4}
      strokeLinejoin="round"
      paintOrder="stroke"
    >
      {text}
    </text>
  ));
}
