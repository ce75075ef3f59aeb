import { describe, expect, it } from "vitest";
import { inputsOf } from "../../../web/src/compute/inputs.ts";
import { instantAt } from "../../../web/src/compute/instant.ts";
import { intervalsOf, shownEnd } from "../../../web/src/compute/intervals.ts";
import { eventsCsv } from "../../../web/src/features/evidence/event-columns.ts";
import { frameOf } from "../../../web/src/features/evidence/frame.ts";
import { scalesOf } from "../../../web/src/features/evidence/scales.ts";
import { figureWords, stripWords } from "../../../web/src/features/evidence/plot-words.ts";
import { phaseWords, readingsAt } from "../../../web/src/features/evidence/readings.ts";
import {
  firstCursor,
  lastCycles,
  neighbourEvent,
  runViewOf,
  type RunView,
} from "../../../web/src/features/evidence/run-view.ts";
import { coulombForces } from "../../support/scenario-builder.ts";
import { creepFeed, solved, variant } from "../support/scenarios.ts";

const viewOf = (run: ReturnType<typeof solved>): RunView => {
  const view = runViewOf(run.scenario, run.result);
  if (!view) throw new Error("no samples");
  return view;
};
const feed = viewOf(solved(creepFeed));
const block = solved({
  body: { inertia: 0.5, stiffness: 245 },
  contact: coulombForces(0.49),
  initial: { displacement: 0.03 },
  span: { seconds: 10 },
});

describe("the phases of a run", () => {
  it("begin and end at its events, to the last bit", () => {
    const times = feed.result.events.filter(({ kind }) => kind === "stop" || kind === "break-away").map(({ t }) => t);
    expect(feed.intervals.slice(1).map(({ from }) => from)).toEqual(times);
    expect(feed.intervals[0]).toEqual({ from: 0, to: times[0], phase: 0 });
    expect(feed.intervals.at(-1)?.to).toBe(0.5);
  });

  it("are the same from the fewest samples as from many", () => {
    const few = solved(creepFeed, 2).result.samples;
    expect(few && intervalsOf(few, 0.5)).toEqual(feed.intervals);
  });

  it("show a body that rests for a while longer, not beyond the span", () => {
    const end = block.result.events.at(-1)?.t ?? 0;
    expect(shownEnd(block.scenario, block.result)).toBeCloseTo(1.1 * end, 12);
    const view = viewOf(block);
    expect(view.intervals.at(-1)).toEqual({ from: end, to: view.end, phase: 0 });
    expect(instantAt(view.samples, view.end)).toMatchObject({ v: 0, a: 0, phase: 0 });
    const short = { ...block.scenario, span: { ...block.scenario.span, seconds: end * 1.01 } };
    expect(shownEnd(short, block.result)).toBe(end * 1.01);
  });
});

describe("the body at any time", () => {
  it("is exact at events and close to the closed form between samples", () => {
    // Before it first turns the block moves as x = xk + (x0 − xk) cos ωt, friction +0.49 N on it.
    const omega = Math.sqrt(245 / 0.5);
    const t = 0.0512345;
    const here = instantAt(viewOf(block).samples, t);
    expect(here.x).toBeCloseTo(0.002 + 0.028 * Math.cos(omega * t), 9);
    expect(here.v).toBeCloseTo(-0.028 * omega * Math.sin(omega * t), 7);
    expect(here.f).toBeCloseTo(0.49, 12);
    expect(here.phase).toBe(-1);
  });

  it("keeps friction as it was up to the event that changes it", () => {
    const event = feed.result.events[1];
    const before = instantAt(feed.samples, event.t - 1e-7);
    expect(before.phase).toBe(0);
    expect(before.f).toBeCloseTo(-296.5, 1);
    expect(instantAt(feed.samples, event.t).f).toBeCloseTo(-237.2, 1);
  });
});

describe("the inputs", () => {
  it("say where the body would stand without friction, and how far friction can hold it off", () => {
    const inputs = inputsOf(creepFeed);
    expect(inputs.base(0.25)).toBeCloseTo(0.0005, 15);
    expect(inputs.equilibrium(0.25)).toBeCloseTo(0.0005, 15);
    // 0.15 · (800 + 120 · 9.80665) N, over 4·10⁶ N/m
    expect(inputs.hold(0)).toBeCloseTo(296.5197, 4);
    expect(inputs.restBand).toBeCloseTo(7.412993e-5, 10);
  });

  it("count weight, constant force, a ripple of the pressing force, and a spring that is not straight", () => {
    const { contact } = creepFeed;
    const tilted = variant({
      incline: 90,
      base: [],
      limits: [],
      contact: { ...contact, normal: { ...contact.normal, weight: false } },
    });
    expect(inputsOf(tilted).equilibrium(0)).toBeCloseTo((-120 * 9.80665) / 4e6, 12);
    const rippled = variant({
      contact: {
        ...contact,
        normal: { ...contact.normal, weight: false, ripple: { amplitude: 100, hz: 10, phase: 90 } },
      },
    });
    expect(inputsOf(rippled).hold(0)).toBeCloseTo(120, 9);
    expect(inputsOf(rippled).hold(0.025)).toBeCloseTo(0.15 * 700, 9);
    const stiffening = variant({
      base: [],
      force: [{ kind: "constant", value: 3 }],
      body: { inertia: 1, stiffness: 1, cubic: 2, viscous: 0 },
    });
    expect(inputsOf(stiffening).equilibrium(0)).toBeCloseTo(1, 12);
    expect(inputsOf(variant({ body: { ...creepFeed.body, stiffness: 0 }, limits: [] })).equilibrium(0)).toBeNull();
  });
});

describe("the times to look at the inputs", () => {
  it("are two where nothing changes, and hold every corner of what does", () => {
    const still = inputsOf(variant({ base: [], limits: [] }));
    expect(still.times(0, 10)).toEqual([0, 10]);
    const moved = inputsOf(
      variant({ base: [{ kind: "move", distance: 0.01, speed: 0.02, acceleration: 0.5, start: 0.333 }], limits: [] }),
    );
    // Speeding up for 0.04 s, 0.46 s at speed, 0.04 s down.
    for (const corner of [0.333, 0.373, 0.833, 0.873])
      expect(moved.times(0, 10)?.some((t) => Math.abs(t - corner) < 1e-12)).toBe(true);
  });

  it("are none where the inputs swing too often to be drawn", () => {
    const shaken = inputsOf(variant({ force: [{ kind: "harmonic", amplitude: 1, hz: 25, phase: 0 }] }));
    expect(shaken.times(0, 1)).toHaveLength(601);
    expect(shaken.times(0, 600)).toBeNull();
  });
});

describe("the cursor", () => {
  it("goes from event to event and stays at the ends", () => {
    const times = feed.eventTimes;
    expect(neighbourEvent(feed, 0, 1)).toBe(times[1]);
    expect(neighbourEvent(feed, times[3], -1)).toBe(times[2]);
    expect(neighbourEvent(feed, times[3] + 1e-9, -1)).toBe(times[3]);
    expect(neighbourEvent(feed, 0, -1)).toBeNull();
    expect(neighbourEvent(feed, feed.end, 1)).toBeNull();
    expect(firstCursor(feed)).toBeGreaterThan(0);
    expect(firstCursor(feed)).toBeLessThan(feed.end);
  });

  it("reads the values of its instant", () => {
    const stop = feed.result.events.find(({ kind }) => kind === "stop");
    const range = { from: 0, to: feed.end };
    const readings = readingsAt(feed, frameOf(1160, range, scalesOf(feed, range)), stop?.t ?? 0);
    const say = (list: { name: string; text: string; unit: string }[]): string[] =>
      list.map(({ name, text, unit }) => `${name} ${text} ${unit}`);
    expect(say(readings.displacement)).toEqual([
      "carriage 0.07739 mm",
      "drive 0.1227 mm",
      "behind drive −45.28 μm",
      "rest band ±74.1 μm",
    ]);
    expect(say(readings.velocity)[0]).toBe("velocity 0 mm/s");
    expect(say(readings.friction)).toEqual(["friction −181.8 N", "heat in contact 0 W", "holds up to 296.5 N"]);
  });

  it("reads a zero where sums leave a trillionth of the channel's peak", () => {
    const range = { from: 0, to: feed.end };
    const a = feed.samples.a.slice();
    a[5] = 1e-12 * feed.peaks.a;
    const noisy = { ...feed, samples: { ...feed.samples, a } };
    const readings = readingsAt(noisy, frameOf(1160, range, scalesOf(feed, range)), feed.samples.t[5]);
    expect(readings.velocity.find(({ name }) => name === "acceleration")).toMatchObject({ text: "0" });
  });

  it("tells the phase and how long it has lasted", () => {
    expect(phaseWords(feed, 0.01)).toEqual({ phase: "stuck", since: " for 10\u00a0ms" });
    expect(phaseWords(feed, feed.eventTimes[1])).toEqual({ phase: "slipping forward", since: "" });
  });

  it("knows the last cycles where there are any", () => {
    const starts = feed.result.events.filter(({ kind }) => kind === "break-away").map(({ t }) => t);
    expect(lastCycles(feed)).toEqual({ from: starts.at(-4), to: starts.at(-1) });
    expect(lastCycles(feed, 1)).toEqual({ from: starts.at(-2), to: starts.at(-1) });
    expect(lastCycles(feed, starts.length - 1)).toBeNull();
    expect(lastCycles(viewOf(block))).toBeNull();
  });

  it("counts the cycles of a body that is driven by its drive's periods", () => {
    const driven = viewOf(
      solved({
        body: { inertia: 1, stiffness: 100 },
        contact: coulombForces(0.1),
        force: [{ kind: "harmonic", amplitude: 5, hz: 2 }],
        span: { seconds: 4, untilRest: false },
      }),
    );
    expect(lastCycles(driven)).toEqual({ from: 2.5, to: 4 });
    expect(lastCycles(driven, 7)).toEqual({ from: 0.5, to: 4 });
    expect(lastCycles(driven, 8)).toBeNull();
  });
});

describe("words and tables", () => {
  it("tell the figure to those who cannot see it", () => {
    const whole = { from: 0, to: feed.end };
    const frame = frameOf(1160, whole, scalesOf(feed, whole));
    expect(figureWords(feed, frame).replaceAll("\u00a0", " ")).toMatch(
      /^Over 0\.5 s: displacement of the carriage from 0 mm to 0\.9\d+ mm, with the rest band of ±74\.1 μm about its equilibrium; velocity from .* to 5\.\d+ mm\/s; friction force from −297 N to .*\. The carriage sticks and slips\.$/,
    );
    expect(stripWords(feed.intervals)).toMatch(/^Motion: stuck \w+ times, for \d\d % of the time shown\.$/);
    expect(stripWords([{ from: 0, to: 1, phase: 0 }])).toBe("Motion: it is stuck throughout.");
    expect(stripWords([{ from: 0, to: 1, phase: 1 }])).toBe("Motion: it slides throughout and is never stuck.");
  });

  it("write all events as CSV with full digits and units in the head", () => {
    const [head, first, second, ...others] = eventsCsv(feed).split("\r\n");
    expect(head).toBe('"event","time, s","position, mm","from the drive, μm","friction, N","until next, ms"');
    expect(first.startsWith('"starts",0,0,0,')).toBe(true);
    expect(second.split(",")[1]).toBe(String(feed.result.events[1].t));
    expect(others).toHaveLength(feed.result.events.length - 2);
  });
});
