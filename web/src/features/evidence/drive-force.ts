import { compileProblem, type Samples, type Scenario } from "@restband/solver";
import type { Inputs } from "../../compute/inputs.ts";
import { indexAt, type Instant } from "../../compute/instant.ts";

interface Part {
  readonly from: number;
  readonly to: number;
}

/** The force that drives a body, N (N·m), and what it is called. */
export interface DriveForce {
  readonly name: string;
  readonly at: (instant: Pick<Instant, "t" | "a" | "f">) => number;
  /** Its values in a part of a run, none of its corners lost; times sorted. */
  readonly between: (samples: Samples, part: Part) => readonly { t: number; force: number }[];
}

/**
 * The applied force where there is one; of a moved base what comes through spring and damper, by Newton's law:
 * m a − f − W. Null where nothing drives, and with an acceleration record, whose a is that relative to the base.
 */
export function driveForceOf(scenario: Scenario, inputs: Inputs): DriveForce | null {
  const { inertia, weight, isRelative } = compileProblem(scenario);
  if (scenario.force.length > 0) return appliedForce(inputs);
  if (scenario.base.length === 0 || isRelative) return null;
  const at: DriveForce["at"] = ({ a, f }) => inertia * a - f - weight;
  return { name: "from the drive", at, between: (samples, part) => sampled(at, samples, part) };
}

function appliedForce(inputs: Inputs): DriveForce {
  const at: DriveForce["at"] = ({ t }) => inputs.force(t);
  const between: DriveForce["between"] = (samples, part) =>
    inputs.times(part.from, part.to)?.map((t) => ({ t, force: inputs.force(t) })) ?? sampled(at, samples, part);
  return { name: "applied force", at, between };
}

function sampled(at: DriveForce["at"], { t, a, f }: Samples, { from, to }: Part): { t: number; force: number }[] {
  const first = indexAt(t, from);
  const count = Math.min(t.length - 1, indexAt(t, to) + 1) - first + 1;
  return Array.from({ length: count }, (_, k) => ({
    t: t[first + k],
    force: at({ t: t[first + k], a: a[first + k], f: f[first + k] }),
  }));
}
