import { expect, test } from "vitest";
import type { ScenarioSketch } from "../../support/scenario-builder.ts";
import { run } from "../../support/run.ts";

/*
 * An undamped body set going by a steady ramp moves by v = V (1 − cos ωt): its velocity touches 0 once a period and never
 * changes sign (the response from rest to a ramp, any textbook of vibrations, e.g. Den Hartog, Mechanical Vibrations, from memory).
 */

const methods = ["exact", "adaptive"] as const;
const laws = [{ model: "none" }, { model: "coulomb", static: 0, kinetic: 0 }] as const;
const sizes = [
  { inertia: 1, stiffness: 1, rate: 1 },
  { inertia: 0.37, stiffness: 5.3e4, rate: -21 },
  { inertia: 810, stiffness: 0.013, rate: 6e-4 },
];

const periodOf = ({ inertia, stiffness }: { inertia: number; stiffness: number }): number =>
  2 * Math.PI * Math.sqrt(inertia / stiffness);

function ramped({ rate, ...body }: (typeof sizes)[number], periods: number, start = 0): ScenarioSketch {
  return {
    body,
    force: [{ kind: "ramp", rate, start }],
    span: { seconds: periods * periodOf(body), untilRest: false },
  };
}

const cases = methods.flatMap((method) => laws.flatMap((law) => sizes.map((size) => ({ method, law, size }))));

test.each(cases)("a velocity that only touches zero gives no event: $method, $law.model, $size", (one) => {
  for (const start of [0, 0.3 * periodOf(one.size)]) {
    const sketch = { ...ramped(one.size, 60.3, start), contact: { law: one.law } };
    const { events } = run(sketch, { method: one.method, quantities: [] });
    expect(events.map(({ kind }) => kind)).toEqual(["start", "break-away", "end"]);
    expect(events[1].t).toBe(start);
  }
});

test.each(methods)("a feed touches too, and a crossing is still a turn: %s", (method) => {
  const [size] = sizes;
  const feed: ScenarioSketch = {
    body: { inertia: 1, stiffness: 1 },
    base: [{ kind: "ramp", rate: 2, start: 0 }],
    span: { seconds: 20 * periodOf(size), untilRest: false },
  };
  expect(run(feed, { method }).events).toHaveLength(3);
  // v = V (1 − a cos ωt) with a a hair above 1 crosses twice a period
  const faster = run({ ...feed, initial: { displacement: 0, velocity: -1e-4 } }, { method });
  const turns = faster.events.filter(({ kind }) => kind === "turn");
  expect(turns).toHaveLength(2 * 20);
});

// by the exact method alone: whether an integrated v_r comes down to 0 or stays a hair above is for its tolerance to say
test("with friction the touch is held: a stop, at the bottom, and a new break-away", () => {
  const law = { model: "coulomb", static: 0.4, kinetic: 0.4 } as const;
  const { events } = run({ ...ramped(sizes[0], 20), contact: { law, normal: { preload: 3 } } }, { method: "exact" });
  // it first moves when the ramp has reached μN, and stops a period later on
  const stops = events.filter(({ kind }) => kind === "stop");
  expect(stops).toHaveLength(19);
  stops.forEach(({ t }, n) => expect(Math.abs(t - (1.2 + 2 * Math.PI * (n + 1)))).toBeLessThan(1e-11));
});

test.each([0.25, 0.1])("a body that nothing holds and nothing pushes stays, whatever rounding makes of 3 × %f", (x) => {
  const { events, outcome } = run({
    body: { inertia: 2, stiffness: 3 },
    force: [{ kind: "constant", value: x === 0.1 ? 0.3 : 3 * x }],
    initial: { displacement: x },
    span: { seconds: 10 },
  });
  expect(events.map(({ kind }) => kind)).toEqual(["start", "end"]);
  expect(outcome).toBe("never-moved");
});

// v_r = (v0 + (a0 + ω v0) t) e^{−ωt} at critical damping: it comes as near to 0 as one likes and is never there
test.each([1 - 1e-10, 1, 1.2])("a body that settles to run along with its belt never stops on it: ζ = %f", (ratio) => {
  const { events, ended } = run({
    body: { inertia: 1, stiffness: 1, viscous: 2 * ratio },
    contact: {
      law: { model: "coulomb", static: 1, kinetic: 0 },
      normal: { preload: 1 },
      counterface: { velocity: 0.7 },
    },
    base: [{ kind: "ramp", rate: 0.7 }],
    initial: { displacement: -3, velocity: 0.1 },
    span: { seconds: 300 },
  });
  expect(ended).toBe("time");
  expect(events.map(({ kind }) => kind).filter((kind) => kind === "stop")).toEqual([]);
});

test("a free body that a force on the turn pushes back at first turns where the parabola of its velocity does", () => {
  // m ẍ = −F + r t from rest: ẋ is 0 again at 2F/r
  const [force, rate] = [-4.57e-4, 0.53];
  const { events } = run(
    {
      body: { inertia: 1, stiffness: 0 },
      contact: { law: { model: "none" } },
      force: [
        { kind: "constant", value: force },
        { kind: "ramp", rate },
      ],
      span: { seconds: 2, untilRest: false },
    },
    { quantities: [] },
  );
  const turn = events.find(({ kind }) => kind === "turn");
  expect(turn!.t).toBeCloseTo((-2 * force) / rate, 12);
});
