import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { MemoryRouter } from "react-router-dom";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { PageHeader } from "../../../web/src/components/page-header.tsx";
import { allowDialogs } from "../support/missing-in-jsdom.ts";

const person = { name: "Ines Duarte", waiting: 0, items: <button type="button">Sign out</button> };

function show(width: "desk" | "phone") {
  vi.stubGlobal("matchMedia", (query: string) => ({
    matches: query.includes("max-width") && width === "phone",
    addEventListener: () => undefined,
    removeEventListener: () => undefined,
  }));
  render(
    <MemoryRouter>
      <PageHeader
        home="/projects"
        trail={[{ label: "All projects", to: "/projects" }]}
        title="Hall 3 refit"
        state="saved 14:02"
        actions={<button type="button">New scenario</button>}
        person={person}
      />
    </MemoryRouter>,
  );
  return userEvent.setup();
}

beforeEach(allowDialogs);
afterEach(() => vi.unstubAllGlobals());

describe("the page header", () => {
  it("says where one is, with a way up", () => {
    show("desk");
    const where = screen.getByRole("navigation", { name: "Where you are" });
    expect(within(where).getByRole("link", { name: "All projects" })).toHaveAttribute("href", "/projects");
    expect(within(where).getByText("Hall 3 refit")).toHaveAttribute("aria-current", "page");
  });

  it("reads the state of saving out", () => {
    show("desk");
    expect(screen.getByText("saved 14:02")).toHaveAttribute("role", "status");
  });

  it("opens the person's own menu and closes it by Escape, with the focus back at its button", async () => {
    const user = show("desk");
    const button = screen.getByRole("button", { name: "Ines Duarte, your account" });
    expect(button).toHaveTextContent("ID");
    await user.click(button);
    expect(screen.getByRole("button", { name: "Sign out" })).toBeInTheDocument();
    await user.tab();
    await user.keyboard("{Escape}");
    expect(screen.queryByRole("button", { name: "Sign out" })).not.toBeInTheDocument();
    expect(button).toHaveFocus();
  });

  it("gathers actions, tools and the person's menu in one menu on the phone", async () => {
    const user = show("phone");
    expect(screen.queryByRole("button", { name: "New scenario" })).not.toBeInTheDocument();
    await user.click(screen.getByRole("button", { name: "Actions" }));
    for (const name of ["New scenario", "Keyboard shortcuts", "Sign out"]) {
      expect(screen.getByRole("button", { name })).toBeInTheDocument();
    }
  });

  it("lists the keys on ?, unless somebody is writing", async () => {
    const user = show("desk");
    render(<input aria-label="Title" />);
    await user.type(screen.getByLabelText("Title"), "?");
    expect(screen.queryByRole("dialog")).not.toBeInTheDocument();
    screen.getByLabelText("Title").blur();
    await user.keyboard("?");
    expect(within(screen.getByRole("dialog", { name: "Keyboard" })).getByText("Show this list")).toBeInTheDocument();
  });
});
