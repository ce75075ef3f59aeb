import type { ScenarioSummary, StoredScenario } from "@restband/api/contract";
import { digestOf, simulate, type Scenario } from "@restband/solver";
import { screen, within } from "@testing-library/react";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import type { SolverJob } from "../../../web/src/compute/solver-job.ts";
import { compareReference } from "../../../web/src/paths.ts";
import { fakeServer, ines, ok, project, session, type Answers } from "../support/fake-server.ts";
import { openPage } from "../support/open-page.tsx";
import { creepFeed, variant } from "../support/scenarios.ts";

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

const ids = ["00000000-0000-4000-8000-000000000100", "00000000-0000-4000-8000-000000000200"] as const;
const damped = variant({ title: "Z carriage, damped", body: { ...creepFeed.body, viscous: 4200 } });
const by = { accountId: ines.id, name: ines.name };
const times = { createdAt: project.createdAt, updatedAt: project.updatedAt };

const stored = (id: string, content: Scenario): StoredScenario => ({
  ...{ id, projectId: project.id, version: 1, content, digest: digestOf(content), switchedOff: [], archivedAt: null },
  ...{ ...times, updatedBy: by },
});
const summary = ({
  id,
  version,
  digest,
  content,
  updatedAt,
  updatedBy,
  archivedAt,
}: StoredScenario): ScenarioSummary => ({
  ...{ id, version, digest, updatedAt, updatedBy, archivedAt, title: content.title, purpose: content.purpose },
});

const both = [stored(ids[0], creepFeed), stored(ids[1], damped)];
const seen: Answers = {
  "GET /session": ok(session(ines)),
  [`GET /projects/${project.id}`]: ok(project),
  [`GET /projects/${project.id}/scenarios`]: ok(both.map(summary)),
  [`GET /projects/${project.id}/revisions`]: ok([]),
  [`GET /projects/${project.id}/scenarios/${ids[0]}`]: ok(both[0]),
  [`GET /projects/${project.id}/scenarios/${ids[1]}`]: ok(both[1]),
};
const at = `/projects/${project.id}/compare`;
const refer = (id: string) => `scenario%3A${id}`;

beforeEach(() => localStorage.clear());
afterEach(() => vi.unstubAllGlobals());

describe("the page of a comparison", () => {
  it("tells by its address alone what changed, what came of it, and shows both motions", async () => {
    fakeServer(seen);
    openPage(`${at}?a=${refer(ids[0])}&b=${refer(ids[1])}`);
    expect(await screen.findByText(/One limit is now kept\./u)).toBeInTheDocument();
    const asked = within(screen.getByRole("table", { name: "What was asked" }));
    expect(asked.getByRole("row", { name: /^Damping 350\sN·s\/m 4200\sN·s\/m 12 times$/u })).toBeInTheDocument();
    const out = within(screen.getByRole("table", { name: "What came out" }));
    expect(out.getByRole("row", { name: /^Outcome sticks and slips slides smoothly/u })).toBeInTheDocument();
    expect(out.getByRole("row", { name: /^Share of time stuck .* now kept$/u })).toBeInTheDocument();
    const evidence = within(await screen.findByRole("region", { name: "Evidence" }));
    expect(await evidence.findByRole("slider", { name: "Time cursor" })).toBeInTheDocument();
    expect((await evidence.findAllByText("Z carriage, creep feed")).length).toBeGreaterThan(0);
  });

  it("asks for the second where the address names only one, and keeps the choice in the address", async () => {
    fakeServer(seen);
    const { user, address } = openPage(`${at}?a=${refer(ids[0])}`);
    await user.selectOptions(await screen.findByLabelText("The second of the two"), "Z carriage, damped");
    expect(await screen.findByText(/One limit is now kept\./u)).toBeInTheDocument();
    expect(address()).toContain(`b=${refer(ids[1])}`);
    await user.click(screen.getByRole("button", { name: "Swap" }));
    expect(await screen.findByText(/One limit is now broken\./u)).toBeInTheDocument();
  });

  it("takes a scenario that is stored nowhere from the address, checked", async () => {
    fakeServer(seen);
    const given = new URLSearchParams({ a: `scenario:${ids[0]}`, b: compareReference.given(damped) });
    openPage(`${at}?${given}`);
    expect(await screen.findByText(/One limit is now kept\./u)).toBeInTheDocument();
    expect(screen.getByText("Given values")).toBeInTheDocument();
  });

  it("says what is wrong with a scenario in the address", async () => {
    fakeServer(seen);
    const given = new URLSearchParams({ a: `scenario:${ids[0]}`, b: 'given:{"format":"restband-scenario/1"}' });
    openPage(`${at}?${given}`);
    expect(await screen.findByText(/^The address gives no whole scenario\. \S/u)).toBeInTheDocument();
  });

  it("says so where the address names nothing, or what is not there", async () => {
    fakeServer(seen);
    openPage(`${at}?a=nothing&b=${refer("00000000-0000-4000-8000-000000000999")}`);
    expect(await screen.findByText("The address names nothing that can be compared.")).toBeInTheDocument();
    expect(await screen.findByText("There is nothing at this address.")).toBeInTheDocument();
  });
});
