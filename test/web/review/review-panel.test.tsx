import type { Replay, Review, Revision } from "@restband/api/contract";
import { QueryClientProvider } from "@tanstack/react-query";
import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, describe, expect, it, vi } from "vitest";
import { forgetToken } from "../../../web/src/api/client.ts";
import { makeQueryClient } from "../../../web/src/api/query-client.ts";
import { ReviewPanel } from "../../../web/src/features/review/review-panel.tsx";
import { fakeServer, ines, members, ok, project, refuse, session, type Answers } from "../support/fake-server.ts";
import { allowDialogs } from "../support/missing-in-jsdom.ts";

afterEach(() => vi.unstubAllGlobals());

const [, tomas] = members;
const maker = { accountId: tomas.accountId, name: tomas.name };
const revision = {
  id: "00000000-0000-4000-8000-000000000020",
  projectId: project.id,
  number: 2,
  digest: "ab".repeat(32),
  frozenBy: maker,
  openComments: 1,
} as Revision;
const place = `/projects/${project.id}/revisions/${revision.id}`;

const open: Review = {
  requests: [
    { reviewer: { accountId: ines.id, name: ines.name }, by: maker, at: project.createdAt, message: "Mind the clamp." },
  ],
  decisions: [],
  checklist: { points: ["Every value says where it comes from."] },
  may: { ask: false, decide: true, selfCheck: false, withdraw: false },
  hindrance: null,
  candidates: [],
};

const replay = {
  id: "r",
  by: { accountId: ines.id, name: ines.name },
  at: project.createdAt,
  verdict: "agrees",
} as Replay;

function show(review: Review, answers: Answers = {}) {
  forgetToken();
  allowDialogs();
  const requests = fakeServer({ "GET /session": ok(session(ines)), [`GET ${place}/review`]: ok(review), ...answers });
  render(
    <QueryClientProvider client={makeQueryClient()}>
      <ReviewPanel project={project} revision={revision} ownId={ines.id} replays={[replay]} />
    </QueryClientProvider>,
  );
  const sent = () => requests.filter(({ method }) => method === "POST");
  return { user: userEvent.setup(), sent };
}

describe("a decision", () => {
  it("is not sent without reasons, password and every point of the checklist, each said at its place", async () => {
    const { user, sent } = show(open);
    await user.click(await screen.findByRole("button", { name: "Accept revision 2" }));
    expect(screen.getByLabelText("Reasons, kept with the revision")).toBeInvalid();
    expect(screen.getByLabelText("Your password, once more")).toBeInvalid();
    expect(screen.getByText("Answer each point.")).toBeVisible();
    await user.click(screen.getByRole("radio", { name: "no" }));
    expect(screen.getByText("With a no, a revision is returned.")).toBeVisible();
    expect(sent()).toEqual([]);
  });

  it("rests on one's last replay and carries the digest that was looked at", async () => {
    const { user, sent } = show(open, { [`POST ${place}/decision`]: ok(open) });
    await user.click(await screen.findByRole("radio", { name: "yes" }));
    await user.type(screen.getByLabelText("Reasons, kept with the revision"), "All as it should be.");
    await user.type(screen.getByLabelText("Your password, once more"), "four unrelated words");
    await user.click(screen.getByRole("button", { name: "Accept revision 2" }));
    await vi.waitFor(() => expect(sent()).toHaveLength(1));
    expect(sent()[0].body).toEqual({
      decision: "accept",
      reasons: "All as it should be.",
      password: "four unrelated words",
      digest: revision.digest,
      replayId: "r",
      checklist: [{ point: "Every value says where it comes from.", answer: "yes" }],
    });
  });

  it("that comes too late is told who was faster, and what was written stays in sight", async () => {
    const message = "Priya Raman returned this revision on 1 Dec 2026, 14:02 UTC.";
    const decided = { ...open, may: { ...open.may, decide: false }, hindrance: message };
    let isLate = false;
    const { user } = show(open, {
      [`GET ${place}/review`]: () => ok(isLate ? decided : open),
      [`POST ${place}/decision`]: () => {
        isLate = true;
        return refuse(409, "decided", message);
      },
    });
    await user.type(await screen.findByLabelText("Reasons, kept with the revision"), "It chatters.");
    await user.type(screen.getByLabelText("Your password, once more"), "four unrelated words");
    await user.click(screen.getByRole("button", { name: "Return to Tomas" }));
    const note = await screen.findByRole("alert");
    await vi.waitFor(() => expect(screen.queryByRole("button", { name: "Return to Tomas" })).toBeNull());
    expect(note).toHaveTextContent(`${message} That decision stands; yours was not kept.`);
    expect(note).toHaveTextContent("You had written: “It chatters.”");
  });
});

describe("one's own work", () => {
  it("is told as such, with nothing to decide; somebody can be asked", async () => {
    const hindrance = "This is your own work: you froze it. Somebody else decides.";
    const priya = { accountId: "00000000-0000-4000-8000-000000000003", name: "Priya Raman" };
    const may = { ask: true, decide: false, selfCheck: false, withdraw: true };
    const { user, sent } = show(
      { ...open, requests: [], may, hindrance, candidates: [priya] },
      { [`POST ${place}/requests`]: ok(open) },
    );
    expect(await screen.findByText(hindrance)).toBeVisible();
    expect(screen.queryByRole("button", { name: /Accept/ })).toBeNull();
    await user.click(screen.getByRole("button", { name: "Ask for a review" }));
    const dialog = screen.getByRole("dialog", { name: "Ask for a review" });
    await user.type(within(dialog).getByLabelText("What to look at"), "The clamp.");
    await user.click(within(dialog).getByRole("button", { name: "Ask for a review" }));
    await vi.waitFor(() => expect(sent()).toHaveLength(1));
    expect(sent()[0].body).toEqual({ reviewers: [priya.accountId], message: "The clamp." });
  });
});
