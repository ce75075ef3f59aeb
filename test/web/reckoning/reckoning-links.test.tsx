import type { Scenario } from "@restband/solver";
import { configure, render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { beforeEach, describe, expect, it, vi } from "vitest";
import { ReckoningLinks } from "../../../web/src/features/reckoning/reckoning-links.tsx";
import { reckoningsFor } from "../../../web/src/features/reckoning/reckonings.ts";
import type { Taken } from "../../../web/src/features/reckoning/taken.ts";
import { allowDialogs } from "../support/missing-in-jsdom.ts";
import { creepFeed, variant } from "../support/scenarios.ts";

// The inside of a dialog is loaded when it is first asked for.
configure({ asyncUtilTimeout: 10_000 });
beforeEach(allowDialogs);

const rotor = variant({
  motion: "angular",
  base: [],
  contact: { ...creepFeed.contact, normal: { ...creepFeed.contact.normal, weight: false } },
});

let openings = 0;

/** Opens a reckoning by its link; each opening is a scenario of its own unless named. */
async function openReckoning(path: string, link: string, scenario: Scenario = creepFeed, keptUnder = `${openings++}`) {
  const onTake = vi.fn<(taken: readonly Taken[]) => void>();
  const { unmount } = render(<ReckoningLinks path={path} scenario={scenario} keptUnder={keptUnder} onTake={onTake} />);
  const user = userEvent.setup();
  await user.click(screen.getByRole("button", { name: link }));
  const dialog = await screen.findByRole("dialog");
  const within_ = within(dialog);
  await within_.findByRole("button", { name: "Cancel" });
  return { user, onTake, dialog: within_, unmount };
}

describe("the ways to a value", () => {
  it("are offered where there are some, a band brake for what turns alone", () => {
    expect(reckoningsFor("contact.normal.preload", "linear").map(({ key }) => key)).toEqual(["bolts"]);
    expect(reckoningsFor("contact.normal.preload", "angular").map(({ key }) => key)).toEqual(["bolts", "band-brake"]);
    expect(reckoningsFor("span.seconds", "linear")).toEqual([]);
  });
});

describe("the friction table", () => {
  it("fills static and kinetic friction with source and range", async () => {
    const { user, onTake, dialog } = await openReckoning("contact.law.static", "look it up");
    await user.click(dialog.getByRole("radio", { name: "Steel on steel lubricated" }));
    expect(dialog.getByText("Static 0.225 and kinetic 0.145")).toBeInTheDocument();
    await user.click(dialog.getByRole("button", { name: "Take it" }));
    const source = "Steel on steel, lubricated: pickedshares.com; a drive maker’s guide, p. 323 (easymanua.ls)";
    // (0.10 + 0.35) / 2 = 0.225, (0.04 + 0.25) / 2 = 0.145
    expect(onTake).toHaveBeenCalledWith([
      { path: "contact.law.static", value: 0.225, origin: { kind: "catalogue", source, low: 0.1, high: 0.35 } },
      { path: "contact.law.kinetic", value: 0.145, origin: { kind: "catalogue", source, low: 0.04, high: 0.25 } },
    ]);
    expect(screen.queryByText("Static 0.225 and kinetic 0.145")).not.toBeInTheDocument();
  });

  it("says what a row does not print", async () => {
    const { user, dialog } = await openReckoning("contact.law.kinetic", "look it up");
    await user.click(dialog.getByRole("radio", { name: /^Rail guide, balls/ }));
    expect(dialog.getByText(/Static is not printed and stays as it is\./)).toBeInTheDocument();
  });
});

describe("a sheet", () => {
  it("shows the formula with the numbers put in and takes the value with its range", async () => {
    const { user, onTake, dialog } = await openReckoning("contact.normal.preload", "work it out from bolts");
    await user.type(dialog.getByLabelText("Torque, T"), "10");
    await user.selectOptions(dialog.getByLabelText("Thread"), "M8");
    expect(dialog.getByLabelText("Nominal diameter, d")).toHaveValue("8");
    // 10 / (0.2 · 0.008)
    expect(dialog.getByText(/^Somewhere from 4688 N to 7813 N;/)).toBeInTheDocument();
    await user.click(dialog.getByRole("button", { name: "Take it" }));
    expect(onTake).toHaveBeenCalledWith([
      {
        path: "contact.normal.preload",
        value: 6250,
        origin: {
          kind: "calculated",
          source:
            "N = z · T / (K · d), from the tightening torque, with T 10\u00a0N·m, K 0.2, d 8\u00a0mm, z 1, s 25\u00a0% (textbook, from memory)",
          low: 4688,
          high: 7813,
        },
      },
    ]);
  });

  it("says at the field what is wrong, takes nothing and loses nothing", async () => {
    const { user, onTake, dialog } = await openReckoning("contact.normal.preload", "work it out from bolts");
    await user.type(dialog.getByLabelText("Torque, T"), "-10");
    await user.selectOptions(dialog.getByLabelText("Thread"), "M8");
    expect(dialog.getByLabelText("Torque, T")).toHaveAccessibleDescription(/Enter more than 0\u00a0N·m\./);
    await user.click(dialog.getByRole("button", { name: "Take it" }));
    expect(onTake).not.toHaveBeenCalled();
    await user.selectOptions(dialog.getByLabelText("Way to the value"), "from the property class");
    await user.selectOptions(dialog.getByLabelText("Way to the value"), "from the tightening torque");
    expect(dialog.getByLabelText("Torque, T")).toHaveValue("-10");
  });

  it("warns that a band brakes more in one direction", async () => {
    const { user, dialog } = await openReckoning("contact.normal.preload", "work it out from a band brake", rotor);
    await user.type(dialog.getByLabelText("Pull on the band’s end, T"), "200");
    expect(dialog.getByRole("note")).toHaveTextContent(/Friction is never the only thing that holds a load/);
    // μφ = 0.12 · 4.712389 = 0.5654867; exp = 1.760304
    expect(dialog.getByText(/1\.76 times as much\./)).toBeInTheDocument();
    expect(dialog.getByText(/With it the effective radius becomes 1 m and the faces become one\./)).toBeInTheDocument();
  });
});

describe("a stiffness chain", () => {
  it("is built, named after its weakest member and taken with every number", async () => {
    const { user, onTake, dialog } = await openReckoning("body.stiffness", "work it out");
    await user.click(dialog.getByRole("button", { name: "Add" }));
    const screw = within(dialog.getByRole("group", { name: "Screw shaft" }));
    await user.type(screw.getByLabelText("Core diameter, d"), "20");
    await user.type(screw.getByLabelText("From fixed bearing to nut, L"), "0.5 m");
    await user.selectOptions(dialog.getByLabelText("Add"), "Ball or roller nut, from its sheet");
    await user.click(dialog.getByRole("button", { name: "Add" }));
    expect(dialog.getByText("Ball or roller nut still wants a number.")).toBeInTheDocument();
    const nut = within(dialog.getByRole("group", { name: "Ball or roller nut" }));
    await user.type(nut.getByLabelText("Stiffness, k"), "400 N/um");
    // 1 / (1/131.9469 + 1/400) = 99.2182 N/μm; 99.2182 / 131.9469 = 0.75195
    expect(dialog.getByText("Screw shaft gives way most: 75.2 % of the compliance.")).toBeInTheDocument();
    await user.click(dialog.getByRole("button", { name: "Take it" }));
    const [[[taken]]] = onTake.mock.calls;
    expect(taken.value).toBe(99.22e6);
    expect(taken.origin).toEqual({
      kind: "calculated",
      source:
        "in series: Screw shaft (E 210\u00a0GPa, d 20\u00a0mm, L 0.5\u00a0m) 131.9\u00a0N/μm; Ball or roller nut 400\u00a0N/μm (textbook, from memory). Screw shaft gives way most: 75.2\u00a0% of the compliance.",
    });
  });

  it("keeps a member that stands on the wrong side of a screw and says so", async () => {
    const { user, dialog } = await openReckoning("body.stiffness", "work it out");
    await user.selectOptions(dialog.getByLabelText("Add"), "A group: behind a screw or gears, or joined otherwise");
    await user.click(dialog.getByRole("button", { name: "Add" }));
    const group = within(dialog.getByRole("group", { name: "Group" }));
    await user.type(group.getByLabelText("Lead, p"), "10");
    await user.selectOptions(group.getByLabelText("Add to the group"), "Coupling, from its sheet");
    await user.click(group.getByRole("button", { name: "Add" }));
    await user.type(group.getByLabelText("Torsional stiffness, κ"), "4000");
    // (2π / 0.01)² · 4000 = 1.579e9
    expect(dialog.getByText("= 1579 N/μm")).toBeInTheDocument();
    await user.selectOptions(group.getByLabelText("The group stands"), "before no transmission");
    expect(
      group.getByText("Coupling turns, but here things move straight. Put it in a group behind a screw or pulley."),
    ).toBeInTheDocument();
    await user.selectOptions(group.getByLabelText("The group stands"), "behind a screw");
    expect(group.getByLabelText("Torsional stiffness, κ")).toHaveValue("4000");
  });

  it("opens as it was left, for the same scenario alone", async () => {
    const first = await openReckoning("body.stiffness", "work it out", creepFeed, "one");
    await first.user.click(first.dialog.getByRole("button", { name: "Add" }));
    first.unmount();
    const again = await openReckoning("body.stiffness", "work it out", creepFeed, "one");
    expect(again.dialog.getByRole("group", { name: "Screw shaft" })).toBeInTheDocument();
    again.unmount();
    const other = await openReckoning("body.stiffness", "work it out", creepFeed, "two");
    expect(other.dialog.queryByRole("group", { name: "Screw shaft" })).not.toBeInTheDocument();
  });
});

describe("everything that moves", () => {
  it("adds a rotor behind a lead to the mass: 80 + (2π/0.01)² · 2e-4 = 158.96 kg", async () => {
    const { user, onTake, dialog } = await openReckoning("body.inertia", "work it out");
    await user.click(dialog.getByRole("button", { name: "Add" }));
    await user.type(dialog.getByLabelText("Mass, m"), "80");
    await user.selectOptions(dialog.getByLabelText("Add"), "A group: behind a screw or gears, or joined otherwise");
    await user.click(dialog.getByRole("button", { name: "Add" }));
    const group = within(dialog.getByRole("group", { name: "Group" }));
    await user.type(group.getByLabelText("Lead, p"), "10");
    await user.click(group.getByRole("button", { name: "Add" }));
    await user.type(group.getByLabelText("Moment of inertia, J"), "2");
    await user.click(dialog.getByRole("button", { name: "Take it" }));
    const [[[taken]]] = onTake.mock.calls;
    expect(taken.value).toBe(159);
    expect(taken.origin.source).toBe(
      "Mass 80\u00a0kg + behind a screw (p 10\u00a0mm): [Rotor 2\u00a0kg·cm²] (textbook, from memory). Mass is the most of it: 50.3\u00a0%.",
    );
  });
});
