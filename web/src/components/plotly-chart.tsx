import Plotly, { type Config, type Data, type Layout } from "plotly.js-dist-min";
import createPlotlyComponent from "react-plotly.js/factory";

const Chart = createPlotlyComponent(Plotly);

// Our own few buttons stand beside the plots; the plots themselves take no gestures.
const config: Partial<Config> = { displayModeBar: false, staticPlot: true, responsive: false };

interface PlotlyChartProps {
  data: Data[];
  layout: Partial<Layout>;
  onDrawn: () => void;
}

/** The drawing library, in a chunk of its own. */
export function PlotlyChart({ data, layout, onDrawn }: PlotlyChartProps) {
  return <Chart data={data} layout={layout} config={config} onInitialized={onDrawn} onUpdate={onDrawn} />;
}

/** A plot as a drawing, or as a picture of twice as many points; the bytes of the file. */
export async function imageOf(
  data: Data[],
  layout: Partial<Layout> & { width: number; height: number },
  format: "svg" | "png",
): Promise<Uint8Array<ArrayBuffer>> {
  const { width, height } = layout;
  const scale = format === "png" ? 2 : 1;
  const address = await Plotly.toImage({ data, layout, config }, { format, width, height, scale });
  const content = address.slice(address.indexOf(",") + 1);
  if (format === "svg") return new TextEncoder().encode(decodeURIComponent(content));
  return Uint8Array.from(atob(content), (sign) => sign.charCodeAt(0));
}
