import type { ScenarioSummary, StoredScenario } from "@restband/api/contract";
import type { Scenario } from "@restband/solver";
import { screen, waitFor, within } from "@testing-library/react";
import { afterEach, describe, expect, it, vi } from "vitest";
import { newScenario } from "../../../web/src/features/project-home/new-scenario.ts";
import { startingPoints } from "../../../web/src/features/starting-points/index.ts";
import { fakeServer, ines, members, ok, project, session, type Answers } from "../support/fake-server.ts";
import { openPage } from "../support/open-page.tsx";

vi.setConfig({ testTimeout: 20_000 });
afterEach(() => vi.unstubAllGlobals());

const at = `/projects/${project.id}`;
const id = "00000000-0000-4000-8000-000000000100";
const stored: StoredScenario = {
  id,
  projectId: project.id,
  version: 1,
  content: newScenario([]),
  digest: "0".repeat(64),
  switchedOff: [],
  archivedAt: null,
  createdAt: project.createdAt,
  updatedAt: project.updatedAt,
  updatedBy: { accountId: ines.id, name: ines.name },
};

const seenBy = (role: string, titles: readonly string[] = []): Answers => ({
  "GET /session": ok(session(ines)),
  [`GET ${at}`]: ok({ ...project, role }),
  [`GET ${at}/members`]: ok(members),
  [`GET ${at}/scenarios`]: ok(titles.map((title) => ({ title }) as ScenarioSummary)),
  [`GET ${at}/activity?`]: ok([]),
  [`POST ${at}/scenarios`]: { status: 201, body: stored },
});

async function begun(name: RegExp, titles: readonly string[] = []): Promise<Scenario> {
  const requests = fakeServer(seenBy("editor", titles));
  const { user, address } = openPage(`${at}/scenarios/new`);
  const button = await screen.findByRole("button", { name });
  button.focus();
  await user.keyboard("{Enter}");
  await waitFor(() => expect(address()).toBe(`${at}/scenarios/${id}`));
  const { body } = requests.find(({ method }) => method === "POST") ?? {};
  return (body as { content: Scenario }).content;
}

describe("the page of starting points", () => {
  it("lists plain numbers first, then every case with what it is for and what its answer shows", async () => {
    fakeServer(seenBy("editor"));
    openPage(`${at}/scenarios/new`);
    const rows = within(await screen.findByRole("list", { name: "Starting points" })).getAllByRole("listitem");
    expect(rows).toHaveLength(startingPoints.length + 1);
    expect(rows[0]).toHaveTextContent("Plain numbers");
    for (const [i, { name, why, shows }] of startingPoints.entries()) {
      expect(rows[i + 1]).toHaveTextContent(name);
      expect(rows[i + 1]).toHaveTextContent(why);
      expect(rows[i + 1]).toHaveTextContent(shows);
    }
  });

  it("begins with a case by the keyboard, under a title that is free", async () => {
    const clamp = startingPoints.find(({ key }) => key === "forced-clamp");
    expect(await begun(/^Begin with: Forced clamp$/u, ["Forced clamp"])).toEqual({
      ...clamp?.scenario,
      title: "Forced clamp 2",
    });
  });

  it("begins with plain numbers", async () => {
    expect(await begun(/^Begin with: Plain numbers$/u)).toEqual(newScenario([]));
  });

  it("is not for those who may not edit", async () => {
    fakeServer(seenBy("reader"));
    const { address } = openPage(`${at}/scenarios/new`);
    await waitFor(() => expect(address()).toBe(at));
  });
});
