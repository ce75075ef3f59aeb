import type { Annotation, Data, Layout } from "plotly.js-dist-min";
import { embeddedFaces } from "./embedded-faces.ts";
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

/** Above the plot, for the title. */
const HEAD = 40;

/** Pixels of a picture to a point of its plot. */
const SHARPNESS = 2;

/** Saves a plot as SVG, or as PNG with twice the points; the title, the page's words and its faces are written into it. */
export async function savePlot(sheet: PlotSheet, format: "svg" | "png", theme: PlotTheme): Promise<void> {
  const { drawingOf } = await import("./plotly-chart.tsx");
  const layout = sheetLayout(sheet, theme);
  const drawing = await withFaces(await drawingOf(sheet.data, layout), theme);
  const name = fileNameOf(sheet.title, format);
  if (format === "svg") saveFile(name, "image/svg+xml", drawing);
  else saveFile(name, "image/png", await pictureOf(drawing, layout));
}

/** A drawing with the faces it is written in: it is read where the page's own are not. */
async function withFaces(drawing: string, theme: PlotTheme): Promise<string> {
  const faces = await embeddedFaces(drawing, `${theme.text} ${theme.mono}`);
  return drawing.replace(/<svg[^>]*>/, (head) => `${head}<style>${faces}</style>`);
}

async function pictureOf(drawing: string, { width, height }: SizedLayout): Promise<Uint8Array<ArrayBuffer>> {
  const address = URL.createObjectURL(new Blob([drawing], { type: "image/svg+xml" }));
  try {
    const image = new Image();
    image.src = address;
    await image.decode();
    const canvas = Object.assign(document.createElement("canvas"), {
      width: SHARPNESS * width,
      height: SHARPNESS * height,
    });
    canvas.getContext("2d")?.drawImage(image, 0, 0, canvas.width, canvas.height);
    const picture = await new Promise<Blob | null>((settle) => canvas.toBlob(settle, "image/png"));
    if (!picture) throw new Error("The browser makes no picture of this size.");
    return new Uint8Array(await picture.arrayBuffer());
  } finally {
    URL.revokeObjectURL(address);
  }
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
    font: { family: theme.text, size, color: word.colour },
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
