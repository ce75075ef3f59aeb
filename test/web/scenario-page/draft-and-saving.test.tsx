import "../support/page-alone.ts";
import { act, cleanup, screen, waitFor, within } from "@testing-library/react";
import { describe, expect, it, vi } from "vitest";
import { noteConnection } from "../../../web/src/api/connection.ts";
import { fakeServer, ok, refuse, type Request } from "../support/fake-server.ts";
import { openPage } from "../support/open-page.tsx";
import { creepFeed, variant } from "../support/scenarios.ts";
import { answer, at, changeDamping, saved, saves, seen, stored } from "../support/scenario-page.tsx";

describe("what is changed on the page of a scenario", () => {
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
});
