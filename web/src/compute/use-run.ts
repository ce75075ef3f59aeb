import type { Refusal, Result, Scenario } from "@restband/solver";
import { useCallback, useEffect, useRef, useState } from "react";
import { recall, remember, runKey } from "./run-cache.ts";
import type { RunOptions, SolverReply } from "./solver-job.ts";
import { solverPool } from "./solver-pool.ts";

/** A result or a refusal together with the scenario it is of, so that no sentence mixes two states of a draft. */
export type Computed = { scenario: Scenario } & ({ result: Result } | { refusal: Refusal["error"] });

export interface Run {
  /** The newest there is; null until the first run ends. */
  readonly computed: Computed | null;
  /** True while `computed` is not that of the scenario asked for. */
  readonly isStale: boolean;
  /** Fraction done of a run under way, else null. */
  readonly progress: number | null;
  /** A sentence where the run broke off or was cancelled. */
  readonly failure: string | null;
  readonly cancel: () => void;
  /** Runs once more what was cancelled or failed. */
  readonly again: () => void;
}

interface RunState {
  key: string | null;
  computed: Computed | null;
  progress: number | null;
  failure: string | null;
}

const CANCELLED = "Cancelled. What is shown is the run before.";

/**
 * Runs a scenario in a worker and keeps the newest result. While a value is dragged each finished run is shown, however
 * outdated; what has not begun is dropped. `scenario` null asks for nothing.
 */
export function useRun(scenario: Scenario | null, options: RunOptions = {}): Run {
  const [client] = useState(() => Symbol("run"));
  const [attempt, setAttempt] = useState(0);
  const [state, setState] = useState<RunState>({ key: null, computed: null, progress: null, failure: null });
  const shown = useRef(0);
  const asked = useRef(0);
  const key = scenario ? runKey({ scenario, options }) : null;

  useEffect(() => {
    if (!scenario || key === null) return;
    const turn = (asked.current += 1);
    const take = (reply: SolverReply): void => {
      remember(key, reply);
      const isLatest = turn === asked.current;
      const computed = computedOf(scenario, reply);
      if (computed && turn > shown.current) {
        shown.current = turn;
        setState((old) => ({ key, computed, progress: isLatest ? null : old.progress, failure: null }));
      } else if (isLatest) {
        setState((old) => ({ ...old, progress: null, failure: failureOf(reply) }));
      }
    };
    const known = recall(key);
    if (known) return take(known);
    const tell = (progress: number): void => setState((old) => (turn === asked.current ? { ...old, progress } : old));
    setState((old) => ({ ...old, progress: old.progress ?? 0, failure: null }));
    void solverPool.request(client, { scenario, options }, tell).then(take);
    // The key stands for scenario and options: equal ones need no second run.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [client, key, attempt]);

  useEffect(() => () => solverPool.leave(client), [client]);

  const cancel = useCallback(() => solverPool.cancel(client), [client]);
  const again = useCallback(() => setAttempt((count) => count + 1), []);
  const { computed, progress, failure } = state;
  return { computed, isStale: computed !== null && state.key !== key, progress, failure, cancel, again };
}

function computedOf(scenario: Scenario, reply: SolverReply): Computed | null {
  if (reply.kind === "result") return { scenario, result: reply.result };
  return reply.kind === "refusal" ? { scenario, refusal: reply.refusal } : null;
}

function failureOf(reply: SolverReply): string | null {
  if (reply.kind === "cancelled") return CANCELLED;
  return reply.kind === "failed" ? reply.message : null;
}
