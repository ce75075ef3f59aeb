import { describe, expect, it } from "vitest";
import { takeValues } from "../../../web/src/features/statement/changes.ts";
import { draftReducer } from "../../../web/src/features/statement/draft/draft-reducer.ts";
import { openDraft } from "../../../web/src/features/statement/draft/open-draft.ts";
import { creepFeed } from "../support/scenarios.ts";

const origin = { kind: "catalogue", source: "a table", low: 0.1, high: 0.35 } as const;
const pair = takeValues([
  { path: "contact.law.static", value: 0.225, origin },
  { path: "contact.law.kinetic", value: 0.145, origin: { ...origin, low: 0.04, high: 0.25 } },
]);

describe("taking worked-out values into the draft", () => {
  it("sets all of them with their origins in one step, so that no rule between them is broken on the way", () => {
    const draft = draftReducer(openDraft(creepFeed), pair);
    expect(draft.faults).toEqual([]);
    expect(draft.inForce.contact.law).toEqual({ model: "coulomb", static: 0.225, kinetic: 0.145 });
    expect(draft.inForce.origins["contact.law.static"]).toEqual(origin);
    expect(draftReducer(draft, { type: "undo" }).inForce).toEqual(creepFeed);
  });

  it("puts away what was typed in their place, and the unit it was typed in", () => {
    const typed = draftReducer(openDraft(creepFeed), {
      type: "leave-unread",
      path: "contact.law.static",
      text: "about 0.2",
      message: "“about 0.2” is not a number.",
    });
    const { faults, sheet } = draftReducer(typed, pair);
    expect(faults).toEqual([]);
    expect(sheet.unread).toEqual({});
  });

  it("says a value outside its bounds at its field and keeps the last valid one", () => {
    const draft = draftReducer(
      openDraft(creepFeed),
      takeValues([{ path: "contact.law.kinetic", value: 0.22, origin: { kind: "catalogue" } }]),
    );
    expect(draft.faults.map(({ path }) => path)).toEqual(["contact.law.kinetic"]);
    expect(draft.inForce.contact.law).toEqual(creepFeed.contact.law);
  });
});
