import type { Scenario } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { addTerm, setTermKind } from "../../../web/src/features/statement/changes.ts";
import type { Draft, DraftAction } from "../../../web/src/features/statement/draft/draft.ts";
import { draftReducer } from "../../../web/src/features/statement/draft/draft-reducer.ts";
import { openDraft } from "../../../web/src/features/statement/draft/open-draft.ts";
import { driveSentence } from "../../../web/src/features/statement/sentence/drive-sentence.ts";
import { plainText } from "../../../web/src/features/statement/sentence/plain-text.ts";
import { raiseTerm, removeTerm, switchOff, switchOn, termRows } from "../../../web/src/features/statement/terms.ts";
import { creepFeed, variant } from "../support/scenarios.ts";

const steady = { kind: "constant", value: 5 } as const;
const swing = { kind: "harmonic", amplitude: 40, hz: 12, phase: 0 } as const;
const kick = { kind: "step", value: 3, start: 0.1 } as const;
const three = variant({
  force: [steady, swing, kick],
  origins: { "force[1].hz": { kind: "measured", entered: "720 rpm" }, "force[2].value": { kind: "assumed" } },
});

const after = (scenario: Scenario | Draft, ...actions: DraftAction[]): Draft =>
  actions.reduce(draftReducer, "sheet" in scenario ? scenario : openDraft(scenario));

/** What stands in the statement, in order; what is off in brackets. */
const told = ({ sheet }: Draft): string =>
  termRows(sheet.wanted, sheet.off, "force")
    .map((row) => (row.isOn ? sheet.wanted.force[row.index].kind : `(${row.off.term.kind})`))
    .join(" ");

describe("a term that is switched off", () => {
  it("is out of force, and its origins and units with it", () => {
    const draft = after(three, switchOff("force", 1));
    expect(draft.inForce.force).toEqual([steady, kick]);
    expect(draft.inForce.origins).toEqual({ "force[1].value": { kind: "assumed" } });
    expect(draft.sheet.units).toEqual({});
    expect(draft.sheet.off).toEqual([
      {
        place: "force",
        index: 1,
        term: swing,
        origins: { hz: { kind: "measured", entered: "720 rpm" } },
        units: { hz: "rpm" },
      },
    ]);
    expect(told(draft)).toBe("constant (harmonic) step");
  });

  it("comes back to its old place as it was, and undo takes each step back", () => {
    const off = after(three, switchOff("force", 1));
    const back = after(off, switchOn("force", 1));
    expect(back.inForce).toEqual(three);
    expect(back.sheet).toMatchObject({ units: { "force[1].hz": "rpm" }, off: [] });
    expect(told(after(back, { type: "undo" }))).toBe("constant (harmonic) step");
    expect(after(back, { type: "undo" }, { type: "undo" }).inForce).toEqual(three);
    expect(after(off, { type: "undo" }, { type: "redo" }).sheet).toEqual(off.sheet);
  });

  it("keeps its place while others go, come and go off", () => {
    const all = after(three, switchOff("force", 0), switchOff("force", 1));
    expect(told(all)).toBe("(constant) (harmonic) step");
    expect(told(after(all, addTerm("force", "pulse")))).toBe("(constant) (harmonic) step pulse");
    expect(told(after(all, removeTerm("force", 0)))).toBe("(harmonic) step");
    expect(told(after(all, removeTerm("force", 2)))).toBe("(constant) (harmonic)");
    expect(told(after(all, setTermKind("force", 0, "chirp")))).toBe("(constant) (harmonic) chirp");
    expect(after(all, switchOn("force", 1), switchOn("force", 0)).inForce).toEqual(three);
  });

  it("is ordered like any other", () => {
    const draft = after(three, switchOff("force", 1));
    const raised = after(draft, raiseTerm("force", 1));
    expect(told(raised)).toBe("(harmonic) constant step");
    expect(raised.inForce).toEqual(draft.inForce);
    expect(told(after(draft, raiseTerm("force", 2)))).toBe("constant step (harmonic)");
    expect(after(raised, switchOn("force", 0)).inForce.force).toEqual([swing, steady, kick]);
    expect(told(after(three, raiseTerm("force", 2)))).toBe("constant step harmonic");
  });

  it("keeps the numbers in force where one was refused", () => {
    const refused = after(three, { type: "set", path: "force[1].hz", value: -12 }, switchOff("force", 1));
    expect(refused.faults).toEqual([]);
    expect(refused.sheet.off).toMatchObject([{ term: swing }]);
  });

  it("is told struck out of the sentence, in the units it was typed in", () => {
    const { inForce, sheet } = after(three, switchOff("force", 1));
    const pieces = driveSentence(inForce, sheet.off);
    expect(pieces.filter(({ kind }) => kind === "off")).toMatchObject([
      { text: "A force swings by ±40\u00a0N at 720\u00a0rpm with phase 0°" },
    ]);
    expect(plainText(inForce, pieces)).toContain("with phase 0° (off). A force of 3");
  });

  it("leaves the words for nothing where no other is in force", () => {
    const { inForce, sheet } = after(creepFeed, switchOff("base", 0));
    expect(plainText(inForce, driveSentence(inForce, sheet.off)).replaceAll("\u00a0", " ")).toBe(
      "The far end of the spring stands still. The far end of the spring is fed at 2 mm/s from 0 s on (off). No force acts on the body. The ways are level.",
    );
  });
});
