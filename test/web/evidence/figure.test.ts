import type { Samples } from "@restband/solver";
import { describe, expect, it } from "vitest";
import type { PlotTheme } from "../../../web/src/components/plot-theme.ts";
import { instantAt } from "../../../web/src/compute/instant.ts";
import { densified } from "../../../web/src/features/evidence/densified.ts";
import { curveOf } from "../../../web/src/features/evidence/curve.ts";
import { evidenceFigure } from "../../../web/src/features/evidence/evidence-figure.ts";
import { frameOf, padded, plotWidth, timeAt, xOf, yOf } from "../../../web/src/features/evidence/frame.ts";
import { runViewOf, type RunView } from "../../../web/src/features/evidence/run-view.ts";
import { scalesOf } from "../../../web/src/features/evidence/scales.ts";
import { thinned } from "../../../web/src/features/evidence/thin.ts";
import { coulombForces } from "../../support/scenario-builder.ts";
import { creepFeed, solved } from "../support/scenarios.ts";

const theme = {
  slip: "slip",
  stick: "stick",
  quiet: "quiet",
  band: "rgb(1, 2, 3)",
  "band-line": "band-line",
} as PlotTheme;
const viewOf = (run: ReturnType<typeof solved>): RunView => runViewOf(run.scenario, run.result) as RunView;
const feed = viewOf(solved(creepFeed, 20_001));

describe("thinning", () => {
  const times = Float64Array.from({ length: 100_000 }, (_, i) => i / 1000);
  const values = times.map((t) => Math.sin(t));

  it("keeps extremes and all that is asked for, and no more than it may", () => {
    values[12_345] = 7;
    values[54_321] = -7;
    const kept = thinned(times, values, { from: 0, to: 100 }, 2000, [777, 888]);
    expect(kept.length).toBeLessThanOrEqual(2002);
    for (const index of [0, 777, 888, 12_345, 54_321, 99_999]) expect(kept).toContain(index);
    expect([...kept]).toEqual([...kept].sort((a, b) => a - b));
  });

  it("looks at a part anew, with one sample beyond each end", () => {
    const kept = thinned(times, values, { from: 10.0005, to: 10.0995 }, 2000);
    expect([kept[0], kept[kept.length - 1]]).toEqual([10_000, 10_100]);
    expect(kept).toHaveLength(101);
  });
});

describe("a part seen closely", () => {
  const dense = densified(feed.samples, { from: 0.1, to: 0.102 });

  it("gets instants between its samples, all samples and events kept", () => {
    expect(dense.t.length).toBeGreaterThanOrEqual(1000);
    const seen = feed.samples.t.filter((t) => t >= 0.1 && t <= 0.102);
    for (const t of seen) expect(dense.t).toContain(t);
    expect([...dense.t]).toEqual([...dense.t].sort((a, b) => a - b));
    for (let i = 0; i < dense.t.length; i += 97) {
      expect(dense.x[i]).toBe(instantAt(feed.samples, dense.t[i]).x);
      expect(dense.phase[i]).toBe(instantAt(feed.samples, dense.t[i]).phase);
    }
  });

  it("is left as it is where there are samples enough", () => {
    expect(densified(feed.samples, { from: 0, to: 0.5 })).toBe(feed.samples);
  });
});

describe("a curve", () => {
  const unit = { label: "N", factor: 1 };
  const samples: Samples = {
    t: Float64Array.of(0, 1, 2, 3, 4),
    x: Float64Array.of(0, 0, 0, 1, 2),
    v: Float64Array.of(0, 0, 0, 1, 1),
    a: new Float64Array(5),
    f: Float64Array.of(0, -10, -5, -5, -5),
    phase: Float64Array.of(0, 0, 1, 1, 1),
  };
  const all = Int32Array.of(0, 1, 2, 3, 4);

  it("is parted into stuck and sliding; a jump is drawn where it is", () => {
    const { slip, stick } = curveOf(samples, "f", all, unit, false);
    // Stuck, friction goes on to −20 at the break-away, then jumps to −5.
    expect([...stick.x]).toEqual([0, 1, 2, NaN]);
    expect([...stick.y]).toEqual([0, -10, -20, NaN]);
    expect([...slip.x]).toEqual([2, 2, 3, 4]);
    expect([...slip.y]).toEqual([-20, -5, -5, -5]);
  });

  it("is continuous where the motion is", () => {
    const { slip, stick } = curveOf(samples, "x", all, unit, false);
    expect([...stick.y]).toEqual([0, 0, 0, NaN]);
    expect([...slip.y]).toEqual([0, 0, 1, 2]);
  });

  it("is one line where there are too many events to tell apart", () => {
    const { slip, stick } = curveOf(samples, "f", all, unit, true);
    expect(slip.x).toHaveLength(5);
    expect(stick.x).toHaveLength(0);
  });
});

describe("the frame", () => {
  const frame = frameOf(1160, { from: 0.1, to: 0.3 }, scalesOf(feed, { from: 0.1, to: 0.3 }));

  it("puts times and values where the plots have them", () => {
    expect(xOf(frame, 0.1)).toBe(frame.left);
    expect(xOf(frame, 0.3)).toBe(frame.width - frame.right);
    expect(timeAt(frame, xOf(frame, 0.237))).toBeCloseTo(0.237, 12);
    expect(timeAt(frame, -50)).toBe(0.1);
    const [panel] = frame.panels;
    expect(yOf(panel, panel.high)).toBe(panel.top);
    expect(yOf(panel, panel.low)).toBe(panel.top + panel.height);
  });

  it("gives the readings a gutter only where there is room", () => {
    const narrow = frameOf(390, { from: 0, to: 1 }, frame.panels);
    expect(plotWidth(narrow)).toBeGreaterThan(300);
    expect(frame.right).toBeGreaterThan(150);
  });

  it("opens a range of no height", () => {
    expect(padded(0, 0, 0.001)).toEqual({ low: -0.001, high: 0.001 });
    expect(padded(4, 4, 0.001)).toEqual({ low: 2, high: 6 });
  });

  it("holds the band and what friction can hold where the friction comes near", () => {
    const [displacement, , friction] = scalesOf(feed, { from: 0, to: 0.5 });
    expect(displacement.low).toBeLessThan(-7.4e-5);
    expect(displacement.high).toBeGreaterThan(0.001 + 7.4e-5);
    expect(friction.low).toBeLessThan(-296.5);
    expect(friction.high).toBeLessThan(100);
  });
});

describe("the figure", () => {
  it("has the rest band about the feed, in the panel's unit", () => {
    const frame = frameOf(1160, { from: 0, to: 0.5 }, scalesOf(feed, { from: 0, to: 0.5 }));
    const { data } = evidenceFigure(feed, frame, theme);
    const [lower, upper] = data as { y: Float64Array; fill?: string; fillpattern?: { shape: string } }[];
    expect(upper).toMatchObject({ fill: "tonexty", fillpattern: { shape: "-" } });
    expect(upper.y.at(-1)).toBeCloseTo(1 + 0.0741, 3);
    expect(lower.y.at(-1)).toBeCloseTo(1 - 0.0741, 3);
  });

  it("draws at most 4000 points a line, however many samples and events there are", () => {
    const shaken = viewOf(
      solved(
        {
          body: { inertia: 1, stiffness: 400 },
          contact: coulombForces(8),
          force: [{ kind: "harmonic", amplitude: 10, hz: 10 / (2 * Math.PI) }],
          span: { seconds: 400, untilRest: false },
        },
        40_001,
      ),
    );
    expect(shaken.eventTimes.length).toBeGreaterThan(2000);
    const range = { from: 0, to: shaken.end };
    const { data } = evidenceFigure(shaken, frameOf(1160, range, scalesOf(shaken, range)), theme);
    for (const trace of data as { x: Float64Array }[]) expect(trace.x.length).toBeLessThanOrEqual(4000);
  });

  it("keeps the plots where the frame says they are", () => {
    const range = { from: 0, to: 0.5 };
    const frame = frameOf(1160, range, scalesOf(feed, range));
    const { layout } = evidenceFigure(feed, frame, theme);
    const { margin, height } = layout;
    const plotHeight = height - (margin?.t ?? 0) - (margin?.b ?? 0);
    for (const [i, axis] of [layout.yaxis, layout.yaxis2, layout.yaxis3].entries()) {
      const [bottom, top] = axis?.domain as [number, number];
      expect((margin?.t ?? 0) + (1 - top) * plotHeight).toBeCloseTo(frame.panels[i].top, 9);
      expect((top - bottom) * plotHeight).toBeCloseTo(frame.panels[i].height, 9);
    }
  });
});
