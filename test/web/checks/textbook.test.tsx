import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { compareWithTextbook } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { formulaParts } from "../../../web/src/features/checks/formula-text.tsx";
import { mismatchGroups, symbolWords, textbookTable } from "../../../web/src/features/checks/textbook-rows.ts";
import { Textbook } from "../../../web/src/features/checks/textbook.tsx";
import { coulombForces } from "../../support/scenario-builder.ts";
import { creepFeed, solved } from "../support/scenarios.ts";

const { scenario, result } = solved(creepFeed);
const page = compareWithTextbook(scenario, result);

describe("a formula", () => {
  it("is cut at its marks", () => {
    expect(formulaParts("x_{n−1} + ζ^2/F_k")).toEqual([
      { text: "x", place: "line" },
      { text: "n−1", place: "lower" },
      { text: " + ζ", place: "line" },
      { text: "2", place: "upper" },
      { text: "/F", place: "line" },
      { text: "k", place: "lower" },
    ]);
    expect(formulaParts("a _ b")).toEqual([{ text: "a _ b", place: "line" }]);
  });
});

describe("the rows", () => {
  const { rows, sources } = textbookTable(page.comparisons, scenario);
  const rowOf = (key: string) => rows.find((row) => row.key === key);

  it("stand in one unit, with the difference in per cent", () => {
    expect(rowOf("stick-slip-period")).toMatchObject({
      value: { text: "39.00", unit: "ms" },
      ofRun: { text: "38.69", unit: "ms" },
      difference: "−0.80\u00a0%",
    });
    expect(rowOf("critical-feed-exact")).toMatchObject({ value: { text: "8.344", unit: "mm/s" }, ofRun: null });
  });

  it("point to a source each, named once", () => {
    expect(new Set(sources).size).toBe(sources.length);
    for (const { source } of rows) expect(sources[source - 1]).toBeTruthy();
  });

  it("tell the symbols, and gather what has no place by its reason", () => {
    const words = symbolWords(page.symbols, "linear").map((each) => each.replaceAll("\u00a0", " "));
    expect(words).toContain("F_s = 296.5 N");
    expect(words).toContain("ω = 182.6 rad/s");
    const groups = mismatchGroups(page.mismatches);
    expect(groups.flatMap(({ labels }) => labels)).toHaveLength(page.mismatches.length);
    expect(new Set(groups.map(({ reason }) => reason)).size).toBe(groups.length);
  });
});

describe("the block", () => {
  it("shows the table, its sources, and the rest on demand", () => {
    render(<Textbook scenario={scenario} result={result} />);
    const row = screen.getByRole("row", { name: /Time from jump to jump/ });
    expect(within(row).getByText("38.69")).toBeInTheDocument();
    expect(screen.getByRole("list", { name: "Sources of the formulas" })).toBeInTheDocument();
    expect(screen.getByText(/formulas without a place here, and why/)).toBeInTheDocument();
  });

  it("asks for the velocity of a smoothed law where the body rests, and keeps the last that can be read", async () => {
    const held = solved({
      body: { inertia: 1, stiffness: 0 },
      contact: coulombForces(2),
      force: [{ kind: "constant", value: 1 }],
      span: { seconds: 1 },
    });
    render(<Textbook scenario={held.scenario} result={held.result} />);
    const creep = () => screen.getByRole("row", { name: /Creep a smoothed law/ }).textContent;
    expect(creep()).toContain("0.5493");
    const field = screen.getByLabelText("Velocity of the smoothed law");
    await userEvent.clear(field);
    expect(screen.getByText("A number is missing here.")).toBeInTheDocument();
    expect(creep()).toContain("0.5493");
    await userEvent.type(field, "10 mm/s");
    expect(creep()).toContain("5.493");
  });
});
