import type { ScenarioSummary } from "@restband/api/contract";
import { describe, expect, it } from "vitest";
import { arrange, candidatesOf, type Known } from "../../../web/src/features/project-home/arrange.ts";
import { readView, writeView, type View } from "../../../web/src/features/project-home/view.ts";

const whole = readView(new URLSearchParams());
const names = { a: "Ada", b: "Bo" };

const summary = (title: string, day: number, by: "a" | "b" = "a", archivedAt: string | null = null) =>
  ({
    id: title,
    digest: title,
    title,
    updatedAt: `2026-11-${String(day).padStart(2, "0")}T08:00:00.000Z`,
    updatedBy: { accountId: by, name: names[by] },
    archivedAt,
  }) as ScenarioSummary;

const scenarios = [
  summary("Case 10", 3),
  summary("Case 9", 5, "b"),
  summary("Träger", 4),
  summary("Old", 1, "a", "2026-11-02T08:00:00.000Z"),
];

const known: Record<string, Known> = {
  "Case 10": { outcome: "stick-slip", standing: "broken", broken: 2 },
  "Case 9": { outcome: "never-moved", standing: "kept", broken: 0 },
  Träger: { outcome: "stick-slip", standing: "broken", broken: 1 },
};

function titles(change: Partial<View>, answers: Record<string, Known> = known): string[] {
  const view = { ...whole, ...change };
  return arrange(candidatesOf(scenarios, view), view, (digest) => answers[digest] ?? null).rows.map(({ id }) => id);
}

describe("the scenarios of a view", () => {
  it("come last touched first, by title with numbers as numbers, by outcome, or with the most limits broken first", () => {
    expect(titles({})).toEqual(["Case 9", "Träger", "Case 10"]);
    expect(titles({ order: "title" })).toEqual(["Case 9", "Case 10", "Träger"]);
    expect(titles({ order: "outcome" })).toEqual(["Case 9", "Träger", "Case 10"]);
    expect(titles({ order: "broken" })).toEqual(["Case 10", "Träger", "Case 9"]);
  });

  it("are found by any words of the title, whatever their case and accents", () => {
    expect(titles({ search: "trager" })).toEqual(["Träger"]);
    expect(titles({ search: " 10 CASE " })).toEqual(["Case 10"]);
    expect(titles({ search: "nothing" })).toEqual([]);
  });

  it("are narrowed by outcome, limits, author, and whether they are archived", () => {
    expect(titles({ outcome: "stick-slip" })).toEqual(["Träger", "Case 10"]);
    expect(titles({ limits: "kept" })).toEqual(["Case 9"]);
    expect(titles({ author: "b" })).toEqual(["Case 9"]);
    expect(titles({ isArchived: true })).toEqual(["Old"]);
  });

  it("keep their place until every answer that decides is there", () => {
    const some = { "Case 10": known["Case 10"] };
    const view: View = { ...whole, order: "broken" };
    const { rows, waiting } = arrange(
      candidatesOf(scenarios, view),
      view,
      (digest) => some[digest as "Case 10"] ?? null,
    );
    expect([rows.map(({ id }) => id), waiting]).toEqual([["Case 9", "Träger", "Case 10"], 2]);
    expect(titles({ limits: "broken" }, some)).toEqual(["Case 10"]);
  });
});

describe("a view in an address", () => {
  it("comes back as it went, and leaves out what is as always", () => {
    const view: View = {
      order: "broken",
      search: "ä b",
      outcome: "growing",
      limits: "kept",
      author: "x",
      isArchived: true,
    };
    expect(readView(writeView(view))).toEqual(view);
    expect(writeView(whole).toString()).toBe("");
  });

  it("that is not understood counts for nothing", () => {
    expect(readView(new URLSearchParams("order=sideways&limits=maybe&archived=1"))).toEqual(whole);
  });
});
