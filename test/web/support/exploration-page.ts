import type { StoredExploration } from "@restband/api/contract";
import {
  answerRun,
  drawsOf,
  readAnswers,
  runDraws,
  runTile,
  solverVersion,
  toleranceSummary,
  type Scenario,
  type SweepPlan,
} from "@restband/solver";
import type { Errand, ErrandAnswers, ErrandWorker } from "../../../web/src/compute/errand.ts";
import { sweepToKeep } from "../../../web/src/features/explore/sweep/stored-sweep.ts";
import { fakeServer, ines, ok, project, refuse, session, type Answers, type Request } from "./fake-server.ts";

/** Explorations before a server that keeps their tiles; the solver itself, without a thread of its own. */

/** Tiles that kill whoever runs them, and how often they still do. */
export const deadly = new Map<number, number>();

export const exploreInOneThread = () => ({
  startExploreWorker: (): ErrandWorker => {
    let crash = (): void => undefined;
    return {
      do: async (errand) => {
        await Promise.resolve();
        const left = errand.kind === "tile" ? (deadly.get(errand.tile) ?? 0) : 0;
        if (errand.kind !== "tile" || left === 0) return answerTo(errand);
        deadly.set(errand.tile, left - 1);
        crash();
        return new Promise(() => undefined);
      },
      terminate: () => undefined,
      onCrash: (tell) => (crash = tell),
    };
  },
});

function answerTo(errand: Errand): ErrandAnswers[Errand["kind"]] {
  switch (errand.kind) {
    case "runs":
      return errand.runs.map((ask) => answerRun(ask));
    case "tile":
      return runTile(errand.scenario, errand.plan, errand.tile) as Float64Array;
    case "draws":
      return runDraws(errand.scenario, errand.plan, drawsOf(errand.plan), [errand.from, errand.to]) as Float64Array;
    case "summary":
      return toleranceSummary(errand.plan, errand.scenario, errand.rows);
    case "answers":
      return readAnswers(errand.scenario, errand.plan, errand.text.split("\n"), { seed: errand.seed });
  }
}

const scenarioId = "00000000-0000-4000-8000-000000000100";
let count = 0;

export interface ExplorationServer {
  readonly id: string;
  /** The page of it. */
  readonly at: string;
  readonly requests: Request[];
  /** Tiles by number, base64. */
  readonly tiles: Map<number, string>;
  readonly read: () => StoredExploration;
  /** What is answered to a tile instead, as long as it is not null. */
  refusal: ReturnType<typeof refuse> | null;
  /** Whose page computes it, other than this one. */
  runner: string | null;
}

/** A server with one sweep of a scenario, none of it computed yet, for an editor of its project. */
export function sweepServer(scenario: Scenario, plan: SweepPlan): ExplorationServer {
  const id = `00000000-0000-4000-8000-${String(2000 + (count += 1)).padStart(12, "0")}`;
  const kept = sweepToKeep(
    { plan, seconds: scenario.span.seconds },
    { title: "A sweep", scenarioVersion: 3, solverVersion },
  );
  const tiles = new Map<number, string>();
  let conclusion: { headline: string; answer: Record<string, unknown> } | null = null;
  const read = (): StoredExploration => ({
    ...{ id, scenarioId, kind: "sweep", title: kept.title, headline: conclusion?.headline ?? null },
    state: conclusion ? "done" : server.runner ? "running" : "stopped",
    ...{ tilesSaved: tiles.size, tiles: kept.tileCells.length, tileCells: kept.tileCells, cellValues: kept.cellValues },
    ...{ scenarioVersion: 3, isStale: false, createdAt: project.createdAt },
    createdBy: { accountId: ines.id, name: ines.name },
    content: scenario,
    solverVersion,
    plan: kept.plan,
    answer: conclusion?.answer ?? null,
    saved: [...tiles.keys()],
    runner: server.runner === null ? null : { accountId: ines.id, name: server.runner },
  });
  const own = `/projects/${project.id}/explorations/${id}`;
  const fixed: Answers = {
    "GET /session": ok(session(ines)),
    [`GET /projects/${project.id}`]: ok({ ...project, role: "editor" }),
    [`GET ${own}`]: () => ok(read()),
    [`POST ${own}/claim`]: () =>
      server.runner === null ? ok(read()) : refuse(409, "running", `${server.runner} computes this just now.`),
    [`POST ${own}/release`]: { status: 204 },
    [`PUT ${own}/conclusion`]: ({ body }) => {
      conclusion = body as typeof conclusion;
      return { status: 204 };
    },
  };
  const tileAnswer = ({ method, path, body }: Request) => {
    if (method === "GET") {
      const numbers = (path.split("numbers=")[1] ?? "").split(/,|%2C/u).map(Number);
      return ok(numbers.flatMap((number) => (tiles.has(number) ? [{ number, content: tiles.get(number) }] : [])));
    }
    if (server.refusal) return server.refusal;
    tiles.set(Number(path.split("/").at(-1)), (body as { content: string }).content);
    return { status: 204 };
  };
  const answers = new Proxy(fixed, {
    get: (listed, key: string) => listed[key] ?? (key.includes(`${own}/tiles`) ? tileAnswer : undefined),
  });
  const server: ExplorationServer = {
    ...{ id, at: `/projects/${project.id}/scenarios/${scenarioId}/explore/${id}`, tiles, read },
    ...{ requests: [], refusal: null, runner: null },
  };
  return Object.assign(server, { requests: fakeServer(answers) });
}
