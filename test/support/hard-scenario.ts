import fc from "fast-check";
import { checkScenario, type Scenario } from "@restband/solver";

/** Numbers over many decades, so that no scale is favoured. */
export const decades = (low: number, high: number): fc.Arbitrary<number> =>
  fc.double({ min: low, max: high, noNaN: true }).map((exponent) => 10 ** exponent);

export const orZero = (value: fc.Arbitrary<number>): fc.Arbitrary<number> => fc.oneof(fc.constant(0), value);
export const signed = (value: fc.Arbitrary<number>): fc.Arbitrary<number> =>
  fc.tuple(value, fc.boolean()).map(([v, isNegative]) => (isNegative ? -v : v));

/** Forces in units of the static friction, times in natural periods: what makes sticks, grazes and ties likely. */
export interface Scale {
  inertia: number;
  omega: number;
  grip: number;
  stretch: number;
}

export const unit = fc.oneof(fc.constantFrom(0, 1), fc.double({ min: 1e-6, max: 3, noNaN: true }));

export function forceTerm(s: Scale): fc.Arbitrary<object> {
  const period = (2 * Math.PI) / s.omega;
  const force = signed(unit).map((u) => u * s.grip);
  const time = unit.map((u) => u * period);
  const later = fc.double({ min: 0.05, max: 2, noNaN: true }).map((u) => u * period);
  const hz = decades(-1, 1).map((r) => (r * s.omega) / (2 * Math.PI));
  const phase = fc.constantFrom(0, 30, 90, -90, 180);
  return fc.oneof(
    fc.record({ kind: fc.constant("constant"), value: force }),
    fc.record({ kind: fc.constant("ramp"), rate: force.map((f) => f / period), start: time }),
    fc.record({ kind: fc.constant("step"), value: force, start: time }),
    fc.record({ kind: fc.constant("harmonic"), amplitude: force, hz, phase }),
    fc.record({
      kind: fc.constant("pulse"),
      shape: fc.constantFrom("half-sine", "rectangle", "triangle"),
      peak: force,
      start: time,
      duration: later,
    }),
    fc.record({
      kind: fc.constant("record"),
      times: fc.constant([0, 0.3 * period, 0.9 * period, 1.4 * period, 3 * period]),
      values: fc.array(force, { minLength: 5, maxLength: 5 }),
    }),
  );
}

export function baseTerm(s: Scale): fc.Arbitrary<object> {
  const period = (2 * Math.PI) / s.omega;
  const travel = signed(unit).map((u) => u * s.stretch);
  const start = unit.map((u) => u * period);
  const rate = decades(-2, 1).map((r) => (r * s.stretch) / period);
  const hz = decades(-1, 0.7).map((r) => (r * s.omega) / (2 * Math.PI));
  const phase = fc.constantFrom(0, 45, 90, -90);
  const acceleration = decades(-1, 2).map((r) => (r * s.stretch) / period ** 2);
  return fc.oneof(
    fc.record({ kind: fc.constant("ramp"), rate: signed(rate), start }),
    fc.record({ kind: fc.constant("harmonic"), amplitude: travel, hz, phase }),
    fc.record({ kind: fc.constant("move"), distance: travel.map((d) => d || 1e-9), speed: rate, acceleration, start }),
    fc.record({
      kind: fc.constant("record"),
      times: fc.constant([0, 0.5 * period, period, 2 * period]),
      values: fc.array(travel, { minLength: 4, maxLength: 4 }),
    }),
  );
}

export function solidOf(s: Scale): fc.Arbitrary<object> {
  return fc.oneof(
    { weight: 3, arbitrary: fc.constant({ model: "none" }) },
    {
      weight: 1,
      arbitrary: fc.record({
        model: fc.constant("equivalent-viscous"),
        lossFactor: unit,
        at: fc.constant({ hz: s.omega / 6 }),
      }),
    },
    {
      weight: 2,
      arbitrary: fc.record({
        model: fc.constant("displacement-proportional"),
        lossFactor: fc.double({ min: 0.01, max: 0.6, noNaN: true }),
      }),
    },
  );
}

function sketch(s: Scale): fc.Arbitrary<object> {
  const period = (2 * Math.PI) / s.omega;
  const critical = 2 * s.inertia * s.omega;
  const kinetic = fc.constantFrom(0, 0.5, 0.8, 1);
  const cases = fc.record({
    viscous: orZero(fc.oneof(decades(-3, 2), fc.constantFrom(1, 1 + 1e-10, 1 - 1e-10))).map((r) => r * critical),
    hasSpring: fc.constantFrom(true, true, true, true, false),
    kinetic,
    model: fc.constantFrom("coulomb", "coulomb", "coulomb", "none"),
    ripple: fc.option(fc.double({ min: 0.05, max: 0.9, noNaN: true })),
    counterface: fc.oneof(
      fc.constantFrom("ground", "base"),
      signed(decades(-2, 0.5)).map((r) => ({ velocity: (r * s.stretch) / period })),
    ),
    force: fc.array(forceTerm(s), { maxLength: 2 }),
    base: fc.array(baseTerm(s), { maxLength: 2 }),
    displacement: signed(fc.oneof(unit, fc.constantFrom(0, 1, 1 + 1e-13, 20))).map((u) => u * s.stretch),
    velocity: signed(orZero(unit)).map((u) => (u * s.stretch) / period),
    solid: solidOf(s),
    untilRest: fc.boolean(),
  });
  return cases.map((c) => ({
    format: "restband-scenario/1",
    motion: "linear",
    body: { inertia: s.inertia, stiffness: c.hasSpring ? s.inertia * s.omega ** 2 : 0, viscous: c.viscous },
    solid: c.hasSpring ? c.solid : { model: "none" },
    contact: {
      law: c.model === "none" ? { model: "none" } : { model: "coulomb", static: 1, kinetic: c.kinetic },
      normal: {
        preload: s.grip,
        ripple: c.ripple === null ? null : { amplitude: c.ripple * s.grip, hz: s.omega / 5, phase: 0 },
      },
      counterface: c.counterface,
    },
    force: c.force,
    base: c.base,
    initial: { displacement: c.displacement, velocity: c.velocity },
    span: { seconds: 12 * period, untilRest: c.untilRest, maxEvents: 2000 },
  }));
}

/**
 * Valid scenarios of the exact method at their hardest: m from 1e-6 to 1e6, four decades of frequency, forces about the
 * static friction, every term, counterface and solid model, damping at and next to critical, no spring.
 */
export const hardScenario: fc.Arbitrary<Scenario> = scaled(sketch);

/** Checked scenarios of what is sketched at a drawn scale. */
export function scaled(draw: (scale: Scale) => fc.Arbitrary<object>): fc.Arbitrary<Scenario> {
  return fc
    .record({ inertia: decades(-6, 6), omega: decades(-1, 3), grip: decades(-4, 4) })
    .map(({ inertia, omega, grip }) => ({ inertia, omega, grip, stretch: grip / (inertia * omega ** 2) }))
    .chain(draw)
    .map((input) => {
      const { scenario, faults } = checkScenario(input);
      if (scenario === null) throw new Error(`a drawn scenario is refused: ${JSON.stringify(faults)}`);
      return scenario;
    });
}
