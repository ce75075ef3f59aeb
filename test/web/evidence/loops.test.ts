import { describe, expect, it } from "vitest";
import type { PlotTheme } from "../../../web/src/components/plot-theme.ts";
import { instantAt } from "../../../web/src/compute/instant.ts";
import { loopFigure } from "../../../web/src/features/evidence/loop-figure.ts";
import { loopFrames, loopPart } from "../../../web/src/features/evidence/loop-frame.ts";
import { acrossOf, downOf, loopLabels } from "../../../web/src/features/evidence/loop-labels.ts";
import { loopWords } from "../../../web/src/features/evidence/plot-words.ts";
import { runViewOf, type RunView } from "../../../web/src/features/evidence/run-view.ts";
import { scalesOf } from "../../../web/src/features/evidence/scales.ts";
import { coulombForces } from "../../support/scenario-builder.ts";
import { creepFeed, solved, variant } from "../support/scenarios.ts";

const viewOf = (run: ReturnType<typeof solved>): RunView => runViewOf(run.scenario, run.result) as RunView;
const feed = viewOf(solved(creepFeed));
const theme = { slip: "slip", stick: "stick", quiet: "quiet" } as PlotTheme;
const size = { width: 567, height: 340 };

describe("the loops", () => {
  const part = loopPart(feed, { from: 0, to: feed.end });
  const [phasePlane, forceLoop] = loopFrames(feed, part);

  it("show the last cycles of a run seen whole, and of a part all of it", () => {
    const starts = feed.result.events.filter(({ kind }) => kind === "break-away").map(({ t }) => t);
    expect(part.range).toEqual({ from: starts.at(-4), to: starts.at(-1) });
    expect(part.samples.t[0]).toBe(starts.at(-4));
    expect(part.samples.t.at(-1)).toBe(starts.at(-1));
    const seen = loopPart(feed, { from: 0.1, to: 0.15 });
    expect([seen.words, seen.range]).toEqual(["the part seen above", { from: 0.1, to: 0.15 }]);
    expect(seen.samples.t.every((t) => t >= 0.1 && t <= 0.15)).toBe(true);
  });

  it("measure from the drive and share that axis", () => {
    expect(phasePlane.across).toBe(forceLoop.across);
    expect(part.across.name).toBe("from the drive");
    part.places.forEach((place, i) => expect(place).toBeCloseTo(part.samples.x[i] - 0.002 * part.samples.t[i], 15));
  });

  it("draw the spring's line while stuck and the kinetic friction while slipping", () => {
    const { data } = loopFigure(feed, part, forceLoop, size, theme);
    const [slip, stick] = (data as { x: Float64Array; y: Float64Array; line: { color: string } }[]).slice(-2);
    expect([slip.line.color, stick.line.color]).toEqual(["slip", "stick"]);
    // Stuck, friction balances the spring, 4 N/μm, and the damper, which the feed draws at 2 mm/s.
    stick.x.forEach((micrometres, i) => {
      if (!Number.isNaN(micrometres)) expect(stick.y[i]).toBeCloseTo(4 * micrometres - 0.7, 6);
    });
    expect(Math.max(...slip.y.filter((force) => !Number.isNaN(force)))).toBeCloseTo(-181.84, 2);
    for (const { x } of [slip, stick]) expect(x.length).toBeLessThanOrEqual(4000);
  });

  it("name their lines, each word within the sheet", () => {
    const names = [phasePlane, forceLoop].map((frame) => loopLabels(feed, part, frame, size));
    expect(names[0].map(({ text }) => text)).toEqual(["feed", "slipping", "stuck", "breaks away", "stops"]);
    expect(names[1].map(({ text }) => text.replace("\u00a0", " "))).toEqual([
      "holds up to 296.5 N",
      "slipping",
      "stuck",
      "breaks away",
      "stops",
    ]);
    for (const { x, y } of names.flat()) {
      expect(x).toBeGreaterThan(0);
      expect(x).toBeLessThan(size.width);
      expect(y).toBeGreaterThan(0);
      expect(y).toBeLessThan(size.height);
    }
  });

  it("name no event that is at another place each time", () => {
    const released = viewOf(
      solved({
        body: { inertia: 1, stiffness: 100, viscous: 10 },
        contact: coulombForces(1),
        force: [2, 5, 9].map((peak, i) => ({ kind: "pulse", shape: "rectangle", peak, start: i, duration: 0.5 })),
        span: { seconds: 4, untilRest: false },
      }),
    );
    const whole = loopPart(released, { from: 0, to: released.end });
    const labels = loopLabels(released, whole, loopFrames(released, whole)[0], size);
    expect(released.result.events.filter(({ kind }) => kind === "break-away")).toHaveLength(6);
    expect(labels.map(({ text }) => text)).toEqual(["slipping", "stuck"]);
  });

  it("leave a word out rather than write it over another", () => {
    const braked = viewOf(
      solved({
        body: { inertia: 1, stiffness: 0 },
        contact: coulombForces(1, 1.1),
        initial: { velocity: 1 },
        span: { seconds: 5 },
      }),
    );
    const whole = loopPart(braked, { from: 0, to: braked.end });
    const labels = loopLabels(braked, whole, loopFrames(braked, whole)[1], { width: 300, height: 340 });
    expect(labels.map(({ text }) => text.replace("\u00a0", " "))).toEqual(["holds up to 1.1 N", "stuck", "stops"]);
    for (const { text, x, anchor } of labels)
      if (anchor === "start") expect(x + 7 * text.length).toBeLessThanOrEqual(296);
  });

  it("put a value where the plot has it", () => {
    expect(acrossOf(part.across, part.across.low, size)).toBe(64);
    expect(acrossOf(part.across, part.across.high, size)).toBe(size.width - 24);
    expect(downOf(forceLoop.upright, forceLoop.upright.high, size)).toBe(46);
  });

  it("are told in words", () => {
    expect(loopWords(feed, forceLoop).replaceAll("\u00a0", " ")).toMatch(
      /^Force against displacement: from the drive from −77\.6 μm to −41\.\d μm; friction on the carriage from −297 N to −182 N\. The carriage sticks and slips\.$/,
    );
  });
});

describe("the force that drives", () => {
  it("is what comes through spring and damper where the base moves", () => {
    const { a, f, t, x, v } = instantAt(feed.samples, 0.2);
    expect(feed.drive?.name).toBe("from the drive");
    expect(feed.drive?.at({ t, a, f })).toBeCloseTo(4e6 * (0.002 * t - x) + 350 * (0.002 - v), 6);
  });

  it("is the applied force where there is one, with its corners", () => {
    const pushed = viewOf(
      solved({
        body: { inertia: 1, stiffness: 100 },
        contact: coulombForces(1),
        force: [{ kind: "constant", value: 3 }],
        span: { seconds: 2, untilRest: false },
      }),
    );
    expect(pushed.drive?.name).toBe("applied force");
    expect(pushed.drive?.at({ t: 1, a: 0, f: 0 })).toBe(3);
    const keys = scalesOf(pushed, { from: 0, to: 2 }, ["drive", "acceleration"]).map(({ key }) => key);
    expect(keys).toEqual(["displacement", "velocity", "acceleration", "friction", "drive"]);
  });

  it("is not told where nothing drives", () => {
    const released = viewOf(solved(variant({ base: [], initial: { displacement: 0.001, velocity: 0 } })));
    expect(released.drive).toBeNull();
    expect(scalesOf(released, { from: 0, to: 0.1 }, ["drive"])).toHaveLength(3);
  });
});
