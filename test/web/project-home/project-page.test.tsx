import type { ScenarioSummary, StoredScenario } from "@restband/api/contract";
import { screen, waitFor } from "@testing-library/react";
import { afterEach, describe, expect, it, vi } from "vitest";
import { newScenario } from "../../../web/src/features/project-home/new-scenario.ts";
import { fakeServer, ines, members, ok, project, refuse, session, type Answers } from "../support/fake-server.ts";
import { openPage } from "../support/open-page.tsx";

vi.setConfig({ testTimeout: 20_000 });
afterEach(() => vi.unstubAllGlobals());

const at = `/projects/${project.id}`;

/** The project as a person of some role sees it. */
function seenBy(role: string, scenarios: ScenarioSummary[] = []): Answers {
  return {
    "GET /session": ok(session(ines)),
    "GET /projects": ok([{ ...project, role }]),
    [`GET ${at}`]: ok({ ...project, role }),
    [`GET ${at}/members`]: ok(members),
    [`GET ${at}/scenarios`]: ok(scenarios),
    [`GET ${at}/activity?`]: ok([]),
  };
}

const stored = (title: string): StoredScenario => ({
  id: "00000000-0000-4000-8000-000000000100",
  projectId: project.id,
  version: 1,
  content: { ...newScenario([]), title },
  digest: "0".repeat(64),
  switchedOff: [],
  archivedAt: null,
  createdAt: project.createdAt,
  updatedAt: project.updatedAt,
  updatedBy: { accountId: ines.id, name: ines.name },
});

const summary = (title: string, change: Partial<ScenarioSummary> = {}): ScenarioSummary => {
  const { id, version, digest, updatedAt, updatedBy } = stored(title);
  return { id, version, title, purpose: "feed", digest, updatedAt, updatedBy, archivedAt: null, ...change };
};

describe("the projects of a person", () => {
  it("are counted in the headline, each with role and number of scenarios", async () => {
    fakeServer(seenBy("reviewer"));
    openPage("/projects");
    expect(await screen.findByRole("heading", { level: 1, name: "One project." })).toBeInTheDocument();
    const link = screen.getByRole("link", { name: "Hall 3 refit" });
    expect(link).toHaveAttribute("href", at);
    expect(link.closest("li")).toHaveTextContent(/no scenarios.*you are reviewer/u);
  });

  it("begin with a name; without one nothing is sent", async () => {
    const requests = fakeServer({
      ...seenBy("owner"),
      "GET /projects": ok([]),
      "POST /projects": { status: 201, body: project },
    });
    const { user, address } = openPage("/projects");
    await user.click(await screen.findByRole("button", { name: "Begin a project" }));
    await user.click(await screen.findByRole("button", { name: "Begin the project" }));
    expect(await screen.findByLabelText("Name")).toHaveAccessibleDescription(
      "Give the project a name of up to 120 characters.",
    );
    expect(requests.some(({ method }) => method === "POST")).toBe(false);
    await user.type(screen.getByLabelText("Name"), "  Hall 3 refit ");
    await user.click(screen.getByRole("button", { name: "Begin the project" }));
    await waitFor(() => expect(address()).toBe(at));
    expect(requests.find(({ method }) => method === "POST")?.body).toEqual({ name: "Hall 3 refit", description: "" });
  });
});

describe("a project", () => {
  it("shows its scenarios with who touched them", async () => {
    fakeServer(seenBy("owner", [summary("Z carriage, creep feed")]));
    openPage(at);
    const link = await screen.findByRole("link", { name: "Z carriage, creep feed" });
    expect(link).toHaveAttribute("href", `${at}/scenarios/${stored("").id}`);
    expect(link.closest("li")).toHaveTextContent(/draft · you, /u);
    expect(document.title).toBe("Hall 3 refit · Restband");
  });

  it("leads to what a scenario can begin from", async () => {
    fakeServer(seenBy("editor"));
    const { user, address } = openPage(at);
    await user.click((await screen.findAllByRole("button", { name: "New scenario" }))[0]);
    await waitFor(() => expect(address()).toBe(`${at}/scenarios/new`));
    expect(await screen.findByRole("heading", { level: 1, name: "Begin with a case like yours." })).toBeInTheDocument();
  });

  it.each(["reviewer", "reader"])("offers a %s nothing that the server would refuse", async (role) => {
    fakeServer(seenBy(role));
    openPage(at);
    await screen.findByText("Nobody has begun a scenario in this project so far.");
    for (const name of ["New scenario", "Add someone", "Remove Tomas Wik", "Change name and description"]) {
      expect(screen.queryByRole("button", { name })).not.toBeInTheDocument();
    }
    expect(screen.queryByRole("combobox")).not.toBeInTheDocument();
  });

  it("says the same of what is not there and of what one may not know of", async () => {
    fakeServer({ "GET /session": ok(session(ines)) });
    openPage(at);
    expect(await screen.findByRole("heading", { name: "There is nothing at this address" })).toBeInTheDocument();
  });
});

describe("the people of a project", () => {
  it("get another role by a select, and the page says it is done", async () => {
    const change = `PATCH ${at}/members/${members[1].accountId}`;
    const requests = fakeServer({ ...seenBy("owner"), [change]: ok({ ...members[1], role: "reader" }) });
    const { user } = openPage(at);
    await user.selectOptions(await screen.findByRole("combobox", { name: "Role of Tomas Wik" }), "reader");
    expect(await screen.findByText("Tomas Wik is reader now.")).toBeInTheDocument();
    expect(requests.find(({ method }) => method === "PATCH")?.body).toEqual({ role: "reader" });
  });

  it("keep the last owner, in the server's words", async () => {
    const message = "A project keeps at least one owner.";
    fakeServer({ ...seenBy("owner"), [`PATCH ${at}/members/${ines.id}`]: refuse(409, "last-owner", message) });
    const { user } = openPage(at);
    const select = await screen.findByRole("combobox", { name: "Role of Ines Duarte" });
    await user.selectOptions(select, "reader");
    expect(await screen.findByRole("alert")).toHaveTextContent(message);
    expect(select).toHaveValue("owner");
  });

  it("come in by their address; one without an account is told at the field, as typed", async () => {
    const message = "No account has this address.";
    const requests = fakeServer({
      ...seenBy("owner"),
      [`POST ${at}/members`]: refuse(422, "unknown-account", "1 field to put right.", [{ path: "email", message }]),
    });
    const { user } = openPage(at);
    await user.click(await screen.findByRole("button", { name: "Add someone" }));
    await user.type(await screen.findByLabelText("E-mail"), "j.falk@okarin.example");
    await user.click(screen.getByRole("radio", { name: /^reviewer/u }));
    await user.click(screen.getByRole("button", { name: "Add" }));
    await waitFor(() =>
      expect(screen.getByLabelText("E-mail")).toHaveAccessibleDescription(expect.stringContaining(message)),
    );
    expect(screen.getByLabelText("E-mail")).toHaveValue("j.falk@okarin.example");
    const sent = requests.find(({ method }) => method === "POST")?.body;
    expect(sent).toEqual({ email: "j.falk@okarin.example", role: "reviewer" });
  });

  it("are removed only after asking once more", async () => {
    const remove = `DELETE ${at}/members/${members[1].accountId}`;
    const requests = fakeServer({ ...seenBy("owner"), [remove]: { status: 204 } });
    const { user } = openPage(at);
    await user.click(await screen.findByRole("button", { name: "Remove Tomas Wik" }));
    expect(requests.some(({ method }) => method === "DELETE")).toBe(false);
    await user.click(screen.getByRole("button", { name: "Remove" }));
    expect(await screen.findByText("Tomas Wik is no longer in the project.")).toBeInTheDocument();
  });

  it("can leave, and are then at their other projects", async () => {
    const leave = `DELETE ${at}/members/${ines.id}`;
    fakeServer({ ...seenBy("reader"), [leave]: { status: 204 } });
    const { user, address } = openPage(at);
    await user.click(await screen.findByRole("button", { name: "Leave this project" }));
    await user.click(screen.getByRole("button", { name: "Leave" }));
    await waitFor(() => expect(address()).toBe("/projects"));
  });
});
