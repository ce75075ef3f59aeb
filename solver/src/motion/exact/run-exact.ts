import type { Problem } from "../../scenario/problem.ts";
import type { Motion } from "../motion.ts";
import { runSegments, type Progress } from "../run.ts";
import type { SlipMaker } from "../form.ts";
import { ExactSlip } from "./exact-slip.ts";
import { PlainStepper } from "./plain-stepper.ts";

export const exactSlip: SlipMaker = (problem, inputs) => new ExactSlip(problem, inputs);

/**
 * The exact method: every segment has a closed form, so there is no step size, no tolerance and no drift. Valid for laws
 * whose friction is constant while sliding, k3 = 0, and inputs that are polynomials and harmonics between corners.
 */
export function runExact(problem: Problem, progress?: Progress): Motion {
  return runSegments(problem, "exact", exactSlip, progress, PlainStepper.of(problem));
}
