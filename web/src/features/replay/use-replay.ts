import { useCallback, useEffect, useState } from "react";
import { useKeepReplay } from "../../api/revisions.ts";
import { solverPool } from "../../compute/solver-pool.ts";
import { replay, waysOf, type Ask, type Frozen, type ReplayWay } from "./replay-run.ts";

export interface Replaying {
  /** The way under way, how far its run is, and which of how many ways it is; null while nothing runs. */
  readonly running: {
    readonly way: ReplayWay;
    readonly fraction: number;
    readonly step: number;
    readonly of: number;
  } | null;
  /** A sentence where it did not come to an end. */
  readonly failure: string | null;
  readonly begin: () => void;
  readonly cancel: () => void;
}

/** Runs a revision again in this browser, way after way, and has the server keep what comes of each. */
export function useReplay(projectId: string, revisionId: string, frozen: Frozen): Replaying {
  const [client] = useState(() => Symbol("replay"));
  const [running, setRunning] = useState<Replaying["running"]>(null);
  const [failure, setFailure] = useState<string | null>(null);
  const keep = useKeepReplay(projectId, revisionId);
  useEffect(() => () => solverPool.leave(client), [client]);

  const begin = async (): Promise<void> => {
    const ways = waysOf(frozen);
    setFailure(null);
    try {
      for (const [step, way] of ways.entries()) {
        const tell = (fraction: number): void => setRunning({ way, fraction, step, of: ways.length });
        tell(0);
        await keep.mutateAsync(await replay(way, frozen, askOf(client, tell)));
      }
    } catch (error) {
      setFailure(error instanceof Error ? error.message : String(error));
    } finally {
      setRunning(null);
    }
  };
  const cancel = useCallback(() => solverPool.cancel(client), [client]);
  return { running, failure, begin: () => void begin(), cancel };
}

const askOf = (client: symbol, tell: (fraction: number) => void): Ask =>
  async function ask(scenario, options) {
    const reply = await solverPool.request(client, { scenario, options }, tell);
    if (reply.kind === "result") return reply.result;
    if (reply.kind === "refusal") throw new Error(`This version does not compute it: ${reply.refusal.message}`);
    throw new Error(reply.kind === "failed" ? reply.message : "Cancelled. What had ended before is kept.");
  };
