import type { StoredScenario } from "@restband/api/contract";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { Autosave, type SaveReply, type Saving } from "../../../web/src/features/statement/saving/autosave.ts";
import type { Work } from "../../../web/src/features/statement/saving/work.ts";
import { creepFeed, variant } from "../support/scenarios.ts";

const asWas: Work = { content: creepFeed, switchedOff: [] };
const damped = (viscous: number): Work => ({ ...asWas, content: variant({ body: { ...creepFeed.body, viscous } }) });
const stored = (work: Work, version: number): StoredScenario => ({
  id: "00000000-0000-4000-8000-000000000100",
  projectId: "00000000-0000-4000-8000-000000000010",
  version,
  content: work.content,
  digest: "",
  switchedOff: [...work.switchedOff],
  archivedAt: null,
  createdAt: "2026-11-01T08:00:00.000Z",
  updatedAt: "2026-11-01T08:00:00.000Z",
  updatedBy: { accountId: "00000000-0000-4000-8000-000000000002", name: "Tomas Wik" },
});

describe("autosave", () => {
  let sent: { viscous: number; version: number; reply: (reply: SaveReply) => Promise<void> }[];
  let told: Saving[];
  let kept: number[];
  let autosave: Autosave;

  const save = ({ content }: Work, version: number): Promise<SaveReply> =>
    new Promise((resolve) => {
      const reply = async (answer: SaveReply): Promise<void> => {
        resolve(answer);
        await vi.advanceTimersByTimeAsync(0);
      };
      sent.push({ viscous: content.body.viscous, version, reply });
    });
  const last = (): Saving | undefined => told.at(-1);
  const pass = (ms: number): Promise<unknown> => vi.advanceTimersByTimeAsync(ms);

  beforeEach(() => {
    vi.useFakeTimers({ now: new Date("2026-12-01T14:02:00") });
    sent = [];
    told = [];
    kept = [];
    autosave = new Autosave({
      base: { version: 3, ...asWas },
      save,
      tell: (saving) => told.push(saving),
      onKept: ({ version }) => kept.push(version),
    });
  });
  afterEach(() => vi.useRealTimers());

  it("waits for a moment of quiet, then sends the newest alone over the version it was made from", async () => {
    autosave.want(damped(400));
    await pass(700);
    autosave.want(damped(500));
    await pass(799);
    expect(sent).toEqual([]);
    await pass(1);
    expect(sent).toMatchObject([{ viscous: 500, version: 3 }]);
    expect(last()).toEqual({ kind: "saving" });
    await sent[0].reply({ kind: "saved", stored: stored(damped(500), 4) });
    expect(last()).toEqual({ kind: "saved", at: new Date() });
    expect(kept).toEqual([4]);
  });

  it("sends one at a time; what came meanwhile goes next, over the version just saved", async () => {
    autosave.want(damped(400));
    await pass(800);
    autosave.want(damped(500));
    autosave.want(damped(600));
    await pass(5000);
    expect(sent).toHaveLength(1);
    await sent[0].reply({ kind: "saved", stored: stored(damped(400), 4) });
    expect(sent).toMatchObject([
      { viscous: 400, version: 3 },
      { viscous: 600, version: 4 },
    ]);
    expect(last()).toEqual({ kind: "saving" });
  });

  it("sends a term that was switched off though the scenario is the same", async () => {
    const term = { kind: "constant", value: 5 } as const;
    autosave.want({ ...asWas, switchedOff: [{ place: "force", index: 0, term, origins: {}, units: {} }] });
    await pass(800);
    expect(sent).toMatchObject([{ viscous: 350, version: 3 }]);
  });

  it("sends nothing when the change was taken back", async () => {
    autosave.want(damped(400));
    autosave.want(asWas);
    await pass(10_000);
    expect(sent).toEqual([]);
    expect(last()).toEqual({ kind: "saved", at: null });
  });

  it("tries again while no server answers and says since when, then goes on", async () => {
    autosave.want(damped(400));
    await pass(800);
    const since = new Date();
    await sent[0].reply({ kind: "unreachable" });
    expect(last()).toEqual({ kind: "unreachable", since });
    await pass(3000);
    await sent[1].reply({ kind: "unreachable" });
    expect(last()).toEqual({ kind: "unreachable", since });
    await pass(3000);
    await sent[2].reply({ kind: "saved", stored: stored(damped(400), 4) });
    expect(last()).toEqual({ kind: "saved", at: new Date() });
  });

  it("takes a conflict with its own words for the answer that was lost on the way", async () => {
    autosave.want(damped(400));
    await pass(800);
    await sent[0].reply({ kind: "unreachable" });
    await pass(3000);
    await sent[1].reply({ kind: "conflict", current: stored(damped(400), 4) });
    expect(last()).toMatchObject({ kind: "saved" });
    expect(kept).toEqual([4]);
  });

  it("stops at a real conflict until it is decided, then saves over the other's version", async () => {
    autosave.want(damped(400));
    await pass(800);
    const current = stored(damped(777), 4);
    await sent[0].reply({ kind: "conflict", current });
    expect(last()).toEqual({ kind: "conflict", current });
    autosave.want(damped(500));
    await pass(10_000);
    expect(sent).toHaveLength(1);
    autosave.decide(current, damped(500));
    await pass(0);
    expect(sent[1]).toMatchObject({ viscous: 500, version: 4 });
  });

  it("needs no save when theirs was taken whole", async () => {
    autosave.want(damped(400));
    await pass(800);
    const current = stored(damped(777), 4);
    await sent[0].reply({ kind: "conflict", current });
    autosave.decide(current, current);
    await pass(10_000);
    expect(sent).toHaveLength(1);
    expect(kept).toEqual([4]);
  });

  it("says why it was refused, and sends the next change", async () => {
    autosave.want(damped(400));
    await pass(800);
    await sent[0].reply({ kind: "refused", message: "You may only read this project." });
    expect(last()).toEqual({ kind: "refused", message: "You may only read this project." });
    autosave.want(damped(500));
    await pass(800);
    expect(sent[1]).toMatchObject({ viscous: 500, version: 3 });
  });

  it("waits while nobody is signed in", async () => {
    autosave.want(damped(400));
    await pass(800);
    await sent[0].reply({ kind: "signed-out" });
    await pass(60_000);
    expect(sent).toHaveLength(1);
    expect(last()).toEqual({ kind: "signed-out" });
    autosave.want(damped(400));
    await pass(800);
    expect(sent[1]).toMatchObject({ viscous: 400, version: 3 });
  });

  it("sends what waits at once when the page is left, and does not try again", async () => {
    autosave.want(damped(400));
    autosave.close();
    await pass(0);
    expect(sent).toMatchObject([{ viscous: 400 }]);
    await sent[0].reply({ kind: "unreachable" });
    await pass(60_000);
    expect(sent).toHaveLength(1);
  });

  it("sends nothing when the page is left with everything kept", async () => {
    autosave.close();
    await pass(60_000);
    expect(sent).toEqual([]);
  });
});
