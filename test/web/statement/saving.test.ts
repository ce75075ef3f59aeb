import type { Scenario } from "@restband/solver";
import { afterEach, describe, expect, it } from "vitest";
import { draftReducer, resumeDraft } from "../../../web/src/features/statement/draft/draft-reducer.ts";
import { openDraft } from "../../../web/src/features/statement/draft/open-draft.ts";
import { differencesOf, merged } from "../../../web/src/features/statement/saving/differences.ts";
import type { Work } from "../../../web/src/features/statement/saving/work.ts";
import { dropLocal, keepLocally } from "../../../web/src/features/statement/saving/local-draft.ts";
import { readLocal } from "../../../web/src/features/statement/saving/read-local.ts";
import { savedWords } from "../../../web/src/features/statement/saving/saved-words.ts";
import { creepFeed, variant } from "../support/scenarios.ts";

describe("the draft kept in the browser", () => {
  afterEach(() => localStorage.clear());
  const term = { kind: "constant", value: 5 } as const;
  const off = { place: "force", index: 0, term, origins: { value: { kind: "assumed" } }, units: {} } as const;
  const base = { version: 3, content: creepFeed, switchedOff: [] };
  const edited = [
    { type: "set", path: "body.viscous", value: 400, unit: "N·s/m" } as const,
    { type: "set", path: "body.inertia", value: -3 } as const,
    { type: "leave-unread", path: "span.seconds", text: "long", message: "“long” is not a number." } as const,
  ].reduce(draftReducer, openDraft(creepFeed, [off]));

  it("comes back with what is valid, what was refused and what could not be read", () => {
    keepLocally("ines", "s1", edited, base);
    const left = readLocal("ines", "s1");
    expect(left).not.toBeNull();
    const draft = left && resumeDraft(left.inForce, left.sheet);
    expect(draft).toMatchObject({
      inForce: { body: { viscous: 400, inertia: 120 } },
      sheet: {
        wanted: { body: { inertia: -3 } },
        unread: { "span.seconds": { text: "long" } },
        units: { "body.viscous": "N·s/m" },
        off: [off],
      },
    });
    expect(draft?.faults.map(({ path }) => path).sort()).toEqual(["body.inertia", "span.seconds"]);
    expect(left?.base).toEqual(base);
  });

  it("belongs to one person and one scenario, until it is dropped", () => {
    keepLocally("ines", "s1", edited, base);
    expect(readLocal("tomas", "s1")).toBeNull();
    expect(readLocal("ines", "s2")).toBeNull();
    dropLocal("ines", "s1");
    expect(readLocal("ines", "s1")).toBeNull();
  });

  it.each([
    "",
    "{",
    "[]",
    '{"version":1}',
    JSON.stringify({ version: 1, base: {}, inForce: {}, refused: {}, unread: {}, units: {} }),
  ])("is nothing where it cannot be read: %s", (text) => {
    localStorage.setItem("restband-draft ines s1", text);
    expect(readLocal("ines", "s1")).toBeNull();
  });
});

describe("two versions", () => {
  const work = (content: Scenario): Work => ({ content, switchedOff: [] });
  const mine = variant({ body: { ...creepFeed.body, viscous: 400, inertia: 130 } });
  const theirs = variant({
    title: "Z carriage, oiled",
    body: { ...creepFeed.body, viscous: 500 },
    limits: [{ quantity: "peakVelocity", max: 0.01 }],
  });

  it("are told apart field by field, in words, with the likelier side chosen", () => {
    expect(differencesOf(work(creepFeed), work(mine), work(theirs))).toEqual([
      { path: "title", label: "Title", mine: "Z carriage, creep feed", theirs: "Z carriage, oiled", likely: "theirs" },
      { path: "body.inertia", label: "Mass", mine: "130\u00a0kg", theirs: "120\u00a0kg", likely: "mine" },
      { path: "body.viscous", label: "Damping", mine: "400\u00a0N·s/m", theirs: "500\u00a0N·s/m", likely: "mine" },
      {
        path: "limits",
        label: "Limits",
        mine: "It must keep the share of time stuck at most 0\u00a0%. Add a limit.",
        theirs: "It must keep the peak velocity at most 10\u00a0mm/s. Add a limit.",
        likely: "theirs",
      },
    ]);
  });

  it("are put together as chosen", () => {
    const together = merged(work(mine), work(theirs), {
      title: "theirs",
      "body.viscous": "theirs",
      "body.inertia": "mine",
      limits: "mine",
    });
    expect(together.content).toMatchObject({
      title: "Z carriage, oiled",
      body: { viscous: 500, inertia: 130 },
      limits: creepFeed.limits,
    });
    expect(differencesOf(work(creepFeed), merged(work(mine), work(theirs), {}), work(mine))).toEqual([]);
  });

  it("of a law are taken whole", () => {
    const stribeck = variant({
      contact: {
        ...creepFeed.contact,
        law: { model: "stribeck", static: 0.2, kinetic: 0.1, velocity: 0.01, exponent: 2, fluid: 0 },
      },
    });
    const [straight, other] = [work(creepFeed), work(stribeck)];
    expect(differencesOf(straight, straight, other).map(({ path }) => path)).toEqual(["contact.law"]);
    expect(merged(straight, other, { "contact.law": "theirs" })).toEqual(other);
  });

  it("of what is switched off are told and taken whole", () => {
    const term = { kind: "constant", value: 5 } as const;
    const off = { place: "force", index: 0, term, origins: {}, units: {} } as const;
    const [own, other] = [work(creepFeed), { content: creepFeed, switchedOff: [off] }];
    expect(differencesOf(own, own, other)).toEqual([
      {
        path: "switchedOff",
        label: "Switched off",
        mine: "nothing",
        theirs: "A constant force of 5\u00a0N acts",
        likely: "theirs",
      },
    ]);
    expect(merged(own, other, { switchedOff: "theirs" })).toEqual(other);
    expect(merged(own, other, { switchedOff: "mine" })).toEqual(own);
  });
});

describe("the state of saving in words", () => {
  const words = (change: Partial<Parameters<typeof savedWords>[0]>): string =>
    savedWords({
      saving: { kind: "saved", at: null },
      canEdit: true,
      role: "editor",
      isTrying: false,
      faults: 0,
      ...change,
    });
  const at = new Date("2026-12-01T14:02:00");

  it.each([
    [{}, "saved"],
    [{ canEdit: false, archived: "project" as const }, "the project is archived"],
    [{ canEdit: false, archived: "scenario" as const, isTrying: true }, "not saved: the scenario is archived"],
    [{ saving: { kind: "saved", at } as const }, "saved 14:02"],
    [{ saving: { kind: "saving" } as const }, "draft, saving…"],
    [{ saving: { kind: "unreachable", since: at } as const }, "not saved since 14:02, trying again"],
    [{ saving: { kind: "signed-out" } as const }, "not saved: the session has ended"],
    [
      { saving: { kind: "refused", message: "You may only read this." } as const },
      "not saved: You may only read this.",
    ],
    [{ faults: 1 }, "saved, 1 field to put right"],
    [{ faults: 2 }, "saved, 2 fields to put right"],
    [{ canEdit: false, role: "reader" }, "you read this as a reader"],
    [{ canEdit: false, role: "reader", isTrying: true }, "not saved: you are a reader"],
  ])("%o", (change, text) => expect(words(change)).toBe(text));
});
