import type { Scenario } from "@restband/solver";
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

vi.setConfig({ testTimeout: 30_000 });
vi.mock("../../../web/src/compute/use-scan.ts", () => ({ useScan: () => [] }));

let draft: Draft;

function Bench({ scenario }: { scenario: Scenario }) {
  const [current, dispatch] = useReducer(draftReducer, openDraft(scenario));
  draft = current;
  return <Statement draft={current} dispatch={dispatch} refusal={null} />;
}

function open(scenario: Scenario = creepFeed) {
  render(<Bench scenario={scenario} />);
  Element.prototype.scrollIntoView = () => undefined;
  return userEvent.setup();
}

const key = "contact.law.static";

// A person comes after they are loaded.
beforeAll(() => Promise.all([editing.ask(), import("../../../web/src/features/statement/form/group-form.tsx")]));
beforeEach(allowLayout);

describe("where a value comes from", () => {
  it("is said in the value's editor, with its source and range, and shown in the statement", async () => {
    const user = open();
    await user.click(screen.getByRole("button", { name: "Static friction: 0.15" }));
    await user.click(screen.getByRole("button", { name: "say where it comes from, Static friction" }));
    const form = within(screen.getByRole("group", { name: "Where Static friction comes from" }));
    await user.selectOptions(form.getByRole("combobox", { name: "Kind" }), "catalogue");
    await user.type(form.getByRole("textbox", { name: "Source" }), "sheet 12");
    await user.type(form.getByRole("textbox", { name: "Range" }), "±20 %");
    expect(draft.inForce.origins[key]).toEqual({
      kind: "catalogue",
      source: "sheet 12",
      entered: "0.15",
      low: 0.12,
      high: 0.18,
    });
    const told = within(screen.getByRole("list", { name: "Where values of Contact come from" }));
    expect(told.getByText("static friction: catalogue, sheet 12, 0.12 to 0.18")).toBeInTheDocument();
  });

  it("keeps the range in force while a text is no range, and says how one reads", async () => {
    const user = open(variant({ origins: { [key]: { kind: "measured", low: 0.12, high: 0.18 } } }));
    await user.click(screen.getByRole("button", { name: "Static friction: 0.15" }));
    await user.click(screen.getByRole("button", { name: "comes from, Static friction" }));
    const range = screen.getByRole("textbox", { name: "Range" });
    expect(range).toHaveValue("0.12 to 0.18");
    await user.clear(range);
    await user.type(range, "roughly");
    await user.tab();
    expect(range).toHaveValue("roughly");
    expect(range).toHaveAccessibleDescription(/^A range reads/);
    expect(draft.inForce.origins[key]).toEqual({ kind: "measured" });
  });

  it("is taken back, and that is one step of undo", async () => {
    const origin = { kind: "standard", source: "table 3" } as const;
    const user = open(variant({ origins: { [key]: origin } }));
    await user.click(screen.getByRole("button", { name: "Static friction: 0.15" }));
    await user.click(screen.getByRole("button", { name: "comes from, Static friction" }));
    await user.selectOptions(screen.getByRole("combobox", { name: "Kind" }), "not said");
    expect(draft.inForce.origins).toEqual({});
    expect(draft.past).toHaveLength(1);
    expect(draft.past[0].wanted.origins).toEqual({ [key]: origin });
  });

  it("is missed in a list that leads to each value without one", async () => {
    const user = open(variant({ origins: { "body.inertia": { kind: "measured" } } }));
    // Stiffness, damping, both frictions, preload, feed rate; the limit of 0 and the one face need none.
    await user.click(screen.getByText("Six values without an origin"));
    const list = within(screen.getByRole("list", { name: "Values without an origin" }));
    expect(list.queryByRole("button", { name: "Mass" })).not.toBeInTheDocument();
    await user.click(list.getByRole("button", { name: "Damping" }));
    expect(screen.getByRole("textbox", { name: "Damping" })).toHaveFocus();
  });

  it("is said in the whole form as well, where the list leads to its field", async () => {
    const user = open();
    await user.click(screen.getByRole("button", { name: "all fields of Body" }));
    await screen.findByRole("textbox", { name: "Damping, c" });
    await user.click(screen.getByText(/values without an origin$/));
    const list = within(screen.getByRole("list", { name: "Values without an origin" }));
    await user.click(list.getByRole("button", { name: "Damping" }));
    expect(screen.getByRole("textbox", { name: "Damping, c" })).toHaveFocus();
    expect(screen.getByRole("button", { name: "say where it comes from, Damping" })).toBeInTheDocument();
  });
});
