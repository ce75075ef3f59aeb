import { describe, expect, it } from "vitest";
import { draftReducer } from "../../../web/src/features/statement/draft/draft-reducer.ts";
import { openDraft } from "../../../web/src/features/statement/draft/open-draft.ts";
import type { Draft, DraftAction } from "../../../web/src/features/statement/draft/draft.ts";
import {
  addLimit,
  addTerm,
  raiseItem,
  removeItem,
  setLaw,
  setMotion,
  setRipple,
  setTermKind,
} from "../../../web/src/features/statement/changes.ts";
import { creepFeed, variant } from "../support/scenarios.ts";

const after = (draft: Draft, ...actions: DraftAction[]): Draft => actions.reduce(draftReducer, draft);
const set = (path: string, value: unknown): DraftAction => ({ type: "set", path, value });

describe("a draft", () => {
  it("puts a valid value in force at once", () => {
    const draft = after(openDraft(creepFeed), set("body.viscous", 1200));
    expect(draft.inForce.body.viscous).toBe(1200);
    expect(draft.faults).toEqual([]);
  });

  it("keeps a refused value as typed, and the last valid one in force", () => {
    const draft = after(openDraft(creepFeed), set("body.inertia", -3));
    expect(draft.sheet.wanted.body.inertia).toBe(-3);
    expect(draft.inForce.body.inertia).toBe(120);
    expect(draft.faults).toMatchObject([{ path: "body.inertia" }]);
  });

  it("lets one wrong number hold up nothing else", () => {
    const draft = after(openDraft(creepFeed), set("body.inertia", -3), set("body.viscous", 1200));
    expect(draft.inForce.body).toMatchObject({ inertia: 120, viscous: 1200 });
  });

  it("tells a rule across two values at the one just changed, and is content once the other follows", () => {
    const refused = after(openDraft(creepFeed), set("contact.law.kinetic", 0.16));
    expect(refused.faults).toMatchObject([{ path: "contact.law.kinetic" }]);
    expect(refused.inForce.contact.law).toMatchObject({ static: 0.15, kinetic: 0.12 });
    const other = after(refused, set("body.viscous", 1200));
    expect(other.inForce).toMatchObject({ body: { viscous: 1200 }, contact: { law: { kinetic: 0.12 } } });
    const cured = after(other, set("contact.law.static", 0.2));
    expect(cured.faults).toEqual([]);
    expect(cured.inForce.contact.law).toMatchObject({ static: 0.2, kinetic: 0.16 });
  });

  it("keeps a text that is no number until it is read", () => {
    const unread = { type: "leave-unread", path: "body.viscous", text: "much", message: "no" } as const;
    const draft = after(openDraft(creepFeed), unread);
    expect(draft.sheet.unread["body.viscous"]).toEqual({ text: "much", message: "no" });
    expect(draft.faults).toEqual([{ path: "body.viscous", message: "no" }]);
    expect(draft.inForce.body.viscous).toBe(350);
    expect(after(draft, set("body.viscous", 400))).toMatchObject({ faults: [], sheet: { unread: {} } });
  });

  it("remembers the unit a value was typed in, through undo", () => {
    const typed: DraftAction = { type: "set", path: "base[0].rate", value: 0.002 / 60, unit: "mm/min" };
    const draft = after(openDraft(creepFeed), typed);
    expect(draft.sheet.units).toEqual({ "base[0].rate": "mm/min" });
    expect(after(draft, { type: "undo" }).sheet.units).toEqual({});
    expect(after(draft, { type: "undo" }, { type: "redo" }).sheet.units).toEqual({ "base[0].rate": "mm/min" });
  });

  it("shows a value in the unit its origin was entered in", () => {
    const scenario = variant({ origins: { "body.stiffness": { kind: "measured", entered: "4 N/μm" } } });
    expect(openDraft(scenario).sheet.units).toEqual({ "body.stiffness": "N/μm" });
  });

  it("renews what an origin says was entered", () => {
    const scenario = variant({
      origins: { "contact.law.static": { kind: "catalogue", source: "sheet", entered: "0.15" } },
    });
    const draft = after(openDraft(scenario), { type: "set", path: "contact.law.static", value: 0.18, entered: "0.18" });
    expect(draft.inForce.origins["contact.law.static"]).toEqual({
      kind: "catalogue",
      source: "sheet",
      entered: "0.18",
    });
    const silent = after(openDraft(scenario), set("contact.law.static", 0.17));
    expect(silent.inForce.origins["contact.law.static"]).toEqual({ kind: "catalogue", source: "sheet" });
  });
});

describe("undo", () => {
  it("takes a whole drag back in one step, and two values in two", () => {
    const dragged = after(openDraft(creepFeed), set("body.viscous", 400), set("body.viscous", 500), { type: "settle" });
    expect(after(dragged, { type: "undo" }).inForce.body.viscous).toBe(350);
    const two = after(dragged, set("body.viscous", 600));
    expect(after(two, { type: "undo" }).inForce.body.viscous).toBe(500);
    expect(after(two, { type: "undo" }, { type: "undo" }, { type: "undo" }).inForce).toEqual(creepFeed);
  });

  it("goes forth again, until something new is done", () => {
    const undone = after(openDraft(creepFeed), set("body.viscous", 400), { type: "undo" });
    expect(after(undone, { type: "redo" }).inForce.body.viscous).toBe(400);
    const anew = after(undone, set("body.inertia", 100), { type: "redo" });
    expect(anew.inForce.body).toMatchObject({ inertia: 100, viscous: 350 });
  });

  it("brings a refused value back as it was typed", () => {
    const draft = after(openDraft(creepFeed), set("body.inertia", -3), { type: "settle" }, set("body.inertia", 100));
    expect(after(draft, { type: "undo" })).toMatchObject({
      sheet: { wanted: { body: { inertia: -3 } } },
      inForce: { body: { inertia: 100 } },
      faults: [{ path: "body.inertia" }],
    });
  });
});

describe("a change of structure", () => {
  const scenario = variant({
    force: [
      { kind: "constant", value: 5 },
      { kind: "harmonic", amplitude: 10, hz: 4, phase: 0 },
    ],
    origins: { "force[1].hz": { kind: "measured" }, "contact.law.static": { kind: "assumed" } },
  });

  it("keeps what two laws have in common", () => {
    const draft = after(openDraft(scenario), setLaw("stribeck"));
    expect(draft.inForce.contact.law).toMatchObject({ model: "stribeck", static: 0.15, kinetic: 0.12 });
    expect(draft.inForce.origins).toHaveProperty(["contact.law.static"]);
  });

  it("drops the origins of values that are gone", () => {
    const draft = after(openDraft(scenario), setLaw("none"));
    expect(draft.faults).toEqual([]);
    expect(draft.inForce.origins).toEqual({ "force[1].hz": { kind: "measured" } });
  });

  it("moves origins, units and texts along with their term", () => {
    const typed = after(openDraft(scenario), { type: "show-in", path: "force[1].hz", unit: "rpm" });
    const removed = after(typed, removeItem("force", 0));
    expect(removed.inForce.origins).toHaveProperty(["force[0].hz"]);
    expect(removed.sheet.units).toEqual({ "force[0].hz": "rpm" });
    const raised = after(typed, raiseItem("force", 1));
    expect(raised.inForce.force.map(({ kind }) => kind)).toEqual(["harmonic", "constant"]);
    expect(raised.inForce.origins).toHaveProperty(["force[0].hz"]);
    expect(after(typed, removeItem("force", 1)).sheet.units).toEqual({});
  });

  it("turns a straight body without leaving what a rotor cannot have", () => {
    const unbalanced = variant({
      incline: 10,
      force: [{ kind: "unbalance", mass: 1, eccentricity: 0.1, hz: 5, phase: 0 }],
    });
    const draft = after(openDraft(unbalanced), setMotion("angular"));
    expect(draft.faults).toEqual([]);
    expect(draft.inForce).toMatchObject({
      motion: "angular",
      incline: 0,
      force: [],
      contact: { normal: { weight: false } },
    });
    const back = after(draft, { type: "set", path: "contact.radius", value: 0.2 }, setMotion("linear"));
    expect(back.faults).toEqual([]);
    expect(back.inForce.contact.radius).toBe(1);
  });

  it("adds and changes terms, ripple and limits that are valid as they come", () => {
    const draft = after(
      openDraft(scenario),
      addTerm("base", "harmonic"),
      addTerm("base", "record"),
      setTermKind("force", 1, "pulse"),
      setRipple(true),
      addLimit("peakVelocity", 0.1),
    );
    expect(draft.faults).toEqual([]);
    expect(draft.inForce.base.map(({ kind }) => kind)).toEqual(["ramp", "harmonic", "record"]);
    expect(draft.inForce.limits).toHaveLength(2);
    expect(draft.inForce.contact.normal.ripple).not.toBeNull();
  });
});
