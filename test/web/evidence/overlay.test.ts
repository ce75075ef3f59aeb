import { describe, expect, it } from "vitest";
import type { PlotTheme } from "../../../web/src/components/plot-theme.ts";
import { instantAt } from "../../../web/src/compute/instant.ts";
import { evidenceFigure } from "../../../web/src/features/evidence/evidence-figure.ts";
import { frameOf } from "../../../web/src/features/evidence/frame.ts";
import { overlayAt, type Overlay } from "../../../web/src/features/evidence/overlay.ts";
import { readingsAt } from "../../../web/src/features/evidence/readings.ts";
import { runViewOf, type RunView } from "../../../web/src/features/evidence/run-view.ts";
import { scalesOf } from "../../../web/src/features/evidence/scales.ts";
import { creepFeed, solved } from "../support/scenarios.ts";

const viewOf = (run: ReturnType<typeof solved>): RunView => runViewOf(run.scenario, run.result) as RunView;
const feed = viewOf(solved(creepFeed));
const faster = viewOf(
  solved({ ...creepFeed, base: creepFeed.base.map((term) => (term.kind === "ramp" ? { ...term, rate: 0.01 } : term)) }),
);
const overlay: Overlay = { key: "faster", label: "Faster feed", samples: faster.samples };
const range = { from: 0, to: feed.end };
const frame = frameOf(1160, range, scalesOf(feed, range, [], [overlay]));
const theme = { slip: "slip", stick: "stick", quiet: "quiet", band: "rgb(1, 2, 3)", "band-line": "line" } as PlotTheme;

describe("another motion over this one", () => {
  it("fits in, and is drawn dashed and quiet in displacement and velocity only", () => {
    const alone = scalesOf(feed, range);
    expect(frame.panels[0].high).toBeGreaterThan(4 * alone[0].high);
    expect(frame.panels[2].high).toBe(alone[2].high);
    const drawn =
      evidenceFigure(feed, frame, theme, [overlay]).data.length - evidenceFigure(feed, frame, theme).data.length;
    expect(drawn).toBe(2);
  });

  it("has its values at the cursor under its name", () => {
    const readings = readingsAt(feed, frame, 0.3, [overlay]);
    const there = instantAt(faster.samples, 0.3);
    expect(Number(readings.displacement.at(-1)?.text)).toBeCloseTo(1000 * there.x, 3);
    expect([readings.displacement, readings.velocity].map((list) => list.at(-1)?.name)).toEqual([
      "Faster feed",
      "Faster feed",
    ]);
    expect(readings.friction.map(({ name }) => name)).not.toContain("Faster feed");
  });

  it("has none beyond its end", () => {
    expect(overlayAt(overlay, 0.6)).toBeNull();
    expect(overlayAt(overlay, 0.5)?.t).toBe(0.5);
  });
});
