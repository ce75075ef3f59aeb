import type { StoredScenario } from "@restband/api/contract";
import { simulate, type Scenario } from "@restband/solver";
import { act, cleanup, fireEvent, screen, waitFor, within } from "@testing-library/react";
import { afterEach, beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { editing } from "../../../web/src/features/statement/draft/editing-part.ts";
import { noteConnection } from "../../../web/src/api/connection.ts";
import type { SolverJob } from "../../../web/src/compute/solver-job.ts";
import { readScenario } from "../../../web/src/features/statement/exchange/read-scenario.ts";
import {
  fakeServer,
  ines,
  members,
  ok,
  project,
  refuse,
  session,
  type Answers,
  type Request,
} from "../support/fake-server.ts";
import { openPage } from "../support/open-page.tsx";
import { creepFeed, variant } from "../support/scenarios.ts";

// A whole page with the solver in one thread: seconds on a busy machine.
vi.setConfig({ testTimeout: 30_000 });

const beyond = { path: "contact.law.model", message: "not computed by this version" };
const beyondTitle = "Beyond this version";

// The solver itself, without a thread of its own; and no drawing library, which jsdom has no ground for.
vi.mock("../../../web/src/compute/start-worker.ts", () => ({
  startWorker: () => ({
    run: ({ scenario, options }: SolverJob) =>
      Promise.resolve(
        scenario.title === beyondTitle ? { error: { ...beyond, faults: [beyond] } } : simulate(scenario, options),
      ),
    terminate: () => undefined,
    onCrash: () => undefined,
  }),
}));
vi.mock("../../../web/src/components/plot.tsx", () => ({
  Plot: ({ label }: { label: string }) => <div role="img" aria-label={label} />,
}));

const id = "00000000-0000-4000-8000-000000000100";
const at = `/projects/${project.id}/scenarios/${id}`;

const stored = (content: Scenario = creepFeed, version = 3): StoredScenario => ({
  id,
  projectId: project.id,
  version,
  content,
  digest: "0".repeat(64),
  switchedOff: [],
  archivedAt: null,
  createdAt: project.createdAt,
  updatedAt: "2026-12-01T14:02:00.000Z",
  updatedBy: { accountId: members[1].accountId, name: "Tomas Wik" },
});

/** The server after a save: what came in, one version on. */
const saved = ({ body, headers }: Request) =>
  ok(stored((body as { content: Scenario }).content, Number(headers["If-Match"].replaceAll('"', "")) + 1));

const seen = (content: Scenario = creepFeed, role = "editor", more: Answers = {}): Answers => ({
  "GET /session": ok(session(ines)),
  [`GET /projects/${project.id}`]: ok({ ...project, role }),
  [`GET ${at}`]: ok(stored(content)),
  [`PUT ${at}`]: saved,
  ...more,
});

const saves = (requests: Request[]): Request[] => requests.filter(({ method }) => method === "PUT");
const answer = (): Promise<HTMLElement> => screen.findByRole("heading", { level: 1 });

async function changeDamping(user: ReturnType<typeof openPage>["user"], text: string): Promise<void> {
  await user.click(await screen.findByRole("button", { name: /^Damping/ }));
  await user.keyboard(`${text}{Enter}`);
}

// A person comes after it is loaded.
beforeAll(() => editing.ask());
beforeEach(() => localStorage.clear());
afterEach(() => vi.unstubAllGlobals());

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

  it("takes a change back by Ctrl-Z, also while the field has the focus", async () => {
    fakeServer(seen());
    const { user } = openPage(at);
    await user.click(await screen.findByRole("button", { name: /^Damping/ }));
    await user.keyboard("8000");
    await user.keyboard("{Control>}z{/Control}");
    await waitFor(() => expect(screen.getByRole("textbox", { name: "Damping" })).toHaveValue("350"));
    expect(screen.getByRole("button", { name: "Redo" })).toBeEnabled();
    await user.keyboard("{Control>}{Shift>}Z{/Shift}{/Control}");
    expect(await screen.findByRole("button", { name: "Damping: 8000 N·s/m" })).toBeInTheDocument();
  });

  it("takes a change back by Ctrl-Z on a narrow page too, whose buttons stand in a closed menu", async () => {
    const isNarrow = { matches: true, addEventListener: () => undefined, removeEventListener: () => undefined };
    vi.stubGlobal("matchMedia", () => isNarrow);
    fakeServer(seen());
    const { user } = openPage(at);
    await changeDamping(user, "400");
    expect(screen.queryByTitle("Undo")).not.toBeInTheDocument();
    await user.keyboard("{Control>}z{/Control}");
    expect(await screen.findByRole("button", { name: "Damping: 350 N·s/m" })).toBeInTheDocument();
  });

  it("does not undo an undo that is made while a save is under way", async () => {
    let answerSave = (): void => undefined;
    const put = (request: Request) =>
      new Promise<ReturnType<typeof saved>>((resolve) => {
        answerSave = () => resolve(saved(request));
      });
    const requests = fakeServer(seen(creepFeed, "editor", { [`PUT ${at}`]: put }));
    const { user } = openPage(at);
    await changeDamping(user, "400");
    await waitFor(() => expect(saves(requests)).toHaveLength(1));
    await user.click(screen.getByTitle("Undo")); // the header's: a message about what was brought in has one of its own
    answerSave();
    await waitFor(() => expect(saves(requests)).toHaveLength(2));
    expect(saves(requests)[1].body).toMatchObject({ content: { body: { viscous: 350 } } });
    expect(saves(requests)[1].headers["If-Match"]).toBe('"4"');
    expect(screen.getByRole("button", { name: "Damping: 350 N·s/m" })).toBeInTheDocument();
  });

  it("sends what is waiting when the page is left at once", async () => {
    const requests = fakeServer(seen());
    const { user } = openPage(at);
    await changeDamping(user, "400");
    cleanup();
    await waitFor(() => expect(saves(requests)).toHaveLength(1));
    expect(saves(requests)[0].body).toMatchObject({ content: { body: { viscous: 400 } } });
  });

  it("takes a newer version of somebody else's over while nothing of its own is open", async () => {
    let content = creepFeed;
    let version = 3;
    fakeServer(seen(creepFeed, "editor", { [`GET ${at}`]: () => ok(stored(content, version)) }));
    openPage(at);
    await answer();
    content = variant({ body: { ...creepFeed.body, viscous: 8000 } });
    version = 4;
    // A connection lost and found has everything on the page read again.
    act(() => noteConnection(false));
    act(() => noteConnection(true));
    expect(await screen.findByRole("button", { name: "Damping: 8000 N·s/m" })).toBeInTheDocument();
  });

  it("never sends what is refused, and says how many fields are open", async () => {
    const requests = fakeServer(seen());
    const { user } = openPage(at);
    await changeDamping(user, "-5");
    expect(await screen.findByText("saved, 1 field to put right")).toBeInTheDocument();
    expect(await answer()).toHaveTextContent("26 times a second");
    await act(() => new Promise((resolve) => setTimeout(resolve, 1000)));
    expect(saves(requests)).toEqual([]);
  });

  it("keeps what was typed in this browser until the server has it", async () => {
    fakeServer(seen(creepFeed, "editor", { [`PUT ${at}`]: refuse(503, "database-gone", "The database is gone.") }));
    const first = openPage(at);
    await changeDamping(first.user, "400");
    await first.user.click(screen.getByRole("button", { name: /^Mass/ }));
    await first.user.keyboard("heavy");
    await screen.findByText(/^not saved since \d\d:\d\d, trying again/);
    cleanup();

    const requests = fakeServer(seen());
    openPage(at);
    expect(await screen.findByRole("button", { name: "Damping: 400 N·s/m" })).toBeInTheDocument();
    expect(screen.getByRole("button", { name: "Mass: heavy" })).toBeInTheDocument();
    await waitFor(() => expect(saves(requests)).toHaveLength(1));
    expect(saves(requests)[0].body).toMatchObject({ content: { body: { viscous: 400, inertia: 120 } } });
  });

  it("shows both versions where somebody else saved meanwhile, and saves what is chosen", async () => {
    const theirs = variant({ title: "Z carriage, oiled", body: { ...creepFeed.body, viscous: 777 } });
    let isFirst = true;
    const put = (request: Request) => {
      const reply = isFirst
        ? {
            status: 409,
            body: { error: { code: "conflict", message: "Changed.", fields: [], current: stored(theirs, 4) } },
          }
        : saved(request);
      isFirst = false;
      return reply;
    };
    const requests = fakeServer(seen(creepFeed, "editor", { [`PUT ${at}`]: put }));
    const { user } = openPage(at);
    await changeDamping(user, "400");
    const dialog = within(await screen.findByRole("dialog", { name: "Two versions of this scenario" }));
    expect(dialog.getByText(/^Tomas Wik saved version 4/)).toBeInTheDocument();
    const damping = within(dialog.getByRole("group", { name: "Damping" }));
    expect(damping.getByRole("radio", { name: /^yours 400/ })).toBeChecked();
    expect(
      within(dialog.getByRole("group", { name: "Title" })).getByRole("radio", { name: /^Tomas Wik/ }),
    ).toBeChecked();
    await user.click(damping.getByRole("radio", { name: /^Tomas Wik 777/ }));
    await user.click(damping.getByRole("radio", { name: /^yours/ }));
    await user.click(dialog.getByRole("button", { name: "Save this" }));
    await waitFor(() => expect(saves(requests)).toHaveLength(2));
    expect(saves(requests)[1].headers["If-Match"]).toBe('"4"');
    expect(saves(requests)[1].body).toMatchObject({ content: { title: "Z carriage, oiled", body: { viscous: 400 } } });
    expect(screen.queryByRole("dialog")).not.toBeInTheDocument();
  });

  it("says that it is archived, lets all be tried, and takes changes again once it is restored", async () => {
    let archivedAt: string | null = "2026-12-01T15:00:00.000Z";
    const requests = fakeServer({
      ...seen(),
      [`GET ${at}`]: () => ok({ ...stored(), archivedAt }),
      [`POST ${at}/restore`]: () => {
        archivedAt = null;
        return { status: 204 };
      },
    });
    const { user } = openPage(at);
    await answer();
    expect(screen.getByText("the scenario is archived")).toBeInTheDocument();
    await changeDamping(user, "8000");
    await screen.findByText("not saved: the scenario is archived");
    await user.click(screen.getByRole("button", { name: "Restore" }));
    await screen.findByText("saved");
    await changeDamping(user, "8000");
    await waitFor(() => expect(saves(requests)).toHaveLength(1));
  });

  it("lets a reader try everything and sends nothing", async () => {
    const requests = fakeServer(seen(creepFeed, "reader"));
    const { user } = openPage(at);
    expect(await screen.findByText("you read this as a reader")).toBeInTheDocument();
    await changeDamping(user, "8000");
    expect(await screen.findByText("not saved: you are a reader")).toBeInTheDocument();
    await waitFor(async () => expect(await answer()).toHaveTextContent("slides smoothly"));
    await act(() => new Promise((resolve) => setTimeout(resolve, 1000)));
    expect(saves(requests)).toEqual([]);
    expect(localStorage).toHaveLength(0);
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
