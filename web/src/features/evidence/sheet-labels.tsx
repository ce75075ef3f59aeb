interface SheetLabel {
  readonly text: string;
  readonly x: number;
  readonly y: number;
  readonly anchor: "start" | "middle" | "end";
  readonly tone: keyof typeof tones;
}

const tones = {
  slip: "fill-slip",
  stick: "fill-stick",
  quiet: "fill-quiet",
  ink: "fill-ink",
  "band-line": "fill-band-line",
};

/** Words at the lines of a sheet, each on a ground of its own, so that lines do not run through it. */
export function SheetLabels({ labels }: { labels: readonly SheetLabel[] }) {
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
