import { describe, expect, it } from "vitest";
import { bandScale } from "../../../web/src/features/sketch/band-scale.ts";
import { sketchLayout } from "../../../web/src/features/sketch/sketch-layout.ts";
import { shiftOf, sketchScale } from "../../../web/src/features/sketch/sketch-scale.ts";
import { boundsOf, labelBox, type Label, type Shape } from "../../../web/src/features/sketch/sketch-shapes.ts";
import { sketchWords } from "../../../web/src/features/sketch/sketch-words.ts";
import { cases, stateAt } from "./sketched.ts";

const labelsOf = (shapes: readonly Shape[]): Label[] => shapes.filter((shape) => shape.kind === "label");
const textsOf = (name: keyof typeof cases, share?: number): string[] =>
  labelsOf(sketchLayout(stateAt(cases[name], share), 380).shapes).map(({ text }) => text.replaceAll("\u00a0", " "));

const names = Object.keys(cases) as (keyof typeof cases)[];
const placed = names.flatMap((name) => [326, 380].map((width) => ({ name, width })));

describe.each(placed)("$name at $width px", ({ name, width }) => {
  const { shapes, height } = sketchLayout(stateAt(cases[name]), width);

  it("stays within its width and height", () => {
    const { left, right, top, bottom } = boundsOf(shapes);
    expect(left).toBeGreaterThanOrEqual(-0.5);
    expect(right).toBeLessThanOrEqual(width + 0.5);
    expect(top).toBeGreaterThanOrEqual(0);
    expect(bottom).toBeLessThanOrEqual(height);
    expect(height).toBeLessThan(440);
  });

  it("sets no label on another", () => {
    const labels = labelsOf(shapes);
    const clashes = labels.flatMap((one, i) =>
      labels
        .slice(i + 1)
        .filter((other) => overlap(one, other))
        .map((other) => `${one.text} | ${other.text}`),
    );
    expect(clashes).toEqual([]);
  });
});

function overlap(one: Label, other: Label): boolean {
  const [a, b] = [labelBox(one), labelBox(other)];
  // figures of neighbouring ticks may come close; two px of line height are free
  return a.left < b.right && b.left < a.right && a.top + 2 < b.bottom && b.top + 2 < a.bottom;
}

describe("the parts", () => {
  it("are told with their values", () => {
    expect(textsOf("feed")).toEqual(
      expect.arrayContaining(["120 kg", "4 N/μm", "350 N·s/m", "weight + 800 N", "feed 2 mm/s", "rest band ±74.1 μm"]),
    );
    expect(textsOf("forced")).toContain("12 N/mm, η 0.02");
    expect(textsOf("clamped")).toContain("2 faces, 3 N each");
    expect(textsOf("belt")).toContain("belt 1 mm/s");
    expect(textsOf("rising")).toContain("30°");
    expect(textsOf("shaken")).toContain("±10 mm at 5 Hz");
    expect(textsOf("rotor")).toEqual(
      expect.arrayContaining(["pads turn at 3 rad/s", "30 N·m/rad", "±50 mrad at 4 Hz"]),
    );
  });

  it("are left out where they are not", () => {
    const smooth = textsOf("smooth").join(" ");
    for (const word of ["rest band", "friction", "weight", "feed"]) expect(smooth).not.toContain(word);
    expect(textsOf("block").join(" ")).not.toMatch(/rest band|N\/m/);
  });

  it("stand on wheels where nothing rubs, on pads where faces do", () => {
    const discs = (name: keyof typeof cases): number =>
      sketchLayout(stateAt(cases[name]), 380).shapes.filter(({ kind }) => kind === "disc").length;
    expect([discs("smooth"), discs("feed"), discs("belt"), discs("shaken")]).toEqual([2, 0, 2, 3]);
  });
});

describe("the scale", () => {
  it("spans what the run reaches and the rest band, in round steps", () => {
    const { unit, ticks } = sketchScale(stateAt(cases.feed));
    expect(unit.label).toBe("μm");
    expect(ticks).toEqual([-100, -50, 0, 50, 100]);
    expect(sketchScale(stateAt(cases.clamped)).ticks).toEqual([-40, -20, 0, 20, 40]);
    expect(sketchScale(stateAt(cases.still)).ticks).toEqual([-1, -0.5, 0, 0.5, 1]);
  });

  it("has its needle where the body is, and the band about where it would stand", () => {
    const state = stateAt(cases.forced);
    const { band, place } = state;
    if (!band) throw new Error("no band");
    const shapes = bandScale(state, 444);
    const { low, high } = sketchScale(state);
    const at = (si: number): number => 22 + (400 * (1e3 * si - low)) / (high - low);
    const hatch = shapes.find((shape) => shape.kind === "area" && shape.fill === "hatch-band");
    const needle = shapes.find((shape) => shape.kind === "area" && shape.fill === "solid");
    expect(boundsOf([hatch as Shape]).left).toBeCloseTo(at(band.centre - band.half), 9);
    expect(boundsOf([hatch as Shape]).right).toBeCloseTo(at(band.centre + band.half), 9);
    expect(boundsOf([needle as Shape]).left + 5).toBeCloseTo(at(place), 9);
    expect(band.centre).toBeCloseTo(state.force / 1.2e4, 12);
  });

  it("points friction the way it acts, in the colour of the phase", () => {
    const arrowOf = (share: number) => {
      const state = stateAt(cases.feed, share);
      const [line] = bandScale(state, 380);
      if (line.kind !== "arrow") throw new Error("no arrow");
      return { state, tone: line.tone, isForward: line.to[0] > line.from[0] };
    };
    const stuck = arrowOf(0.04);
    expect([stuck.state.here.phase, stuck.tone]).toEqual([0, "stick"]);
    const slipping = arrowOf(0.0924);
    expect([slipping.state.here.phase, slipping.tone]).toEqual([1, "slip"]);
    expect([stuck.isForward, slipping.isForward]).toEqual([stuck.state.here.f > 0, slipping.state.here.f > 0]);
  });

  it("shifts the body with its place", () => {
    const range = { low: -2, high: 1 };
    expect(shiftOf({ place: 1, range }, 20)).toBe(10);
    expect(shiftOf({ place: -2, range }, 20)).toBe(-20);
    expect(shiftOf({ place: 0, range: { low: 0, high: 0 } }, 20)).toBe(0);
  });
});

describe("the sketch in words", () => {
  const wordsOf = (name: keyof typeof cases): string =>
    sketchWords(stateAt(cases[name], 0.04)).replaceAll("\u00a0", " ");

  it("tells the parts and how they stand", () => {
    const words = wordsOf("feed");
    expect(words).toMatch(/^Sketch\. A body of 120 kg with a spring of 4 N\/μm, a damper of 350 N·s\/m/);
    expect(words).toContain("within the rest band ±74.1 μm");
    expect(words).toMatch(/friction −\d+ N\.$/);
  });

  it("says nothing of what is not there", () => {
    expect(wordsOf("smooth")).not.toMatch(/rest band|friction|rubbing/);
    expect(wordsOf("falling")).toContain("a guide inclined by −20°");
  });
});
