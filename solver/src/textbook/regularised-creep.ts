import type { TextbookCase } from "./textbook-case.ts";
import type { Condition, TextbookCompanion } from "./textbook-companion.ts";

/** The force friction holds at the end of the run over what it can hold. */
function shareHeld({ result, staticForce }: TextbookCase): number {
  const last = result.events[result.events.length - 1];
  return last === undefined ? NaN : Math.abs(last.f) / staticForce;
}

const rests: Condition = ({ result }) =>
  result.outcome === "came-to-rest" || result.outcome === "never-moved" ? null : "It does not rest in this run.";

const holdsSomething: Condition = (kase) => {
  if (!(kase.staticForce > 0) || kase.problem.ripple !== null) return "Friction does not hold it with one force.";
  const share = shareHeld(kase);
  if (!(share > 1e-9)) return "Friction has nothing to hold where it rests.";
  return share < 1 ? null : "It is held at the very limit, where a regularised law lets go.";
};

/**
 * What a run with friction smoothed to F tanh(v/v_0) reports in place of a rest: it never holds and creeps with
 * v_0 artanh(W/F), W the force to be held.
 */
export const regularisedCreep: TextbookCompanion = {
  key: "regularised-creep",
  label: "Creep a smoothed law would report",
  formula: "v_0 artanh(W/F_s)",
  source: "Exact for the law F tanh(v/v_0)",
  dimension: "velocity",
  conditions: [rests, holdsSomething],
  value: (kase) => (kase.regularVelocity / kase.problem.radius) * Math.atanh(shareHeld(kase)),
  ofRun: () => 0,
  note: (kase) =>
    `A run with such a law creeps at first with this speed where this one rests; W/F_s is ${shareHeld(kase).toPrecision(3)}.`,
};
