import { describe, expect, it } from "vitest";
import { exploreField, type ExploreField } from "../../../web/src/features/explore/explore-field.ts";
import { readFit } from "../../../web/src/features/explore/study/fit-reading.ts";
import {
  jointDraftOf,
  withEntry,
  withFit,
  withForm,
  withMember,
  withoutMember,
} from "../../../web/src/features/explore/study/joint-draft.ts";
import {
  canKeepFrictionRatio,
  studyDraftOf,
  studyPlanOf,
  withInputs,
  type StudyDraft,
} from "../../../web/src/features/explore/study/study-draft.ts";
import { creepFeed, variant } from "../support/scenarios.ts";

const study = studyDraftOf(creepFeed);
const planOf = (change: Partial<StudyDraft>) => studyPlanOf({ ...study, ...change }, creepFeed);
const pathsOf = (change: Partial<StudyDraft>) => planOf(change).faults.map(({ path }) => path);
const [kinetic, fixed] = ["contact.law.kinetic", "contact.law.static"];
const fieldAt = (path: string): ExploreField => exploreField(creepFeed, path)!;
const springAndMass = jointDraftOf([fieldAt("body.stiffness"), fieldAt("body.inertia")]);

describe("a study as it is typed", () => {
  it("starts from the values known as ranges", () => {
    const known = variant({
      origins: { [fixed]: { kind: "catalogue", source: "sheet", entered: "0.15", low: 0.13, high: 0.18 } },
    });
    expect(studyPlanOf(studyDraftOf(known), known).plan?.inputs).toEqual([
      { path: fixed, distribution: { kind: "uniform", low: 0.13, high: 0.18 } },
    ]);
  });

  it("says what is wrong at its field: draws, seed, a range", () => {
    expect(pathsOf({})).toEqual([]);
    expect(pathsOf({ runs: "12" })).toEqual(["runs"]);
    expect(pathsOf({ seed: "luck" })).toEqual(["seed"]);
    const reversed = {
      ...study.inputs[0],
      numbers: { low: { text: "0.2", unit: "" }, high: { text: "0.1", unit: "" } },
    };
    expect(pathsOf({ inputs: [reversed] })).toEqual(["inputs[0].distribution.high"]);
  });

  it("keeps the ratio of the frictions where one alone scatters, unless told otherwise", () => {
    const one = withInputs(
      study,
      study.inputs.filter(({ path }) => path === fixed),
    );
    expect(canKeepFrictionRatio(study, creepFeed)).toBe(false);
    expect(canKeepFrictionRatio(one, creepFeed)).toBe(true);
    expect(planOf({ inputs: one.inputs }).plan?.links).toEqual({ [kinetic]: { of: fixed, factor: 0.8 } });
    expect(planOf({ inputs: one.inputs, keepsFrictionRatio: false }).plan?.links).toEqual({});
  });
});

describe("values that go together", () => {
  const pair = (text: string, second = fixed) => ({ correlations: [{ first: kinetic, second, text }] });

  it("by rank correlations, each pair by its paths", () => {
    expect(planOf(pair("−0,3")).plan?.correlations).toEqual([{ first: 1, second: 0, value: -0.3 }]);
    expect(pathsOf(pair("1.5"))).toEqual(["correlations[0].value"]);
    expect(pathsOf(pair("much"))).toEqual(["correlations[0].value"]);
    expect(pathsOf(pair("0.2", kinetic))).toEqual(["correlations[0].second"]);
    expect(withInputs({ ...study, ...pair("0.5") }, study.inputs.slice(1)).correlations).toEqual([]);
  });

  it("by deviations and correlations in the units of the means", () => {
    const draft = withEntry(withEntry(springAndMass, [0, 0], "0.1"), [1, 0], "-0.5");
    const { plan, faults } = planOf({ joint: [{ ...draft, source: " Pull test 2 " }] });
    expect(faults).toEqual([]);
    expect(plan?.joint[0]).toMatchObject({ paths: ["body.stiffness", "body.inertia"], source: "Pull test 2" });
    expect(plan?.joint[0].means).toEqual([4e6, 120]);
    // 0.1 N/μm and, a twentieth of 120 kg, 6 kg
    expect(plan?.joint[0].covariance).toEqual([
      [expect.closeTo(1e10, 0), expect.closeTo(-0.5 * 1e5 * 6, 6)],
      [expect.closeTo(-0.5 * 1e5 * 6, 6), 36],
    ]);
  });

  it("not where a number cannot be read, a deviation is none, or they would go together more than fully", () => {
    const faultsOf = (at: readonly [number, number], text: string) =>
      pathsOf({ joint: [withEntry(springAndMass, at, text)] });
    expect(faultsOf([1, 1], "six")).toEqual(["joint[0].covariance[1][1]"]);
    expect(faultsOf([0, 0], "0")).toEqual(["joint[0].covariance[0][0]"]);
    expect(faultsOf([1, 0], "1")).toEqual(["joint[0].covariance[1][0]"]);
    const typed = { ...springAndMass, form: "covariance" as const, entries: [["1"], ["3", "4"]] };
    expect(planOf({ joint: [typed] }).faults).toMatchObject([
      { path: "joint[0].covariance", message: expect.stringMatching(/positive definite/) as string },
    ]);
  });

  it("as a fit leaves them", () => {
    const printed = "[4.1, 118]\n[[0.01, -0.2],\n [-0.2, 9]]";
    const fit = readFit(printed, 2);
    if ("message" in fit) throw new Error(fit.message);
    const { plan } = planOf({ joint: [withFit(springAndMass, fit)] });
    expect(plan?.joint[0].means).toEqual([4.1e6, 118]);
    expect(plan?.joint[0].covariance[1]).toEqual([expect.closeTo(-2e5, 6), 9]);
  });

  it("told the other way, it is the same scatter", () => {
    const draft = withEntry(withEntry(springAndMass, [0, 0], "0.1"), [1, 0], "-0.5");
    const told = withForm(draft, "covariance");
    expect(told.entries).toEqual([["0.01"], ["−0.3", "36"]]);
    const covariance = (joint: typeof draft) => planOf({ joint: [joint] }).plan?.joint[0].covariance.flat() ?? [];
    covariance(told).forEach((value, i) => expect(value / covariance(draft)[i]).toBeCloseTo(1, 9));
    expect(withForm(told, "correlations").entries).toEqual([["0.1"], ["−0.5", "6"]]);
    expect(withForm(withEntry(draft, [1, 1], "six"), "covariance").entries[1][1]).toBe("six");
  });

  it("with one more, or one fewer", () => {
    const three = withMember(springAndMass, fieldAt("contact.normal.preload"));
    expect(three.entries).toEqual([["0.2"], ["0", "6"], ["0", "0", "40"]]);
    expect(planOf({ joint: [three] }).plan?.joint[0].covariance).toHaveLength(3);
    expect(withoutMember(three, 1).entries).toEqual([["0.2"], ["0", "40"]]);
  });
});

describe("a fit that is pasted", () => {
  it.each([
    ["plain numbers", "1 2 3 4 5 6"],
    ["as JSON", '{"estimates": [1, 2], "covariance": [[3, 4], [5, 6]]}'],
    ["with exponents and semicolons", "1e0; +2.0\n3 4; 5 .6e1"],
  ])("is read, %s", (_, text) => {
    const covariance = [
      [3, 4],
      [5, 6],
    ];
    expect(readFit(text, 2)).toEqual({ estimates: [1, 2], covariance });
  });

  it("is not taken where numbers are missing or are none", () => {
    expect(readFit("1 2 3", 2)).toEqual({
      message: "2 estimates and a covariance of 2 rows of 2 are 6 numbers; these are 3.",
    });
    expect(readFit("1 2 nan 4 5 6", 2)).toEqual({ message: "“nan” is not a number." });
  });
});
