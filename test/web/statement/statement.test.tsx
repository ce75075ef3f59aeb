import type { Refusal, Scenario } from "@restband/solver";
import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { useReducer } from "react";
import { beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { editing } from "../../../web/src/features/statement/draft/editing-part.ts";
import { draftReducer } from "../../../web/src/features/statement/draft/draft-reducer.ts";
import { openDraft } from "../../../web/src/features/statement/draft/open-draft.ts";
import type { Draft } from "../../../web/src/features/statement/draft/draft.ts";
import { Statement } from "../../../web/src/features/statement/statement.tsx";
import { allowLayout } from "../support/missing-in-jsdom.ts";
import { creepFeed, variant } from "../support/scenarios.ts";

// The scale under the ruler runs the scenario along it; that has tests of its own.
vi.mock("../../../web/src/compute/use-scan.ts", () => ({ useScan: () => [] }));

let draft: Draft;

function Bench({ scenario, refusal }: { scenario: Scenario; refusal: Refusal["error"] | null }) {
  const [current, dispatch] = useReducer(draftReducer, openDraft(scenario));
  draft = current;
  return <Statement draft={current} dispatch={dispatch} refusal={refusal} />;
}

function open(scenario: Scenario = creepFeed, refusal: Refusal["error"] | null = null) {
  render(<Bench scenario={scenario} refusal={refusal} />);
  return userEvent.setup();
}

const group = (name: string) => within(screen.getByRole("group", { name }));

// A person comes after they are loaded.
beforeAll(() => Promise.all([editing.ask(), import("../../../web/src/features/statement/form/group-form.tsx")]));
beforeEach(allowLayout);

describe("a term in its sentence", () => {
  const pushed = variant({ force: [{ kind: "harmonic", amplitude: 40, hz: 12, phase: 0 }] });

  it("is switched off by its mark, told struck through, and brought back by one press", async () => {
    const user = open(pushed);
    await user.selectOptions(screen.getByRole("combobox", { name: "Change force 1 of 1" }), "switch it off");
    expect(draft.inForce.force).toEqual([]);
    const words = "A force swings by ±40 N at 12 Hz with phase 0°";
    expect(screen.getByText(words, { selector: "s" })).toBeInTheDocument();
    await user.click(screen.getByRole("button", { name: /^switch on/ }));
    expect(draft.inForce).toEqual(pushed);
    expect(screen.getByRole("button", { name: "Amplitude: 40 N" })).toHaveFocus();
    expect(screen.queryByRole("group", { name: "Change Amplitude" })).not.toBeInTheDocument();
  });

  it("gets company by the same mark, with the editor of the new one open", async () => {
    const user = open(pushed);
    await user.selectOptions(screen.getByRole("combobox", { name: "Change force 1 of 1" }), "Step");
    expect(draft.inForce.force.map(({ kind }) => kind)).toEqual(["harmonic", "step"]);
    expect(screen.getByRole("group", { name: /^Change / })).toBeInTheDocument();
  });

  it("is switched off, ordered and brought back in the full form too", async () => {
    const user = open(pushed);
    await user.click(screen.getByRole("button", { name: "all fields of Drive" }));
    const force = within(await screen.findByRole("group", { name: "Harmonic, 1 of 1" }));
    await user.click(force.getByRole("button", { name: "Switch off" }));
    expect(draft.inForce.force).toEqual([]);
    const off = within(screen.getByRole("group", { name: "Harmonic, 1 of 1, off" }));
    await user.click(off.getByRole("button", { name: "Switch on" }));
    expect(draft.inForce).toEqual(pushed);
  });
});

describe("a value in its sentence", () => {
  it("opens an editor, takes what is typed at once, and is done by Enter", async () => {
    const user = open();
    await user.click(screen.getByRole("button", { name: "Damping: 350 N·s/m" }));
    const editor = within(screen.getByRole("group", { name: "Change Damping" }));
    const field = editor.getByRole("textbox", { name: "Damping" });
    expect(field).toHaveFocus();
    await user.keyboard("1200");
    expect(draft.inForce.body.viscous).toBe(1200);
    expect(editor.getByRole("textbox", { name: "damping ratio" })).toHaveValue("0.02739");
    await user.keyboard("{Enter}");
    expect(screen.queryByRole("group", { name: "Change Damping" })).not.toBeInTheDocument();
    expect(screen.getByRole("button", { name: "Damping: 1200 N·s/m" })).toHaveFocus();
  });

  it("is put back by Escape, and by its button", async () => {
    const user = open();
    await user.click(screen.getByRole("button", { name: /^Damping/ }));
    await user.keyboard("1200{Escape}");
    expect(draft.inForce.body.viscous).toBe(350);
    await user.click(screen.getByRole("button", { name: /^Damping/ }));
    await user.keyboard("900");
    await user.click(screen.getByRole("button", { name: "Put back 350" }));
    expect(draft.inForce.body.viscous).toBe(350);
  });

  it("changes nothing of what was entered where it is opened and put back", async () => {
    const entered = variant({ origins: { "body.viscous": { kind: "measured", entered: "350 N·s/m" } } });
    const user = open(entered);
    await user.click(screen.getByRole("button", { name: /^Damping/ }));
    await user.keyboard("{Escape}");
    expect(draft.inForce).toEqual(entered);
    expect(draft.past).toEqual([]);
    await user.click(screen.getByRole("button", { name: /^Damping/ }));
    await user.keyboard("9 N·s/mm{Escape}");
    expect(draft.inForce).toEqual(entered);
  });

  it("moves by arrow keys, 1 % or 10 %", async () => {
    const user = open();
    await user.click(screen.getByRole("button", { name: /^Rate/ }));
    await user.keyboard("{ArrowUp}");
    expect(draft.inForce.base[0]).toMatchObject({ rate: 0.00202 });
    await user.keyboard("{Shift>}{ArrowDown}{/Shift}");
    expect(draft.inForce.base[0]).toMatchObject({ rate: 0.00182 });
  });

  it("keeps the unit it was typed in", async () => {
    const user = open();
    await user.click(screen.getByRole("button", { name: "Rate: 2 mm/s" }));
    await user.keyboard("30 mm/min{Enter}");
    expect(draft.inForce.base[0]).toMatchObject({ rate: 0.0005 });
    expect(screen.getByRole("button", { name: "Rate: 30 mm/min" })).toBeInTheDocument();
  });

  it("is shown in another unit without being changed", async () => {
    const user = open();
    await user.click(screen.getByRole("button", { name: "Stiffness: 4 N/μm" }));
    await user.selectOptions(screen.getByRole("combobox", { name: "Unit of Stiffness" }), "N/mm");
    expect(screen.getByRole("textbox", { name: "Stiffness" })).toHaveValue("4000");
    expect(draft.inForce.body.stiffness).toBe(4e6);
  });

  it("can be entered as an equivalent", async () => {
    const user = open();
    await user.click(screen.getByRole("button", { name: /^Damping/ }));
    const ratio = screen.getByRole("textbox", { name: "damping ratio" });
    await user.clear(ratio);
    await user.type(ratio, "0.1");
    // 0.1 · 2 √(4·10⁶ · 120)
    expect(draft.inForce.body.viscous).toBeCloseTo(4381.78, 2);
  });

  it("asks which is meant where a comma can be either", async () => {
    const user = open();
    await user.click(screen.getByRole("button", { name: /^Damping/ }));
    await user.keyboard("1,200");
    expect(draft.inForce.body.viscous).toBe(350);
    await user.click(screen.getByRole("button", { name: "1200 N·s/m" }));
    expect(draft.inForce.body.viscous).toBe(1200);
    expect(screen.getByRole("textbox", { name: "Damping" })).toHaveValue("1200");
  });
});

describe("a refused value", () => {
  it("stays as typed, says why, and says what the answer keeps", async () => {
    const user = open();
    await user.click(screen.getByRole("button", { name: /^Mass/ }));
    await user.keyboard("-3{Enter}");
    const field = screen.getByRole("textbox", { name: "Mass" });
    expect(field).toHaveValue("-3");
    expect(field).toBeInvalid();
    expect(screen.getByText(/Mass must be .*more than 0.*Until then the answer keeps 120.kg\./)).toBeInTheDocument();
    expect(draft.inForce.body.inertia).toBe(120);
  });

  it("is flagged in the sentence and found again from there", async () => {
    const user = open();
    await user.click(screen.getByRole("button", { name: /^Mass/ }));
    await user.keyboard("heavy");
    await user.click(screen.getByRole("button", { name: /^Stiffness/ }));
    expect(screen.getByRole("button", { name: "Mass: heavy" })).toBeInTheDocument();
    expect(screen.getByText(/“heavy” is not a number/)).toBeInTheDocument();
    await user.click(screen.getByRole("button", { name: "put it right" }));
    expect(screen.getByRole("textbox", { name: "Mass" })).toHaveValue("heavy");
  });

  it("is counted under the form", async () => {
    const user = open();
    await user.click(screen.getByRole("button", { name: "all fields of Contact" }));
    const kinetic = await screen.findByRole("textbox", { name: "Kinetic friction, μk" });
    await user.clear(kinetic);
    await user.type(kinetic, "0.16");
    expect(screen.getByText("1 field to put right")).toBeInTheDocument();
    expect(kinetic).toHaveAccessibleDescription(/Until then the answer keeps 0\.12\./);
    await user.click(screen.getByRole("button", { name: "Back to the sentence" }));
    expect(screen.getByRole("button", { name: "Kinetic friction: 0.16" })).toBeInTheDocument();
  });
});

describe("a word in its sentence", () => {
  it("is a choice: law, counterface, motion, solid damping", async () => {
    const user = open();
    await user.selectOptions(screen.getByRole("combobox", { name: "Friction law" }), "Stribeck");
    expect(draft.inForce.contact.law.model).toBe("stribeck");
    expect(screen.getByRole("button", { name: "Stribeck velocity: 10 mm/s" })).toBeInTheDocument();
    await user.selectOptions(screen.getByRole("combobox", { name: "Counterface" }), "a belt");
    expect(draft.inForce.contact.counterface).toEqual({ velocity: 0.1 });
    await user.selectOptions(screen.getByRole("combobox", { name: "Motion" }), "rotor");
    expect(screen.getByRole("button", { name: /^Moment of inertia: 120 kg·m²/ })).toBeInTheDocument();
  });

  it("adds a force, whose first number opens by itself", async () => {
    const user = open();
    await user.selectOptions(screen.getByRole("combobox", { name: "Force on the body" }), "Harmonic");
    expect(draft.inForce.force).toHaveLength(1);
    expect(screen.getByRole("group", { name: "Change Amplitude" })).toBeInTheDocument();
  });

  it("adds a limit, whose bound opens by itself", async () => {
    const user = open();
    await user.selectOptions(screen.getByRole("combobox", { name: "Limit on" }), "Peak velocity");
    await user.keyboard("6{Enter}");
    expect(draft.inForce.limits[1]).toEqual({ quantity: "peakVelocity", max: 0.006 });
  });
});

describe("all fields", () => {
  it("hold every number of the format that the scenario has", async () => {
    const full = variant({
      solid: { model: "equivalent-viscous", lossFactor: 0.02, at: { hz: 12 } },
      settleBand: 1e-5,
      contact: {
        ...creepFeed.contact,
        counterface: { velocity: 0.1 },
        normal: { ...creepFeed.contact.normal, ripple: { amplitude: 50, hz: 12, phase: 10 } },
      },
      limits: [{ quantity: "stickFraction", min: 0, max: 0.5 }],
      base: [{ kind: "ramp", rate: 0.002, start: 0, stop: 3 }],
    });
    const user = open(full);
    const names = ["Body", "Contact", "Drive", "Start, span", "Limits"];
    for (const name of names) await user.click(screen.getByRole("button", { name: `all fields of ${name}` }));
    await screen.findByRole("textbox", { name: "At most" });
    // Body 4, solid 2, friction 2, pressing 2 and ripple 3, counterface 1, ramp 3, incline, start 2, span 3, band, limit 2; and the title.
    expect(screen.getAllByRole("textbox")).toHaveLength(27);
    for (const box of screen.getAllByRole("textbox")) expect(box).toHaveAccessibleName();
  });

  it("take terms out and change their order", async () => {
    const user = open(
      variant({
        force: [
          { kind: "constant", value: 5 },
          { kind: "step", value: 6, start: 0 },
        ],
      }),
    );
    await user.click(screen.getByRole("button", { name: "all fields of Drive" }));
    await screen.findByRole("group", { name: "Step, 2 of 2" });
    await user.click(group("Step, 2 of 2").getByRole("button", { name: "Move up" }));
    expect(draft.inForce.force.map(({ kind }) => kind)).toEqual(["step", "constant"]);
    await user.click(group("Step, 1 of 2").getByRole("button", { name: "Remove" }));
    expect(draft.inForce.force.map(({ kind }) => kind)).toEqual(["constant"]);
  });

  it("leave an optional number out when it is emptied", async () => {
    const user = open(variant({ settleBand: 1e-5, limits: [{ quantity: "peakVelocity", min: 0, max: 1 }] }));
    await user.click(screen.getByRole("button", { name: "all fields of Start, span" }));
    await user.clear(await screen.findByRole("textbox", { name: "Settle band" }));
    expect(draft.inForce.settleBand).toBeNull();
    await user.click(screen.getByRole("button", { name: "all fields of Limits" }));
    await user.clear(await screen.findByRole("textbox", { name: "At least" }));
    expect(draft.inForce.limits).toEqual([{ quantity: "peakVelocity", max: 1 }]);
  });

  it("take a pasted table of friction against speed", async () => {
    const user = open(variant({ contact: { ...creepFeed.contact, law: { model: "table", points: [[0, 0.2]] } } }));
    await user.click(screen.getByRole("button", { name: "all fields of Contact" }));
    const rows = await screen.findByRole("textbox", { name: "Sliding speed and friction" });
    await user.clear(rows);
    await user.click(rows);
    await user.paste("0\t0.21\n0.05\t0.12");
    expect(draft.inForce.contact.law).toEqual({
      model: "table",
      points: [
        [0, 0.21],
        [0.05, 0.12],
      ],
    });
    await user.paste("\nfast");
    expect(rows).toHaveAccessibleDescription(/Line 3/);
  });
});

it("what this version does not compute is said at its group, in words", () => {
  const stribeck = variant({
    contact: {
      ...creepFeed.contact,
      law: { model: "stribeck", static: 0.2, kinetic: 0.1, velocity: 0.01, exponent: 2, fluid: 0 },
    },
  });
  const fault = { path: "contact.law.model", message: "not computed by this version" };
  open(stribeck, { ...fault, faults: [fault] });
  expect(
    group("Contact").getByText(/^Friction by the Stribeck law is valid, but not computed by this version\./),
  ).toBeInTheDocument();
});

it("where values come from is shown with them", () => {
  open(
    variant({
      origins: { "contact.law.static": { kind: "catalogue", source: "way maker's sheet", low: 0.12, high: 0.18 } },
    }),
  );
  expect(group("Contact").getByText("static friction: catalogue, way maker's sheet, 0.12 to 0.18")).toBeInTheDocument();
});
