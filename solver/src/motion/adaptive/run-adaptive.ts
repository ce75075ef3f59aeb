import type { Problem } from "../../scenario/problem.ts";
import type { Motion } from "../motion.ts";
import { runSegments, type Progress } from "../run.ts";
import { runBristle } from "./bristle-run.ts";
import { IntegratedSlip } from "./integrated-slip.ts";

/**
 * The adaptive method: slips by extrapolation with dense output, stopped and restarted at every event; sticks, their ends
 * and the rules between as the exact method has them. Friction is never smoothed. Bristles have a run of their own.
 * @param tolerance relative to the typical size of each unknown
 */
export function runAdaptive(problem: Problem, progress?: Progress, tolerance?: number): Motion {
  if (problem.law.bristle !== undefined) return runBristle(problem, progress, tolerance);
  return runSegments(problem, "adaptive", (of, inputs) => new IntegratedSlip(of, inputs, tolerance), progress);
}
