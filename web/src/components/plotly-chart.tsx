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

/** A plot as a drawing: the text of an SVG file. */
export async function drawingOf(
  data: Data[],
  layout: Partial<Layout> & { width: number; height: number },
): Promise<string> {
  const { width, height } = layout;
  const address = await Plotly.toImage({ data, layout, config }, { format: "svg", width, height });
  return decodeURIComponent(address.slice(address.indexOf(",") + 1));
}
