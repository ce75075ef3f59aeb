import { simulate, type Scenario } from "@restband/solver";
import { describe, expect, it } from "vitest";
import type { RunView } from "../../../web/src/features/evidence/run-view.ts";
import { runViewOf } from "../../../web/src/features/evidence/run-view.ts";
import { runSpectrum, type SpectrumChannel } from "../../../web/src/features/evidence/spectrum/run-spectrum.ts";
import { spectrumWindow, type WindowPart } from "../../../web/src/features/evidence/spectrum/spectrum-window.ts";
import { methodSentences, orderOf, spectrumWords } from "../../../web/src/features/evidence/spectrum/spectrum-words.ts";
import { buildScenario, coulombForces } from "../../support/scenario-builder.ts";
import { creepFeed, solved } from "../support/scenarios.ts";

function viewOf(scenario: Scenario): RunView {
  const view = runViewOf(scenario, solved(scenario).result);
  if (!view) throw new Error("no samples");
  return view;
}

function spectrumOf(view: RunView, channel: SpectrumChannel, part: WindowPart = "steady", seen = { from: 0, to: 1 }) {
  const window = spectrumWindow(view, part, seen);
  if (!window) throw new Error("no window");
  const { from, to, count } = window;
  const at = Array.from({ length: count }, (_, i) => from + (i * (to - from)) / count);
  const result = simulate(view.scenario, { samples: 0, at });
  const spectrum = "at" in result ? runSpectrum(view.scenario, result.at, window, channel) : null;
  if (!spectrum) throw new Error("no spectrum");
  return spectrum;
}

/** k = 4 kN/m, m = 10 kg (ω = 20 rad/s), ζ = 0.2 (c = 80 N·s/m), 50 N at 5 Hz; no friction. Its start has died away. */
const mount = buildScenario({
  body: { inertia: 10, stiffness: 4000, viscous: 80 },
  contact: { law: { model: "none" }, normal: { preload: 0 } },
  force: [{ kind: "harmonic", amplitude: 50, hz: 5 }],
  span: { seconds: 20.05, untilRest: false },
});

describe("the window of a spectrum", () => {
  it("is the last ten periods of the drive", () => {
    const window = spectrumWindow(viewOf(mount), "steady", { from: 0, to: 1 });
    expect(window).toMatchObject({ to: 20.05, rate: { hz: 5, name: "drive" }, periods: 10 });
    expect(window?.from).toBeCloseTo(18.05, 12);
  });

  it("is cut to whole periods, at its end, where a part of the run is chosen", () => {
    const window = spectrumWindow(viewOf(mount), "seen", { from: 3.05, to: 3.7 });
    expect(window).toMatchObject({ to: 3.7, periods: 3 });
    expect(window?.from).toBeCloseTo(3.1, 12);
    expect(spectrumWindow(viewOf(mount), "seen", { from: 3.05, to: 3.2 })).toMatchObject({ from: 3.05, periods: null });
  });

  it("goes from break-away to break-away under a feed", () => {
    const view = viewOf(creepFeed);
    const window = spectrumWindow(view, "steady", { from: 0, to: 1 });
    const starts = view.result.events.filter(({ kind, t }) => kind === "break-away" && t >= 0.25).map(({ t }) => t);
    expect(window).toMatchObject({ from: starts[0], to: starts.at(-1), periods: starts.length - 1 });
    expect(window?.rate).toEqual({
      hz: expect.closeTo(view.result.quantities.stickSlipHz ?? NaN, 9) as number,
      name: "stick–slip",
    });
  });

  it("is shortened where it holds more swings than instants can tell", () => {
    const long = {
      ...mount,
      force: [],
      span: { ...mount.span, seconds: 1e6 },
      initial: { displacement: 1, velocity: 0 },
    };
    const window = spectrumWindow({ ...viewOf(mount), scenario: long, driveHz: null }, "seen", { from: 0, to: 1e6 });
    expect(window).toMatchObject({ to: 1e6, count: 2 ** 18 });
    // 16 instants to each of its own periods, ω/2π = 3.18 Hz.
    expect(window && window.count / (window.to - window.from)).toBeCloseTo((16 * 20) / (2 * Math.PI), 6);
  });
});

describe("the spectrum of a run", () => {
  it("gives a driven mount the amplitudes of its closed form, (F/k)/√((1 − r²)² + (2ζr)²) and Ω, Ω² times that", () => {
    const view = viewOf(mount);
    const r = (2 * Math.PI * 5) / 20;
    const amplitude = 50 / 4000 / Math.hypot(1 - r * r, 2 * 0.2 * r);
    const omega = 2 * Math.PI * 5;
    for (const [channel, factor] of [
      ["displacement", 1],
      ["velocity", omega],
      ["acceleration", omega ** 2],
    ] as const) {
      const { peaks } = spectrumOf(view, channel);
      expect(peaks).toHaveLength(1);
      expect(peaks[0].hz).toBeCloseTo(5, 9);
      expect(peaks[0].amplitude / (factor * amplitude)).toBeCloseTo(1, 9);
    }
  });

  it("gives a slide without spring under a harmonic force a square of friction: 4F/(πn m) at its odd orders", () => {
    // Friction is the square wave −F sgn v; a = (P cos Ωt + f)/m. The 3rd order is friction's alone: 4F/(3π m).
    const slide = buildScenario({
      body: { inertia: 2, stiffness: 0 },
      contact: coulombForces(1),
      force: [{ kind: "harmonic", amplitude: 40, hz: 2 }],
      span: { seconds: 30, untilRest: false },
    });
    const { peaks } = spectrumOf(viewOf(slide), "acceleration");
    const third = peaks.find(({ hz }) => Math.abs(hz - 6) < 0.01);
    const fifth = peaks.find(({ hz }) => Math.abs(hz - 10) < 0.01);
    expect((third?.amplitude ?? 0) / (4 / (3 * Math.PI * 2))).toBeCloseTo(1, 2);
    expect((fifth?.amplitude ?? 0) / (4 / (5 * Math.PI * 2))).toBeCloseTo(1, 2);
  });

  it("tells the place under a feed from the drive, and its multiples by their order", () => {
    const spectrum = spectrumOf(viewOf(creepFeed), "displacement");
    const orders = spectrum.peaks.map(({ hz }) => orderOf(hz, spectrum.window));
    expect(orders.slice(0, 3)).toEqual(["1", "2", "3"]);
    // Half peak-to-peak of the cycle, 15 μm or so; a ramp would stand at millimetres.
    expect(spectrum.highest).toBeLessThan(20e-6);
  });

  it("of a body that never moves has no peaks", () => {
    const held = buildScenario({
      body: { inertia: 2, stiffness: 100 },
      contact: coulombForces(50),
      force: [{ kind: "harmonic", amplitude: 10, hz: 2 }],
      span: { seconds: 10, untilRest: false },
    });
    const spectrum = spectrumOf(viewOf(held), "velocity");
    expect(spectrum.peaks).toEqual([]);
    expect(spectrumWords(spectrum, held, "steady")).toBe(
      "Spectrum of the velocity over the last 10 periods of the drive: nothing swings.",
    );
  });
});

describe("a spectrum in words", () => {
  it("tells its window, its peaks and its orders", () => {
    expect(spectrumWords(spectrumOf(viewOf(mount), "velocity"), mount, "steady")).toBe(
      "Spectrum of the velocity over the last 10 periods of the drive. Orders are multiples of the drive's 5\u00a0Hz. " +
        "Peaks, highest first: 5\u00a0Hz, order 1, 246\u00a0mm/s.",
    );
  });

  it("says how it was made, and what leaks where periods are not whole", () => {
    const view = viewOf(mount);
    const whole = methodSentences(spectrumOf(view, "velocity"), view.result.outcome, "steady").join(" ");
    expect(whole).toContain("coherent gain 1/2");
    expect(whole).toContain("no zeros are added");
    expect(whole).toContain("The periods of the drive are whole");
    const released = buildScenario({
      body: { inertia: 10, stiffness: 4000 },
      contact: coulombForces(1),
      initial: { displacement: 0.05 },
      span: { seconds: 20 },
    });
    const free = viewOf(released);
    const leaking = methodSentences(spectrumOf(free, "velocity"), free.result.outcome, "steady").join(" ");
    expect(leaking).toContain("no whole number of periods");
    expect(leaking).toContain("does not keep its size");
  });
});
