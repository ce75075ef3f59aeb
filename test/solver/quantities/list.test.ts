import { quantities, quantityNames, quantityOf } from "@restband/solver";
import { describe, expect, test } from "vitest";
import { judge } from "../../../solver/src/judge.ts";
import { runExact } from "../../../solver/src/motion/exact/run-exact.ts";
import { compileProblem } from "../../../solver/src/scenario/compile-problem.ts";
import { buildScenario, coulombForces } from "../../support/scenario-builder.ts";

/** A run in stick-slip that has long settled, and how often its motion was asked for the length of a panel. */
function counted() {
  const scenario = buildScenario({
    body: { inertia: 1, stiffness: 400 },
    contact: coulombForces(5),
    force: [{ kind: "harmonic", amplitude: 8, hz: 1.6 }],
    span: { seconds: 25, untilRest: false },
  });
  const motion = runExact(compileProblem(scenario));
  let panels = 0;
  const panel = motion.panel.bind(motion);
  motion.panel = (i, t) => {
    panels++;
    return panel(i, t);
  };
  return (names: readonly string[], energy = false) => {
    panels = 0;
    const judged = judge(motion, { quantities: names, energy });
    return { panels, judged };
  };
}

describe("the list of quantities", () => {
  test("has every name that limits may use, in that order", () => {
    expect(quantities.map(({ name }) => name)).toEqual(quantityNames);
  });

  test("describes each: a label, a meaning without full stop, why it may have no value", () => {
    for (const { name, label, meaning, absent } of quantities) {
      expect(quantityOf(name).label).toBe(label);
      expect(label, name).toMatch(/^[A-Z]/);
      for (const words of [meaning, absent ?? "-"]) expect(words, name).not.toMatch(/[.!]$|^$/);
    }
    expect(new Set(quantities.map(({ label }) => label)).size).toBe(quantities.length);
  });

  test("knows no other", () => {
    expect(() => quantityOf("speed")).toThrow(new RangeError('no quantity is called "speed"'));
  });
});

describe("judging a run", () => {
  const ask = counted();
  const [alone, whole] = [[], ["peakDisplacement"]].map((names) => ask(names).panels);

  test("looks at each stretch of the run once, however much is asked", () => {
    // the distance of a slip is told over whole cycles, a window of its own
    const many = quantities.map(({ name }) => name).filter((name) => name !== "slipDistance");
    expect(whole).toBeGreaterThan(alone);
    expect(ask(many, true).panels).toBe(whole);
  });

  test("gives each quantity the value that it has when asked alone, bit by bit", () => {
    const all = ask(quantityNames).judged.quantities;
    for (const name of quantityNames) expect(ask([name]).judged.quantities).toEqual({ [name]: all[name] });
  });

  test("computes what is asked and nothing else", () => {
    expect(ask(["holdUse"]).judged).toEqual({
      outcome: "stick-slip",
      notes: [],
      limits: [],
      quantities: { holdUse: 1 },
    });
    expect(() => ask(["speed"])).toThrow(RangeError);
  });
});
