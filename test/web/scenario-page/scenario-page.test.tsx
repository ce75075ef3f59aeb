import "../support/page-alone.ts";
import { fireEvent, screen, waitFor, within } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import { readScenario } from "../../../web/src/features/statement/exchange/read-scenario.ts";
import { fakeServer, ok, ines } from "../support/fake-server.ts";
import { openPage } from "../support/open-page.tsx";
import { creepFeed, variant } from "../support/scenarios.ts";
import { answer, at, beyondTitle, changeDamping, saves, seen } from "../support/scenario-page.tsx";

describe("the page of a scenario", () => {
  it("answers, shows the run and what it says of itself", async () => {
    fakeServer(seen());
    openPage(at);
    expect(await answer()).toHaveTextContent("The carriage sticks and slips, 26 times a second.");
    expect(document.title).toBe("Z carriage, creep feed · Restband");
    expect(
      screen.getByRole("img", { name: /^Share of time stuck, none allowed: broken\. 39\.6.%/ }),
    ).toBeInTheDocument();
    expect(await screen.findByRole("img", { name: /^Over 0\.5.s: displacement of the carriage/ })).toBeInTheDocument();
    expect(screen.getByRole("slider", { name: "Time cursor" })).toBeInTheDocument();
    expect(
      within(screen.getByRole("table", { name: "Energy over the run" })).getByText("balances"),
    ).toBeInTheDocument();
    expect(screen.getByText(/^Exact method/)).toBeInTheDocument();
    expect(screen.getByRole("note")).toHaveTextContent("An idealised body with one degree of freedom.");
  });

  it("reads the answer out with what became of the limits, and anew after a change", async () => {
    fakeServer(seen());
    const { user } = openPage(at);
    const told = () => screen.getAllByRole("status").map(({ textContent }) => textContent.replaceAll("\u00a0", " "));
    await answer();
    await waitFor(() =>
      expect(told()).toContain("The carriage sticks and slips, 26 times a second. The limit is broken."),
    );
    await user.click(screen.getByRole("button", { name: /^Damping/ }));
    await user.keyboard("8000{Enter}");
    await waitFor(() => expect(told()).toContain("The carriage slides smoothly at 2 mm/s. The limit is kept."));
  });

  it("answers anew with every change, and saves it over the version it was made from", async () => {
    const requests = fakeServer(seen());
    const { user } = openPage(at);
    await answer();
    await changeDamping(user, "8000");
    await waitFor(async () => expect(await answer()).toHaveTextContent("The carriage slides smoothly at 2 mm/s."));
    await screen.findByText(/^saved \d\d:\d\d$/);
    const [save, ...others] = saves(requests);
    expect(others).toEqual([]);
    expect(save.headers["If-Match"]).toBe('"3"');
    expect(save.body).toMatchObject({ content: { body: { viscous: 8000 } } });
  });

  it("shows all of it in the units a person thinks in, remembers those and saves nothing else", async () => {
    const requests = fakeServer({ ...seen(), "PATCH /account": ok({ ...ines, units: "inch" }) });
    const { user } = openPage(at);
    await answer();
    await user.selectOptions(screen.getByRole("combobox", { name: /^Units/ }), "inch–pound");
    // 120 kg / 0.45359237, 4 N/μm / (0.45359237 · 9.80665 / 0.0254)
    expect(screen.getByRole("button", { name: "Mass: 264.6 lb" })).toBeInTheDocument();
    expect(screen.getByRole("button", { name: "Stiffness: 22\u202f841 lbf/in" })).toBeInTheDocument();
    expect(await screen.findByText(/at up to 0\.21\sin\/s/)).toBeInTheDocument();
    expect(requests.find(({ method }) => method === "PATCH")).toMatchObject({ body: { units: "inch" } });
    expect(saves(requests)).toEqual([]);
    await changeDamping(user, "10");
    await waitFor(() => expect(saves(requests)).toHaveLength(1));
    expect(saves(requests)[0].body).toMatchObject({ content: { body: { inertia: 120, stiffness: 4e6 } } });
  });

  it("takes in a scenario as JSON, names every fault of one that is not right, and gives the old one back", async () => {
    fakeServer(seen());
    const { user } = openPage(at);
    await user.click(await screen.findByRole("button", { name: "bring one in" }));
    const dialog = within(screen.getByRole("dialog", { name: "Bring in a scenario" }));
    const text = dialog.getByRole("textbox", { name: "Scenario as JSON" });
    const take = async (pasted: string): Promise<void> => {
      fireEvent.change(text, { target: { value: pasted } });
      await user.click(dialog.getByRole("button", { name: "Take it" }));
    };
    await take("{");
    expect(text).toHaveAccessibleDescription(/^This is no JSON:/);
    const wrong = { ...creepFeed, body: { ...creepFeed.body, inertia: -1 }, colour: "red" };
    await take(JSON.stringify(wrong));
    expect(dialog.getByRole("alert")).toHaveTextContent(/^Not taken: two faults\./);
    expect(dialog.getByText("body.inertia")).toBeInTheDocument();
    expect(dialog.getByText("colour")).toBeInTheDocument();
    expect(text).toHaveValue(JSON.stringify(wrong));
    await take(JSON.stringify(variant({ title: "Taken", body: { ...creepFeed.body, viscous: 777 } })));
    expect(screen.getByRole("button", { name: "Damping: 777 N·s/m" })).toBeInTheDocument();
    await user.click(screen.getAllByRole("button", { name: "Undo" })[0]);
    expect(screen.getByRole("button", { name: "Damping: 350 N·s/m" })).toBeInTheDocument();
  });

  it("copies the scenario in force as JSON that can be brought in again", async () => {
    fakeServer(seen());
    const { user } = openPage(at);
    await user.click(await screen.findByRole("button", { name: "copy" }));
    expect(readScenario(await navigator.clipboard.readText()).scenario).toEqual(creepFeed);
  });

  it("says which part is not computed, and keeps the scenario", async () => {
    const law = { model: "stribeck", static: 0.2, kinetic: 0.1, velocity: 0.01, exponent: 2, fluid: 0 } as const;
    fakeServer(seen(variant({ title: beyondTitle, contact: { ...creepFeed.contact, law } })));
    openPage(at);
    const part = await screen.findByText(/^Friction by the Stribeck law is valid, but not computed by this version/);
    expect(part.closest("[role=group]")).toHaveAccessibleName("Contact");
    expect(await answer()).toHaveTextContent("There is no answer to this yet.");
  });
});

describe("the time cursor", () => {
  it("goes from event to event, and the table says where it is", async () => {
    fakeServer(seen());
    openPage(at);
    const cursor = await screen.findByRole("slider", { name: "Time cursor" });
    fireEvent.keyDown(cursor, { key: "Home" });
    expect(cursor).toHaveAttribute("aria-valuetext", "0\u00a0s, stuck");
    expect((await screen.findByText("cursor is here")).closest("tr")).toHaveTextContent(/^starts/);
    fireEvent.keyDown(cursor, { key: "ArrowRight" });
    expect(cursor).toHaveAttribute("aria-valuetext", "36.977\u00a0ms, slipping forward");
    expect(screen.getByText("cursor is here").closest("tr")).toHaveTextContent(/^breaks away/);
    fireEvent.keyDown(document.body, { key: "ArrowLeft" });
    expect(screen.getByText("cursor is here").closest("tr")).toHaveTextContent(/^starts/);
  });
});
