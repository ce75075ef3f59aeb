import { describe, expect, it } from "vitest";
import { sheetLayout } from "../../../web/src/components/plot-image.ts";
import type { PlotTheme } from "../../../web/src/components/plot-theme.ts";

const theme = { ink: "ink", raised: "raised", text: "face" } as PlotTheme;
const layout = { width: 400, height: 300, margin: { l: 50, r: 50, t: 40, b: 60 } };

describe("a plot as a file", () => {
  const sheet = sheetLayout(
    {
      title: "Z carriage",
      data: [],
      layout,
      words: [{ text: "feed", x: 200, y: 140, anchor: "middle", colour: "quiet" }],
    },
    theme,
  );

  it("has room for its title, its plots keeping their size, on a ground of its own", () => {
    expect(sheet.height - (sheet.margin?.t ?? 0)).toBe(300 - 40);
    expect(sheet.margin).toMatchObject({ l: 50, r: 50, b: 60 });
    expect(sheet.paper_bgcolor).toBe("raised");
    expect(sheet.annotations?.[0]).toMatchObject({ text: "Z carriage", font: { size: 16, color: "ink" } });
  });

  it("has the page's words where the page has them", () => {
    // 150 of 300 px along, 100 of 200 px down the plots.
    expect(sheet.annotations?.[1]).toMatchObject({
      text: "feed",
      x: 0.5,
      y: 0.5,
      xanchor: "center",
      yanchor: "bottom",
    });
  });
});
