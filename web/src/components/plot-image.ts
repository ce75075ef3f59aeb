import type { Annotation, Data, Layout } from "plotly.js-dist-min";
import type { PlotTheme } from "./plot-theme.ts";
import { fileNameOf, saveFile } from "./save-file.ts";

/** A word that the page writes over a plot, px from the plot's top left to its baseline. */
export interface PlotWord {
  readonly text: string;
  readonly x: number;
  readonly y: number;
  readonly anchor: "start" | "middle" | "end";
  readonly colour: string;
}

/** A plot with everything a file of it must say by itself. */
export interface PlotSheet {
  readonly title: string;
  readonly data: Data[];
  readonly layout: SizedLayout;
  readonly words: readonly PlotWord[];
}

type SizedLayout = Partial<Layout> & { width: number; height: number };

/** A picture is drawn without the page's own faces: words must be measured in the one they are drawn in. */
const FACE = "Arial, Helvetica, sans-serif";

/** Above the plot, for the title. */
const HEAD = 40;

/** Saves a plot as SVG, or as PNG with twice the points; the title and the page's words are written into it. */
export async function savePlot(sheet: PlotSheet, format: "svg" | "png", theme: PlotTheme): Promise<void> {
  const { imageOf } = await import("./plotly-chart.tsx");
  const bytes = await imageOf(sheet.data, sheetLayout(sheet, theme), format);
  saveFile(fileNameOf(sheet.title, format), format === "svg" ? "image/svg+xml" : "image/png", bytes);
}

/** The layout on its own ground, taller by the title; the plots keep their size. */
export function sheetLayout({ title, layout, words }: PlotSheet, theme: PlotTheme): SizedLayout {
  const { l = 0, r = 0, t = 0, b = 0 } = layout.margin ?? {};
  const [wide, tall] = [layout.width - l - r, layout.height - t - b];
  const written = (word: PlotWord, size = 13): Partial<Annotation> => ({
    text: word.text,
    xref: "paper",
    yref: "paper",
    x: (word.x - l) / wide,
    y: 1 - (word.y - t) / tall,
    xanchor: ({ start: "left", middle: "center", end: "right" } as const)[word.anchor],
    yanchor: "bottom",
    showarrow: false,
    font: { family: FACE, size, color: word.colour },
  });
  const head: PlotWord = { text: title, x: 16, y: -HEAD + 30, anchor: "start", colour: theme.ink };
  return {
    ...layout,
    height: layout.height + HEAD,
    margin: { ...layout.margin, t: t + HEAD },
    paper_bgcolor: theme.raised,
    annotations: [written(head, 16), ...words.map((word) => written(word))],
  };
}
