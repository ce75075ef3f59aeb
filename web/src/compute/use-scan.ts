import type { Outcome, Scenario } from "@restband/solver";
import { useEffect, useState } from "react";
import { recall, remember, runKey } from "./run-cache.ts";
import type { SolverJob } from "./solver-job.ts";
import { solverPool } from "./solver-pool.ts";

/** What a run of a scan came to: its outcome, null where there is none (refused, cut off), undefined while it is not known. */
export type ScanOutcome = Outcome | null | undefined;

const REST_BEFORE_MS = 250;
/** Runs that take longer are not repeated along a whole scale. */
const TOO_LONG_MS = 400;

/**
 * Runs scenarios one after the other, as far apart first, and tells their outcomes as they come. Waits until the list has
 * been left alone for a moment; gives up where single runs take long. `key` stands for the list: the same key, no new scan.
 */
export function useScan(scenarios: readonly Scenario[], key: string): readonly ScanOutcome[] {
  const [client] = useState(() => Symbol("scan"));
  const [scan, setScan] = useState<{ key: string; outcomes: ScanOutcome[] }>({ key: "", outcomes: [] });

  useEffect(() => {
    let isWanted = true;
    const tell = (outcomes: ScanOutcome[]): void => {
      if (isWanted) setScan({ key, outcomes: [...outcomes] });
    };
    const timer = setTimeout(() => void runAll(client, scenarios, () => isWanted, tell), REST_BEFORE_MS);
    return () => {
      isWanted = false;
      clearTimeout(timer);
      solverPool.leave(client);
    };
    // The key stands for the scenarios.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [client, key]);

  return scan.key === key ? scan.outcomes : [];
}

async function runAll(
  client: symbol,
  scenarios: readonly Scenario[],
  isWanted: () => boolean,
  tell: (outcomes: ScanOutcome[]) => void,
): Promise<void> {
  const outcomes: ScanOutcome[] = scenarios.map(() => undefined);
  for (const index of spread(scenarios.length)) {
    const started = performance.now();
    outcomes[index] = await outcomeOf(client, scenarios[index]);
    if (!isWanted()) return;
    tell(outcomes);
    if (performance.now() - started > TOO_LONG_MS) return;
  }
}

async function outcomeOf(client: symbol, scenario: Scenario): Promise<Outcome | null> {
  const job: SolverJob = { scenario, options: { samples: 0, events: false, energy: false, quantities: [] } };
  const key = runKey(job);
  const reply = recall(key) ?? (await solverPool.request(client, job));
  remember(key, reply);
  return reply.kind === "result" ? reply.result.outcome : null;
}

/** The numbers below `count`, every eighth first, then the ones between: the whole scale shows early. */
function spread(count: number): number[] {
  const indices = Array.from({ length: count }, (_, i) => i);
  const rank = (i: number): number => (i % 8 === 0 ? 0 : i % 4 === 0 ? 1 : i % 2 === 0 ? 2 : 3);
  return indices.sort((a, b) => rank(a) - rank(b) || a - b);
}
