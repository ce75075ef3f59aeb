import { exploreRanges, type Origin, type PointReply, type RangeReport, type Scenario } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { leadLine } from "../../../web/src/features/answer/lead-line.ts";
import { coverageWords, rangesLine, rangeVerdictWords } from "../../../web/src/features/answer/range-words.ts";
import { sayField } from "../../../web/src/features/statement/say-field.ts";
import { creepFeed, solved, variant } from "../support/scenarios.ts";

type Ranges = Record<string, [low: number, high: number]>;

/** The limits of a body that rests within ±μs N/k: with N 100 N and k 1000 N/m, ±15 mm at μs 0.15. */
function explored(limits: Scenario["limits"], ranges: Ranges): { scenario: Scenario; report: RangeReport } {
  const origins = Object.entries(ranges).map(([path, [low, high]]): [string, Origin] => [
    path,
    { kind: "assumed", low, high },
  ]);
  const scenario = variant({
    body: { ...creepFeed.body, inertia: 1, stiffness: 1000 },
    contact: { ...creepFeed.contact, normal: { preload: 100, faces: 1, weight: false, ripple: null } },
    limits,
    origins: Object.fromEntries(origins),
  });
  const runOf = (at: Scenario): PointReply => solved(at, 0).result.limits;
  const steps = exploreRanges(scenario, solved(scenario, 0).result.limits);
  let step = steps.next();
  while (!step.done) step = steps.next(runOf(step.value.scenario));
  return { scenario, report: step.value };
}

function said(limits: Scenario["limits"], ranges: Ranges) {
  const { scenario, report } = explored(limits, ranges);
  const say = (path: string, value: number, towards: number) => sayField(scenario, path, value, towards);
  const plain = (text: string) => text.replaceAll("\u00a0", " ");
  return {
    scenario,
    report,
    line: plain(rangesLine(report, say)),
    verdicts: report.verdicts.map((verdict) => {
      const { word, breaks } = rangeVerdictWords(verdict, say);
      return plain([word, breaks].filter(Boolean).join(", "));
    }),
    coverage: coverageWords(report),
  };
}

const atMost = (max: number) => ({ quantity: "restBand", max });
const friction: Ranges = { "contact.law.static": [0.13, 0.18] };

describe("the verdicts over ranges in words", () => {
  it("say the value from which a limit breaks, rounded towards the value entered", () => {
    expect(said([atMost(0.0162)], friction)).toMatchObject({
      line: "The limit is kept as entered and breaks from μs 0.162.",
      verdicts: ["kept as entered, breaks from μs 0.162"],
      coverage:
        "Run at both ends of the range, at 8 points along single values and 24 points within: samples, not a proof.",
    });
    // 16.2347 mm at μs 0.162347.
    expect(said([atMost(0.0162347)], friction).verdicts).toEqual(["kept as entered, breaks from μs 0.1623"]);
  });

  it("say the side where smaller values break it, and two values at most", () => {
    const ranges = { ...friction, "body.stiffness": [800, 1000], "contact.normal.preload": [100, 119] } as Ranges;
    expect(said([atMost(0.0165)], ranges).verdicts).toEqual([
      "kept as entered, breaks from μs 0.165 or stiffness 909.1 N/m down",
    ]);
  });

  it("say the values that break it only together", () => {
    const ranges: Ranges = { "contact.law.static": [0.15, 0.16], "contact.normal.preload": [100, 106] };
    const { verdicts, line } = said([atMost(0.0165)], ranges);
    expect(verdicts[0]).toMatch(/^kept as entered, breaks with μs 0\.157\d and preload per face 104\.\d N together$/u);
    expect(line).toMatch(/^The limit is kept as entered and breaks with μs .* together\.$/u);
  });

  it("use the worst of several limits in the answer's sentence", () => {
    const limits = [atMost(0.02), atMost(0.0162), atMost(0.017), atMost(0.014)];
    expect(said(limits.slice(0, 1), friction).line).toBe("The limit is kept over the whole range.");
    expect(said(limits.slice(0, 2), friction).line).toBe(
      "Kept as entered, but one of two limits breaks from μs 0.162.",
    );
    expect(said(limits.slice(0, 3), friction).line).toBe(
      "Kept as entered, but two of three limits break within the ranges.",
    );
    expect(said(limits, friction).line).toBe("One of four limits is broken as entered.");
    expect(said(limits, friction).verdicts).toEqual([
      "kept over the whole range",
      "kept as entered, breaks from μs 0.162",
      "kept as entered, breaks from μs 0.17",
      "broken as entered",
    ]);
  });

  it("stand in place of “as entered only” once the ranges are run", () => {
    const { scenario } = said([atMost(0.02)], friction);
    const { result } = solved(scenario, 0);
    expect(leadLine(scenario, result)).toContain("The limit is kept, as entered only.");
    expect(leadLine(scenario, result, "The limit is kept over the whole range.")).not.toContain("as entered only");
  });

  it("count what cannot be, and name ranges that are not run", () => {
    const { coverage, report } = said([atMost(0.02)], { ...friction, "contact.law.kinetic": [0.1, 0.14] });
    expect(report.ran.corners).toBe(3);
    expect(coverage).toMatch(
      /^Run at every corner of the ranges, at 16 points along single values and \d+ points within: samples, not a proof\. (\w+|\d+) points? of the ranges cannot be: the values do not go together\.$/u,
    );
  });
});
