import { describe, expect, it } from "vitest";
import {
  canKeepDampingRatio,
  planOf,
  secondsOf,
  suggestedSeconds,
  sweepDraftOf,
  type SweepDraft,
} from "../../../web/src/features/explore/sweep/sweep-draft.ts";
import { creepFeed, variant } from "../support/scenarios.ts";

const draft = sweepDraftOf(creepFeed);
const faultsOf = (change: Partial<SweepDraft>) => planOf({ ...draft, ...change }, creepFeed).faults;
const first = (change: Partial<SweepDraft["first"]>) => ({ first: { ...draft.first, ...change } });
const second = (change: object) => ({ second: { ...draft.second!, ...change } });

describe("a sweep as it is typed", () => {
  it("starts from friction across and feed up, with the ratio of the friction kept", () => {
    const { plan } = planOf(draft, creepFeed);
    expect(plan?.axes.map(({ path }) => path)).toEqual(["contact.law.kinetic", "base[0].rate"]);
    expect(plan?.links).toEqual({ "contact.law.static": { of: "contact.law.kinetic", factor: 1.25 } });
    expect(plan?.quantities[0]).toBe("stickFraction");
  });

  it("reads ranges in the person's units", () => {
    const { plan } = planOf({ ...draft, ...second({ from: { text: "3", unit: "mm/min" } }) }, creepFeed);
    expect(plan?.axes[1]).toMatchObject({ from: 5e-5 });
  });

  it("says an empty, a reversed and an unreadable range at its field", () => {
    expect(faultsOf(first({ to: draft.first.from }))).toMatchObject([
      { path: "axes[0].to", message: "The range is empty: it starts and ends at 0.02." },
    ]);
    expect(faultsOf(first({ from: draft.first.to, to: draft.first.from }))).toMatchObject([
      { path: "axes[0].to", message: "The range is reversed: it starts at 0.4 and ends at 0.02." },
    ]);
    expect(faultsOf(first({ from: { text: "wide", unit: "" } }))[0].path).toBe("axes[0].from");
    expect(faultsOf(first({ count: "many" }))[0].path).toBe("axes[0].count");
  });

  it("says too many cells, the same field twice, and equal ratios over nothing", () => {
    expect(faultsOf({ ...first({ count: "501" }), ...second({ count: "500" }) })).toMatchObject([
      { path: "axes", message: "A sweep has at most 250000 cells; these are 250500." },
    ]);
    expect(faultsOf(second({ ...draft.first }))[0].path).toBe("axes[1].path");
    expect(faultsOf(second({ from: { text: "0", unit: "mm/s" } }))[0]).toMatchObject({ path: "axes[1].from" });
  });

  it("takes a list of values", () => {
    const { plan } = planOf({ ...draft, ...first({ spacing: "listed", list: "0.1 0.2; 0.35" }) }, creepFeed);
    expect(plan?.axes[0]).toEqual({ path: "contact.law.kinetic", spacing: "listed", values: [0.1, 0.2, 0.35] });
    expect(faultsOf(first({ spacing: "listed", list: "" }))[0]).toMatchObject({ path: "axes[0].values" });
  });

  it("offers to keep the damping ratio where stiffness or mass is varied", () => {
    expect(canKeepDampingRatio(draft, creepFeed)).toBe(false);
    const stiff = {
      ...draft,
      ...second({ path: "body.stiffness", from: { text: "1", unit: "N/μm" }, to: { text: "8", unit: "N/μm" } }),
    };
    expect(canKeepDampingRatio(stiff, creepFeed)).toBe(true);
    expect(planOf({ ...stiff, keepsDampingRatio: true }, creepFeed).plan?.links["body.viscous"]).toEqual({
      keep: "dampingRatio",
    });
  });

  it("lets a fed run last until the start is gone, any other as long as it says", () => {
    // ln 100 over the decay of 350/(2·120) a second, and 40 periods of 34.4 ms: 4.54 s.
    expect(suggestedSeconds(creepFeed)).toBe(5);
    expect(suggestedSeconds(variant({ base: [] }))).toBe(0.5);
    const lasting = (text: string, unit = "s") => secondsOf({ ...draft, seconds: { text, unit } }, creepFeed);
    expect(lasting("0")).toEqual({ message: "A run lasts longer than nothing." });
    expect(lasting("1e9")).toEqual({ message: expect.stringMatching(/^A run lasts .* at most\.$/) as string });
    expect(lasting("200", "ms")).toEqual({ value: 0.2 });
  });
});
