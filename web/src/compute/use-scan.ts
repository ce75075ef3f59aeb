import type { Outcome, Scenario } from "@restband/solver";
import { useEffect, useState } from "react";
import { recall, remember, runKey } from "./run-cache.ts";
import type { SolverJob } from "./solver-job.ts";
import { solverPool } from "./solver-pool.ts";

/** What a run of a scan came to, at its place (0…1) on the scale; null where there is no outcome: refused, or cut off. */
export interface ScanPoint {
  readonly at: number;
  readonly outcome: Outcome | null;
}

/** Equal steps of the scale, a power of two; then each boundary is halved so many times. */
const STEPS = 32;
const HALVINGS = 6;
/** A scan begins when its scale has been left alone for so long. */
const REST_BEFORE_MS = 250;
/** Runs that take longer are not repeated along a whole scale. */
const TOO_LONG_MS = 400;

/**
 * Runs the scenarios of a scale one after the other, as far apart first, then closer and closer about each change of the
 * outcome. Tells what it has found so far, in the order of the scale; gives up where single runs take long.
 *
 * @param scenarioAt the scenario at a place of the scale, 0…1
 * @param key stands for the scale: with the same key nothing is run again
 */
export function useScan(scenarioAt: (at: number) => Scenario, key: string): readonly ScanPoint[] {
  const [client] = useState(() => Symbol("scan"));
  const [scan, setScan] = useState<{ key: string; points: readonly ScanPoint[] }>({ key, points: [] });

  useEffect(() => {
    let isWanted = true;
    const tell = (points: readonly ScanPoint[]): boolean => {
      if (isWanted) setScan({ key, points });
      return isWanted;
    };
    const timer = setTimeout(() => void runAll(client, scenarioAt, tell), REST_BEFORE_MS);
    return () => {
      isWanted = false;
      clearTimeout(timer);
      solverPool.leave(client);
    };
    // The key stands for the scenarios.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [client, key]);

  return scan.key === key ? scan.points : [];
}

/** Goes on as long as `tell` wants more. */
async function runAll(
  client: symbol,
  scenarioAt: (at: number) => Scenario,
  tell: (points: readonly ScanPoint[]) => boolean,
): Promise<void> {
  let points: readonly ScanPoint[] = [];
  for (let at = nextPlace(points); at !== null; at = nextPlace(points)) {
    const started = performance.now();
    const point = { at, outcome: await outcomeOf(client, scenarioAt(at)) };
    points = [...points, point].sort((a, b) => a.at - b.at);
    if (!tell(points) || performance.now() - started > TOO_LONG_MS) return;
  }
}

/** Both ends, then the middle of the widest gap; gaps between unlike outcomes go on to be halved. Null when all is known. */
export function nextPlace(points: readonly ScanPoint[]): number | null {
  if (points.length < 2) return points.length;
  let place: number | null = null;
  let widest = 0;
  for (let i = 1; i < points.length; i++) {
    const [left, right] = [points[i - 1], points[i]];
    const finest = left.outcome === right.outcome ? 1 / STEPS : 1 / STEPS / 2 ** HALVINGS;
    const gap = right.at - left.at;
    if (gap <= finest || gap <= widest) continue;
    widest = gap;
    place = (left.at + right.at) / 2;
  }
  return place;
}

async function outcomeOf(client: symbol, scenario: Scenario): Promise<Outcome | null> {
  const job: SolverJob = { scenario, options: { samples: 0, events: false, energy: false, quantities: [] } };
  const key = runKey(job);
  const reply = recall(key) ?? (await solverPool.request(client, job));
  remember(key, reply);
  return reply.kind === "result" ? reply.result.outcome : null;
}
