import type { Samples } from "../result.ts";
import { drivingForce } from "./driving-force.ts";
import { initialSum, type TextbookCase } from "./textbook-case.ts";
import type { Condition } from "./textbook-companion.ts";

/** η of the scenario; 0 without solid damping. */
export const lossFactorOf = ({ scenario: { solid } }: TextbookCase): number =>
  solid.model === "none" ? 0 : solid.lossFactor;

/** A motion that repeats itself under its force. */
export const isSteady: Condition = ({ result }) =>
  result.outcome === "smooth-sliding" || result.outcome === "stick-slip" ? null : "The run is not a steady swing.";

/** X of a steady run: half peak-to-peak, m (rad); null where the run has none. */
export const amplitudeOf = ({ result }: TextbookCase): number | null => result.quantities.amplitude ?? null;

/** A cycle of fewer samples is too coarse for its loss to be read from them. */
const fewestPerCycle = 40;

/**
 * The spring's own loss over the last whole cycle of the force, J: ∮ S ẋ dt by the trapezoid with end slopes on the run's
 * samples; null where it has none, too few, or less than one cycle. A base that stands and a spring that is straight are
 * taken for granted.
 */
export function lossOfLastCycle(kase: TextbookCase): number | null {
  const { samples } = kase.result;
  const drive = drivingForce(kase.problem);
  if (!samples || drive === null) return null;
  const { t } = samples;
  const last = t.length - 1;
  const from = t[last] - (2 * Math.PI) / drive.omega;
  const first = t.findIndex((time) => time >= from - 1e-9 * t[last]);
  if (from < 0 || last - first < fewestPerCycle) return null;
  const power = powerOf(kase, samples);
  let loss = 0;
  for (let i = first; i < last; i++) {
    const step = t[i + 1] - t[i];
    const [here, next] = [power(i), power(i + 1)];
    loss += (step / 2) * (here.value + next.value) + ((step * step) / 12) * (here.slope - next.slope);
  }
  // the cycle begins a part of a sample step before the first sample
  const part = Math.max(0, t[first] - from);
  const { value, slope } = power(first);
  return loss + part * (value - (part / 2) * slope);
}

/** S ẋ at sample i and its rate of change. */
function powerOf(kase: TextbookCase, { x, v, a }: Samples): (i: number) => { value: number; slope: number } {
  const { solid, stiffness } = kase.problem;
  const base = initialSum(kase.problem.base);
  return (i) => {
    const d = x[i] - base;
    const viscous = { value: solid.viscous * v[i] ** 2, slope: 2 * solid.viscous * v[i] * a[i] };
    const size = solid.proportional * stiffness;
    return {
      value: viscous.value + size * Math.abs(d * v[i]),
      slope: viscous.slope + size * Math.sign(d * v[i]) * (v[i] ** 2 + d * a[i]),
    };
  };
}
