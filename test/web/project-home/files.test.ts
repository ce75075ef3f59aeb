import { describe, expect, it } from "vitest";
import type { Glance } from "../../../web/src/features/project-home/glances/glance-book.ts";
import { slim } from "../../../web/src/features/project-home/glances/slim.ts";
import { copyTitle } from "../../../web/src/features/project-home/copy-title.ts";
import { readScenarios } from "../../../web/src/features/project-home/read-scenarios.ts";
import { resultsCsv } from "../../../web/src/features/project-home/results-csv.ts";
import { fileNameOf } from "../../../web/src/components/save-file.ts";
import { intervalsOf } from "../../../web/src/compute/intervals.ts";
import { creepFeed, solved } from "../support/scenarios.ts";

const computed = solved(creepFeed);
const glance: Glance = { computed, failure: null };

describe("results as CSV", () => {
  const rowsOf = (text: string) => text.slice(1).trimEnd().split("\r\n");

  it("name units in the head and hold every digit of every quantity", () => {
    const [head, row] = rowsOf(resultsCsv(["Feed [mm/s]"], [{ title: "Slide", inputs: [2], glance }]));
    expect(head.startsWith("Title,Feed [mm/s],Outcome,Limits,")).toBe(true);
    expect(head).toContain("Rest band [m]");
    expect(row.startsWith("Slide,2,sticks and slips,1 limit broken,")).toBe(true);
    expect(row.split(",")).toContain(String(computed.result.quantities.stickFraction));
  });

  it("never hand a spreadsheet a formula, and leave negative numbers numbers", () => {
    const titles = ['=HYPERLINK("http://x")', "+1", "-cmd", "@SUM(A1)", "\tx"];
    const rows = rowsOf(
      resultsCsv(
        ["x"],
        titles.map((title) => ({ title, inputs: [-3], glance: undefined })),
      ),
    );
    for (const row of rows.slice(1)) {
      expect(row).toMatch(/^"?'[=+\-@\t]/u);
      expect(row).toContain(",-3,");
    }
  });

  it("say in words why a row has no numbers", () => {
    const failed: Glance = { computed: null, failure: "Broke off." };
    expect(rowsOf(resultsCsv([], [{ title: "A", inputs: [], glance: failed }]))[1]).toBe("A,Broke off.,");
  });
});

it("a slim result still draws the same strip", () => {
  const end = creepFeed.span.seconds;
  const { samples } = slim(computed.result);
  expect(intervalsOf(samples!, end)).toEqual(intervalsOf(computed.result.samples!, end));
  expect(samples!.t.length).toBeLessThan(computed.result.samples!.t.length / 10);
});

describe("scenarios as JSON", () => {
  it("come in alone or as a list", () => {
    expect(readScenarios(JSON.stringify(creepFeed))).toEqual({ scenarios: [creepFeed], faults: null });
    expect(readScenarios(JSON.stringify([creepFeed, creepFeed])).scenarios).toHaveLength(2);
  });

  it.each([
    ["", /This is no JSON/u],
    ["{", /This is no JSON/u],
    ["[]", /The list is empty/u],
    [JSON.stringify(Array.from({ length: 501 }, () => 1)), /501 scenarios; at most 500/u],
  ])("are refused in words: %.20s", (text, sentence) => {
    expect(readScenarios(text).faults?.[0].message).toMatch(sentence);
  });

  it("with faults name every one by its place, and none comes in", () => {
    const bad = { ...creepFeed, body: { ...creepFeed.body, inertia: 0 }, extra: 1 };
    const { scenarios, faults } = readScenarios(JSON.stringify([creepFeed, bad]));
    expect(scenarios).toBeNull();
    expect(faults?.map(({ path }) => path).sort()).toEqual(["[1].body.inertia", "[1].extra"]);
  });
});

it.each([
  ["Z carriage, creep feed", "Z-carriage-creep-feed.csv"],
  ["../../etc/passwd", "etc-passwd.csv"],
  ["Träger „C-2“", "Träger-C-2.csv"],
  ["...", "scenario.csv"],
  ["", "scenario.csv"],
])("a file for %j is called %s", (title, name) => {
  expect(fileNameOf(title, "csv")).toBe(name);
});

it("copies count on", () => {
  expect(copyTitle("Slide", [])).toBe("Slide, copy");
  expect(copyTitle("Slide, copy", ["Slide, copy"])).toBe("Slide, copy 2");
  expect(copyTitle("Slide, copy 2", ["Slide, copy", "Slide, copy 2"])).toBe("Slide, copy 3");
});
