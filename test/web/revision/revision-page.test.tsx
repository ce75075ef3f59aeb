import { keptResultOf, type Integrity, type Replay, type Revision } from "@restband/api/contract";
import { digestOf, simulate, traceOf, type Result, type Scenario } from "@restband/solver";
import { screen, waitFor, within } from "@testing-library/react";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import type { SolverJob } from "../../../web/src/compute/solver-job.ts";
import { fakeServer, ines, members, ok, project, session, type Answers } from "../support/fake-server.ts";
import { openPage } from "../support/open-page.tsx";
import { creepFeed } from "../support/scenarios.ts";

// A whole page with the solver in one thread: seconds on a busy machine.
vi.setConfig({ testTimeout: 60_000 });

// The solver itself, without a thread of its own; and no drawing library, which jsdom has no ground for.
vi.mock("../../../web/src/compute/start-worker.ts", () => ({
  startWorker: () => ({
    run: ({ scenario, options }: SolverJob) => Promise.resolve(simulate(scenario, options)),
    terminate: () => undefined,
    onCrash: () => undefined,
  }),
}));
vi.mock("../../../web/src/components/plot.tsx", () => ({
  Plot: ({ label }: { label: string }) => <div role="img" aria-label={label} />,
}));

const id = "00000000-0000-4000-8000-000000000300";
const scenarioId = "00000000-0000-4000-8000-000000000100";
const at = `/projects/${project.id}/revisions/${id}`;
const tomas = { accountId: members[1].accountId, name: "Tomas Wik" };

function frozen(content: Scenario = creepFeed, more: Partial<Revision> = {}): Revision {
  const result = simulate(content, {}) as Result;
  return {
    ...{ id, projectId: project.id, scenarioId, number: 4, title: content.title, digest: digestOf(content) },
    ...{ frozenAt: "2026-11-11T16:40:00.000Z", frozenBy: tomas, state: "open", decided: null },
    ...{ outcome: result.outcome, limits: { kept: 0, of: 1 }, solverVersion: result.solverVersion },
    ...{ isRecomputed: true, asked: [], openComments: 0, content, text: "", scenarioVersion: 3 },
    ...{ units: "millimetre" as const, result: keptResultOf(result), isSensitive: false },
    ...{ trace: traceOf(result.samples!), withoutOrigin: ["body.viscous"], authors: [tomas], faults: [] },
    ...more,
  };
}

const whole: Integrity = {
  isWhole: true,
  checkedAt: "2026-12-01T14:00:00.000Z",
  rows: 12,
  faults: [],
  fingerprint: "ab".repeat(32),
  isGuarded: true,
};

const seen = (revision: Revision, more: Answers = {}): Answers => ({
  "GET /session": ok(session(ines)),
  [`GET /projects/${project.id}`]: ok(project),
  [`GET /projects/${project.id}/members`]: ok(members),
  [`GET /projects/${project.id}/integrity`]: ok(whole),
  [`GET ${at}`]: ok(revision),
  [`GET ${at}/replays`]: ok([]),
  [`GET ${at}/comments`]: ok([]),
  ...more,
});

const section = (name: string) => screen.findByRole("region", { name });

beforeEach(() => localStorage.clear());
afterEach(() => vi.unstubAllGlobals());

describe("the page of a revision", () => {
  it("tells what was claimed and asked, who froze it and how it stands, and offers nothing to edit of it", async () => {
    fakeServer(seen(frozen()));
    openPage(at);
    expect(await screen.findByRole("heading", { level: 1 })).toHaveTextContent(/sticks and slips/u);
    const claim = await section("Claim");
    expect(claim).toHaveTextContent("Tomas Wik");
    expect(claim).toHaveTextContent("not reviewed");
    expect(claim).toHaveTextContent("recomputed by the server, which agrees");
    expect(await within(claim).findByText(/the trail is whole/u)).toBeInTheDocument();
    const statement = await section("Statement");
    expect(statement).toHaveTextContent("120 kg");
    expect(statement).toHaveTextContent("One value without an origin: Damping");
    expect(statement).not.toHaveTextContent("Add a limit");
    expect(within(statement).queryByRole("button")).toBeNull();
  });

  it("says in words what does not fit of a row that was changed, and that it is not to be relied on", async () => {
    fakeServer(seen(frozen(creepFeed, { faults: ["The text is not the one the digest is of."] })));
    openPage(at);
    const warning = await screen.findByRole("alert");
    expect(warning).toHaveTextContent("not as it was frozen");
    expect(warning).toHaveTextContent("The text is not the one the digest is of.");
    expect(await section("Claim")).toHaveTextContent("broken: see above");
  });

  it("replays it by two methods and has each kept", async () => {
    const kept: Replay[] = [];
    const keep = ({ body }: { body: unknown }) => {
      const draft = body as Omit<Replay, "id" | "revisionId" | "by" | "at">;
      const by = { accountId: ines.id, name: ines.name };
      kept.unshift({ ...draft, id: `r${kept.length}`, revisionId: id, by, at: "2026-12-01T09:12:00.000Z" });
      return { status: 201, body: kept[0] };
    };
    fakeServer(seen(frozen(), { [`GET ${at}/replays`]: () => ok(kept), [`POST ${at}/replays`]: keep }));
    const { user } = openPage(at);
    const part = await section("Replay");
    expect(await within(part).findByText("Nobody has replayed this revision yet.")).toBeInTheDocument();
    await user.click(within(part).getByRole("button", { name: "Replay it here" }));
    await waitFor(() => expect(kept).toHaveLength(2), { timeout: 20_000 });
    const rows = within(await within(part).findByRole("list", { name: "Replays" }));
    await waitFor(() => expect(rows.getAllByRole("listitem")).toHaveLength(2));
    const [other, same] = rows.getAllByRole("listitem");
    expect(same).toHaveTextContent("Same method, exact");
    expect(same).toHaveTextContent("none, to the last bit");
    expect(other).toHaveTextContent("Other method, adaptive");
    expect(other).toHaveTextContent("agrees");
    await user.click(within(other).getByRole("button", { name: "all figures" }));
    expect(within(other).getByRole("row", { name: /peak velocity/u })).toBeInTheDocument();
  });

  it("says that another version of the solver froze it", async () => {
    const revision = frozen();
    const result = { ...revision.result, solverVersion: "0.0.9" };
    fakeServer(seen({ ...revision, result, solverVersion: "0.0.9" }));
    openPage(at);
    expect(await section("Replay")).toHaveTextContent("Frozen by solver 0.0.9");
  });

  it("says what it means that a replay is sensitive, and which solver ran it", async () => {
    const by = { accountId: ines.id, name: ines.name };
    const figures = {
      verdict: "sensitive",
      allowed: 1e-9,
      differences: ["The events are not the same."],
      deviations: [],
    };
    const run = { way: "other-method", solverVersion: "0.0.9", convergence: [] };
    const kept = { ...run, ...figures, id: "r0", revisionId: id, by, at: "2026-12-01T09:12:00.000Z" };
    fakeServer(seen(frozen(), { [`GET ${at}/replays`]: () => ok([kept]) }));
    openPage(at);
    const row = await within(await section("Replay")).findByRole("listitem");
    expect(row).toHaveTextContent("Other method, adaptive, solver 0.0.9");
    expect(row).toHaveTextContent(/Not reproducible to this precision: inputs moved by 10/u);
  });

  it("offers no Python file where there is none, and says why", async () => {
    fakeServer(seen(frozen({ ...creepFeed, span: { ...creepFeed.span, maxEvents: 1 } })));
    openPage(at);
    const part = await section("Replay");
    expect(part).toHaveTextContent(/not for this revision\. The run was cut off/u);
    expect(within(part).queryByRole("button", { name: "Save the Python file" })).toBeNull();
  });

  it("is told in the units it was frozen in, and in one's own where asked", async () => {
    fakeServer(seen(frozen(creepFeed, { units: "inch" })));
    const { user } = openPage(at);
    expect(await section("Statement")).toHaveTextContent("264.6 lb");
    await user.click(screen.getByRole("button", { name: /^Show it in mm–N–kg/u }));
    expect(await section("Statement")).toHaveTextContent("120 kg");
  });
});
