import { describe, expect, it } from "vitest";
import { startEntries } from "../../../web/src/features/reckoning/formula/entries.ts";
import type { Values } from "../../../web/src/features/reckoning/formula/formula.ts";
import { sheetFor, type SheetKey } from "../../../web/src/features/reckoning/sheets/index.ts";
import { takenFrom } from "../../../web/src/features/reckoning/sheets/taken-from.ts";
import type { Way } from "../../../web/src/features/reckoning/sheets/way.ts";
import { creepFeed, variant } from "../support/scenarios.ts";
import { formulaOf } from "./all-formulas.ts";

const wayOf = (sheet: SheetKey, key: string): Way => formulaOf(sheetFor[sheet]("linear").ways, key);

/* Each expected number is worked by hand beside it, SI throughout. */
it.each<[SheetKey, string, Record<string, number>, number]>([
  // 2 · 10 / (0.2 · 0.008)
  ["bolts", "torque", { count: 2, torque: 10, factor: 0.2, diameter: 0.008, spread: 0.25 }, 12500],
  // M8: d − 0.9382 p = 6.82725 mm; A = 36.6085 mm²; · 0.75 · 580 N/mm² = 36.6085 · 435
  ["bolts", "class", { count: 1, share: 0.75, proof: 580e6, diameter: 0.008, pitch: 0.00125, spread: 0.25 }, 15924.7],
  // μφ = 0.3 · 4.712389 = 1.413717; exp = 4.111207; 200 · 3.111207 / 0.3
  ["band-brake", "helped", { pull: 200, friction: 0.3, wrap: 270, radius: 0.1 }, 2074.138],
  // 200 · (1 − 1 / 4.111207) / 0.3 = 200 · 0.7567624 / 0.3
  ["band-brake", "opposed", { pull: 200, friction: 0.3, wrap: 270, radius: 0.1 }, 504.5083],
  ["band-brake", "both", { pull: 200, friction: 0.3, wrap: 270, radius: 0.1 }, 504.5083],
  // δ = ln 2 / 3 = 0.2310491; ζ = δ / √(39.47842 + 0.05338) = 0.03674776; 2 ζ √(4e6 · 100) = 40000 ζ
  ["damping", "peaks", { first: 0.01, last: 0.005, cycles: 3, stiffness: 4e6, inertia: 100 }, 1469.91],
  // ζ = 0.2 / √(39.47842 + 0.04) = 0.03181476; 40000 ζ
  ["damping", "decrement", { decrement: 0.2, stiffness: 4e6, inertia: 100 }, 1272.59],
  // 2 · 0.05 · 20000
  ["damping", "ratio", { ratio: 0.05, stiffness: 4e6, inertia: 100 }, 2000],
  // ln 2 / (3 π)
  ["loss-from-decay", "peaks", { first: 2, last: 1, cycles: 3 }, 0.0735453],
  // 0.0314159 / π
  ["loss-from-decay", "decrement", { decrement: 0.0314159 }, 0.01],
])("%s, %s, of %o is %d", (sheet, key, values, expected) => {
  expect(wayOf(sheet, key).value(values) / expected).toBeCloseTo(1, 5);
});

describe("bolts", () => {
  it("carry the spread of the tightening as the range", () => {
    const values = { count: 1, torque: 10, factor: 0.2, diameter: 0.008, spread: 0.25 };
    expect(wayOf("bolts", "torque").range?.(values)).toEqual({ low: 4687.5, high: 7812.5 });
  });

  it("have the stress areas that tables of metric threads print, mm²", () => {
    const printedAreas: Record<string, number> = {
      M3: 5.03,
      M6: 20.1,
      M8: 36.6,
      M10: 58,
      M12: 84.3,
      M16: 157,
      M24: 353,
    };
    const way = wayOf("bolts", "class");
    const options = way.presets?.find(({ label }) => label === "Thread")?.options ?? [];
    for (const [label, area] of Object.entries(printedAreas)) {
      const thread = options.find((option) => option.label === label)?.values as Values;
      expect(way.value({ count: 1, share: 1, proof: 1e6, spread: 0, ...thread }) / area).toBeCloseTo(1, 2);
    }
  });
});

describe("a band brake", () => {
  const band = { pull: 200, friction: 0.3, wrap: 270, radius: 0.1 };

  /** Follows the band's tension around the drum, dT = μ T dφ, by small steps: the torque it brakes with. */
  function torqueAround(pull: number, friction: number, degrees: number, radius: number, sign: 1 | -1): number {
    const steps = 200_000;
    const step = (degrees * Math.PI) / 180 / steps;
    let tension = pull;
    // The middle of each step, so that the error falls with its square.
    for (let i = 0; i < steps; i++) tension += sign * friction * step * tension * (1 + (sign * friction * step) / 2);
    return sign * (tension - pull) * radius;
  }

  it("has as a pad the torque of its own tensions, in either direction", () => {
    const pad = (preload: number): number => band.friction * preload * band.radius;
    expect(pad(wayOf("band-brake", "helped").value(band))).toBeCloseTo(torqueAround(200, 0.3, 270, 0.1, 1), 6);
    expect(pad(wayOf("band-brake", "opposed").value(band))).toBeCloseTo(torqueAround(200, 0.3, 270, 0.1, -1), 6);
  });

  it("that turns both ways has the range from the weaker to the stronger direction", () => {
    const { low, high } = wayOf("band-brake", "both").range?.(band) ?? {};
    expect(low).toBe(wayOf("band-brake", "opposed").value(band));
    expect(high).toBe(wayOf("band-brake", "helped").value(band));
  });

  it("is both ways alike where there is next to no friction: N = T φ", () => {
    const faint = { ...band, friction: 1e-9 };
    const wrap = (270 * Math.PI) / 180;
    expect(wayOf("band-brake", "helped").value(faint) / (200 * wrap)).toBeCloseTo(1, 8);
    expect(wayOf("band-brake", "opposed").value(faint) / (200 * wrap)).toBeCloseTo(1, 8);
  });

  it("says how different the directions are", () => {
    // μ N R: 0.3 · 2074.14 · 0.1 = 62.2 N·m; 0.3 · 504.508 · 0.1 = 15.1 N·m
    expect(wayOf("band-brake", "helped").remarks?.(band)).toEqual([
      "The band brakes with 62.2\u00a0N·m when it helps itself and with 15.1\u00a0N·m the other way: 4.11 times as much.",
    ]);
  });
});

describe("what a sheet starts with", () => {
  it("is what the scenario knows", () => {
    const entries = startEntries(wayOf("damping", "ratio"), creepFeed);
    expect(entries.stiffness).toEqual({ text: "4", unit: "N/μm" });
    expect(entries.inertia).toEqual({ text: "120", unit: "kg" });
    expect(startEntries(wayOf("band-brake", "both"), creepFeed).friction.text).toBe("0.12");
  });

  it("leaves friction open where the law has no single value", () => {
    const frictionless = variant({ contact: { ...creepFeed.contact, law: { model: "none" } } });
    expect(startEntries(wayOf("band-brake", "both"), frictionless).friction.text).toBe("");
  });
});

describe("what is taken from a sheet", () => {
  it("says the formula and its numbers, and takes along what goes with it", () => {
    const way = wayOf("band-brake", "both");
    const values = { pull: 200, friction: 0.3, wrap: 270, radius: 0.1 };
    const entries = {
      pull: { text: "200", unit: "N" },
      friction: { text: "0.3", unit: "" },
      wrap: { text: "270", unit: "°" },
      radius: { text: "100", unit: "mm" },
    };
    const taken = takenFrom(way, "contact.normal.preload", values, entries);
    expect(taken.map(({ path }) => path)).toEqual(["contact.normal.preload", "contact.radius", "contact.normal.faces"]);
    expect(taken[0].origin).toEqual({
      kind: "calculated",
      source:
        "N = T · (1 − exp(−μ · φ)) / μ, the drum turns both ways, with T 200\u00a0N, μ 0.3, φ 270°, R 100\u00a0mm (textbook, from memory (Eytelwein))",
      low: 504.5,
      high: 2074,
    });
    expect(taken[1].value).toBe(0.1);
    expect(taken[2].value).toBe(1);
  });
});
