import type { Notice } from "@restband/api/contract";
import { describe, expect, it } from "vitest";
import { anchorOf, typedAnchor, wholeAnchor } from "../../../web/src/features/review/anchor-field.tsx";
import { mentionsIn, sayAnchor, withMention } from "../../../web/src/features/review/comment-words.ts";
import { stretchesOf, ticksOf } from "../../../web/src/features/review/curve.ts";
import { grouped } from "../../../web/src/features/review/waiting.ts";

const members = [
  { accountId: "1", name: "Ines Duarte" },
  { accountId: "2", name: "Priya Raman" },
];

describe("what a comment is about", () => {
  it("is said after who said it", () => {
    const label = (path: string) => (path === "body.inertia" ? "mass" : path);
    expect(sayAnchor({ kind: "instant", t: 0.06512 }, label)).toBe("at 0.06512\u00a0s");
    expect(sayAnchor({ kind: "span", from: 0.25, to: 0.5 }, label)).toBe("from 0.25 to 0.5\u00a0s");
    expect(sayAnchor({ kind: "field", path: "body.inertia" }, label)).toBe("on mass");
    expect(sayAnchor({ kind: "whole" }, label)).toBe("on the whole");
  });

  it("is typed as it is read, with point or comma, and is nothing where a time is none", () => {
    const span = { kind: "span", from: 0.25, to: 0.5 } as const;
    expect(anchorOf(typedAnchor(span, 4))).toEqual(span);
    expect(anchorOf({ ...wholeAnchor, kind: "instant", t: "0,036" })).toEqual({ kind: "instant", t: 0.036 });
    for (const t of ["", "soon", "-1"]) expect(anchorOf({ ...wholeAnchor, kind: "instant", t })).toBeNull();
    expect(anchorOf({ ...wholeAnchor, kind: "field" })).toBeNull();
  });
});

describe("mentions", () => {
  it("are the members whose names stand after an @", () => {
    expect(mentionsIn("Is that so, @priya raman?", members)).toEqual(["2"]);
    expect(mentionsIn("Ines Duarte said so.", members)).toEqual([]);
    expect(mentionsIn(withMention("Look,", "Ines Duarte"), members)).toEqual(["1"]);
  });
});

describe("the figure", () => {
  it("tells the stretches of a trace, each up to the next", () => {
    const trace = { t: [0, 1, 2, 3], x: [0, 0, 1, 2], v: [0, 0, 1, 1], f: [0, 0, 0, 0], phase: [0, 0, 1, 1] };
    expect(stretchesOf(trace)).toEqual([
      { from: 0, to: 2, phase: 0 },
      { from: 2, to: 3, phase: 1 },
    ]);
  });

  it.each([
    [0, 5.4, [0, 2, 4]],
    [-0.3, 0.3, [-0.2, 0, 0.2]],
  ])("has round ticks from %d to %d", (low, high, ticks) => {
    expect(ticksOf(low, high).map((tick) => Number(tick.toFixed(9)) + 0)).toEqual(ticks);
  });
});

describe("what waits", () => {
  const notice = (id: string, kind: Notice["kind"], number: number): Notice => ({
    id,
    kind,
    at: "2026-12-01T14:00:00.000Z",
    by: members[1],
    project: { id: "p", name: "Hall 3" },
    revision: { id: `r${number}`, number, scenarioId: "s", title: "Z carriage" },
    commentId: null,
  });

  it("is told once for several of a kind on one revision, and what is to be done comes first", () => {
    const all = [notice("a", "commented", 2), notice("b", "commented", 1), notice("c", "commented", 2)];
    const rows = grouped([...all, notice("d", "review-asked", 3)]);
    expect(rows.map(({ notice: { kind }, ids }) => [kind, ids])).toEqual([
      ["review-asked", ["d"]],
      ["commented", ["a", "c"]],
      ["commented", ["b"]],
    ]);
  });
});
