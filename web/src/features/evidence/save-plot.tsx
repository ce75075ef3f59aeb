import { savePlot, type PlotSheet } from "../../components/plot-image.ts";
import type { PlotTheme } from "../../components/plot-theme.ts";
import { announce } from "../../components/status.tsx";

interface SavePlotProps {
  /** What the plot is called, for those who hear the links alone. */
  name: string;
  sheet: () => PlotSheet;
  theme: PlotTheme;
}

/** The plot above as a file. */
export function SavePlot({ name, sheet, theme }: SavePlotProps) {
  const save = (format: "png" | "svg"): void =>
    void savePlot(sheet(), format, theme).catch(() => announce("The plot could not be drawn as a file."));
  return (
    <span className="text-13 font-normal text-quiet">
      save as{" "}
      <button type="button" className="link hit" aria-label={`Save ${name} as PNG`} onClick={() => save("png")}>
        PNG
      </button>{" "}
      ·{" "}
      <button type="button" className="link hit" aria-label={`Save ${name} as SVG`} onClick={() => save("svg")}>
        SVG
      </button>
    </span>
  );
}
