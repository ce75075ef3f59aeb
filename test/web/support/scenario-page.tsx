import type { StoredScenario } from "@restband/api/contract";
import { simulate, type Scenario } from "@restband/solver";
import { screen } from "@testing-library/react";
import type { SolverJob } from "../../../web/src/compute/solver-job.ts";
import { ines, members, ok, project, session, type Answers, type Request } from "./fake-server.ts";
import type { openPage } from "./open-page.tsx";
import { creepFeed } from "./scenarios.ts";

/** The page of one scenario before a server of a few answers; the solver itself, without a thread of its own. */

export const beyond = { path: "contact.law.model", message: "not computed by this version" };
export const beyondTitle = "Beyond this version";

export const workerInOneThread = () => ({
  startWorker: () => ({
    run: ({ scenario, options }: SolverJob) =>
      Promise.resolve(
        scenario.title === beyondTitle ? { error: { ...beyond, faults: [beyond] } } : simulate(scenario, options),
      ),
    terminate: () => undefined,
    onCrash: () => undefined,
  }),
});

/** No drawing library, which jsdom has no ground for. */
export const plotWithoutDrawing = () => ({
  Plot: ({ label }: { label: string }) => <div role="img" aria-label={label} />,
});

export const id = "00000000-0000-4000-8000-000000000100";
export const at = `/projects/${project.id}/scenarios/${id}`;

export const stored = (content: Scenario = creepFeed, version = 3): StoredScenario => ({
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
export const saved = ({ body, headers }: Request) =>
  ok(stored((body as { content: Scenario }).content, Number(headers["If-Match"].replaceAll('"', "")) + 1));

export const seen = (content: Scenario = creepFeed, role = "editor", more: Answers = {}): Answers => ({
  "GET /session": ok(session(ines)),
  [`GET /projects/${project.id}`]: ok({ ...project, role }),
  [`GET ${at}`]: ok(stored(content)),
  [`PUT ${at}`]: saved,
  ...more,
});

export const saves = (requests: Request[]): Request[] => requests.filter(({ method }) => method === "PUT");
export const answer = (): Promise<HTMLElement> => screen.findByRole("heading", { level: 1 });

export async function changeDamping(user: ReturnType<typeof openPage>["user"], text: string): Promise<void> {
  await user.click(await screen.findByRole("button", { name: /^Damping/ }));
  await user.keyboard(`${text}{Enter}`);
}
