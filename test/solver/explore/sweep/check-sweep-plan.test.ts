import { checkSweepPlan } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { buildScenario } from "../../../support/scenario-builder.ts";

const scenario = buildScenario({
  body: { inertia: 2, stiffness: 800 },
  contact: { law: { model: "coulomb", static: 0.2, kinetic: 0.15 }, normal: { preload: 10 } },
  initial: { displacement: 0.02 },
  span: { seconds: 5 },
});
const stiffness = { path: "body.stiffness", spacing: "linear", from: 100, to: 900, count: 9 };
const plan = (more: object) => ({ format: "restband-sweep/1", axes: [stiffness], quantities: [], ...more });
const faultsOf = (more: object) => checkSweepPlan(plan(more), scenario).faults;

describe("a plan of a sweep", () => {
  it("keeps the ratio of friction coefficients as entered unless links are given", () => {
    const axes = [{ path: "contact.law.static", spacing: "linear", from: 0.1, to: 0.3, count: 3 }];
    expect(checkSweepPlan(plan({ axes }), scenario).plan?.links).toEqual({
      "contact.law.kinetic": { of: "contact.law.static", factor: 0.15 / 0.2 },
    });
    expect(checkSweepPlan(plan({ axes, links: {} }), scenario).plan?.links).toEqual({});
    expect(checkSweepPlan(plan({}), scenario).plan?.links).toEqual({});
  });

  it.each<[string, object, string, RegExp]>([
    ["an empty range", { axes: [{ ...stiffness, to: 100 }] }, "axes[0].to", /empty/],
    ["a reversed range", { axes: [{ ...stiffness, to: 10 }] }, "axes[0].to", /reversed/],
    ["a range beyond the field's bounds", { axes: [{ ...stiffness, from: -1 }] }, "axes[0].from", /0 or more.*-1/],
    ["equal ratios from 0", { axes: [{ ...stiffness, spacing: "log", from: 0 }] }, "axes[0].from", /one sign/],
    ["a single value", { axes: [{ ...stiffness, count: 1 }] }, "axes[0].count", /at least 2/],
    ["an empty list", { axes: [{ path: "body.inertia", spacing: "listed", values: [] }] }, "axes[0].values", /empty/],
    [
      "a value twice",
      { axes: [{ path: "body.inertia", spacing: "listed", values: [1, 2, 1] }] },
      "axes[0].values[2]",
      /already/,
    ],
    [
      "a number that the scenario does not use",
      { axes: [{ ...stiffness, path: "contact.law.velocity" }] },
      "axes[0].path",
      /no number called "contact\.law\.velocity"/,
    ],
    ["the same field twice", { axes: [stiffness, stiffness] }, "axes[1].path", /same as the first/],
    [
      "parts of faces",
      { axes: [{ path: "contact.normal.faces", spacing: "linear", from: 1, to: 4, count: 3 }] },
      "axes[0].count",
      /whole numbers/,
    ],
    [
      "more cells than there may be",
      {
        axes: [
          { ...stiffness, count: 501 },
          { ...stiffness, path: "body.inertia", count: 500 },
        ],
      },
      "axes",
      /at most 250000 cells; these are 250500/,
    ],
    [
      "a number that follows and is varied",
      { links: { "body.stiffness": { of: "body.inertia", factor: 2 } } },
      "links.body.stiffness",
      /varied itself/,
    ],
    [
      "periods where there are none",
      { links: { "span.seconds": { keep: "periods" } } },
      "links.span.seconds",
      /no periods/,
    ],
    [
      "varied starts of cells that follow one another",
      { axes: [{ ...stiffness, path: "initial.displacement" }], continuation: "up" },
      "continuation",
      /start of their own/,
    ],
  ])("refuses %s", (_what, more, path, message) => {
    expect(faultsOf(more)).toEqual([{ path, message: expect.stringMatching(message) as string }]);
  });

  it("names every fault at once, and never throws", () => {
    const axes = [
      { ...stiffness, to: 1 },
      { ...stiffness, path: "nothing" },
    ];
    expect(faultsOf({ axes }).map(({ path }) => path)).toEqual(["axes[0].to", "axes[1].path"]);
    for (const garbage of [null, 3, "plan", [], { axes: [null] }, { axes: [stiffness], links: [] }])
      expect(checkSweepPlan(garbage, scenario).faults.length).toBeGreaterThan(0);
  });
});
