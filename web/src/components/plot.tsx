import type { Data, Layout } from "plotly.js-dist-min";
import { Suspense, useState } from "react";
import { lazyPart } from "./lazy-part.ts";

const PlotlyChart = lazyPart(async () => (await import("./plotly-chart.tsx")).PlotlyChart);

interface PlotProps {
  data: Data[];
  /** With width and height: the plot keeps its place before it is drawn. */
  layout: Partial<Layout> & { width: number; height: number };
  /** What the plot shows, in words: extremes and outcome. */
  label: string;
}

/** A plot. Its library comes in a chunk of its own; until then its place stands empty and the page already answers. */
export function Plot({ data, layout, label }: PlotProps) {
  const [isDrawn, setDrawn] = useState(false);
  return (
    <div
      role="img"
      aria-label={label}
      data-drawn={isDrawn}
      style={{ width: layout.width, height: layout.height }}
      className="forced-color-adjust-none"
    >
      <Suspense fallback={<p className="late p-4 text-13 text-quiet">Drawing the plots</p>}>
        <PlotlyChart data={data} layout={layout} onDrawn={() => setDrawn(true)} />
      </Suspense>
    </div>
  );
}
