import fc from "fast-check";
import { unsupported, type Scenario } from "@restband/solver";
import { baseTerm, decades, forceTerm, orZero, scaled, signed, solidOf, unit, type Scale } from "./hard-scenario.ts";

const chance = (n: number): fc.Arbitrary<boolean> => fc.nat({ max: n - 1 }).map((i) => i === 0);
/** In thousandths: none of the numbers next to 0 that nobody enters. */
const between = (min: number, max: number): fc.Arbitrary<number> =>
  fc.integer({ min: Math.ceil(1000 * min), max: Math.floor(1000 * max) }).map((n) => n / 1000);
const periodOf = (s: Scale): number => (2 * Math.PI) / s.omega;

/** Every law, its coefficients about 1 (the pressing force is the scale's), its speeds about those of the motion. */
function lawOf(s: Scale): fc.Arbitrary<object> {
  const speed = decades(-2, 0.5).map((r) => r * s.stretch * s.omega);
  const kinetic = fc.constantFrom(0, 0.5, 0.8, 1);
  const fluid = orZero(decades(-2, 0)).map((r) => r * s.inertia * s.omega);
  return fc.oneof(
    { weight: 1, arbitrary: fc.constant({ model: "none" }) },
    { weight: 4, arbitrary: fc.record({ model: fc.constant("coulomb"), static: fc.constant(1), kinetic }) },
    {
      weight: 4,
      arbitrary: fc.record({
        model: fc.constant("stribeck"),
        static: fc.constant(1),
        kinetic,
        velocity: speed,
        exponent: fc.constantFrom(0.5, 1, 2),
        fluid,
      }),
    },
    {
      weight: 3,
      arbitrary: fc
        .tuple(speed, fc.array(between(0, 1.5), { minLength: 1, maxLength: 4 }))
        .map(([v, values]) => ({ model: "table", points: values.map((mu, i) => [i * v, mu]) })),
    },
    {
      weight: 1,
      arbitrary: fc.record({
        model: fc.constant("bristle"),
        static: fc.constant(1),
        kinetic: fc.constantFrom(0.5, 0.8, 1),
        velocity: decades(-1, 0.5).map((r) => r * s.stretch * s.omega),
        stiffness: decades(0.5, 2).map((r) => r * s.inertia * s.omega ** 2),
        // as much as the law may have and still never give energy (Barabanov & Ortega 2000, from memory: σ1 bounded)
        damping: orZero(decades(-2, -1)).map((r) => r * s.inertia * s.omega),
        fluid,
      }),
    },
  );
}

function furtherForce(s: Scale): fc.Arbitrary<object> {
  const hz = decades(-1, 0.5).map((r) => (r * s.omega) / (2 * Math.PI));
  return fc.oneof(
    { weight: 6, arbitrary: forceTerm(s) },
    {
      weight: 1,
      arbitrary: fc.record({
        kind: fc.constant("chirp"),
        amplitude: signed(unit).map((u) => u * s.grip),
        fromHz: hz,
        toHz: hz,
        seconds: between(0.3, 3).map((u) => u * periodOf(s)),
        spacing: fc.constantFrom("linear", "log"),
      }),
    },
    {
      weight: 1,
      arbitrary: fc.record({
        kind: fc.constant("unbalance"),
        mass: between(0.01, 0.1).map((u) => u * s.inertia),
        eccentricity: signed(unit).map((u) => u * s.stretch),
        hz,
        phase: fc.constantFrom(0, 45, 180),
      }),
    },
  );
}

function furtherBase(s: Scale): fc.Arbitrary<object> {
  const increment = signed(between(0.1, 2)).map((u) => u * s.stretch);
  return fc.oneof(
    { weight: 4, arbitrary: baseTerm(s) },
    {
      weight: 1,
      arbitrary: increment.map((step) => ({
        kind: "staircase",
        increment: step,
        count: 3,
        dwell: periodOf(s),
        speed: (4 * Math.abs(step)) / periodOf(s),
        acceleration: (40 * Math.abs(step)) / periodOf(s) ** 2,
        start: periodOf(s) / 4,
      })),
    },
  );
}

/** The base's terms and the counterface: an acceleration record goes with counterface `base` alone. */
function driveOf(s: Scale): fc.Arbitrary<{ base: object[]; counterface: unknown }> {
  const values = fc.array(signed(unit), { minLength: 4, maxLength: 4 });
  const shaken = values.map((each) => ({
    base: [
      {
        kind: "acceleration-record",
        times: [0, 0.4, 1, 2.5].map((u) => u * periodOf(s)),
        values: each.map((u) => (u * s.grip) / s.inertia),
      },
    ],
    counterface: "base",
  }));
  const led = fc.record({
    base: fc.array(furtherBase(s), { maxLength: 2 }),
    counterface: fc.oneof(
      fc.constantFrom("ground", "base"),
      signed(decades(-2, 0.5)).map((r) => ({ velocity: (r * s.stretch) / periodOf(s) })),
    ),
  });
  return fc.oneof({ weight: 8, arbitrary: led }, { weight: 1, arbitrary: shaken });
}

function sketch(s: Scale): fc.Arbitrary<object> {
  const cases = fc.record({
    viscous: orZero(decades(-3, 1)).map((r) => 2 * r * s.inertia * s.omega),
    hasSpring: chance(6).map((isWithout) => !isWithout),
    cubic: fc.oneof(
      { weight: 5, arbitrary: fc.constant(0) },
      { weight: 1, arbitrary: between(-0.2, 1).map((r) => (r * s.inertia * s.omega ** 2) / s.stretch ** 2) },
    ),
    law: lawOf(s),
    ripple: fc.option(between(0.05, 1.6), { freq: 3 }),
    faces: fc.constantFrom(1, 1, 2),
    incline: fc.constantFrom(0, 0, 0, 20, -35),
    drive: driveOf(s),
    force: fc.array(furtherForce(s), { maxLength: 2 }),
    displacement: signed(fc.oneof(unit, fc.constantFrom(0, 1, 6))).map((u) => u * s.stretch),
    velocity: signed(orZero(unit)).map((u) => (u * s.stretch) / periodOf(s)),
    solid: solidOf(s),
    untilRest: fc.boolean(),
    radius: fc.constantFrom(null, null, null, null, 0.25, 3),
  });
  const linear = cases.map((c) => ({
    radius: c.radius,
    format: "restband-scenario/1",
    motion: "linear",
    body: {
      inertia: s.inertia,
      stiffness: c.hasSpring ? s.inertia * s.omega ** 2 : 0,
      cubic: c.hasSpring ? c.cubic : 0,
      viscous: c.viscous,
    },
    solid: c.hasSpring ? c.solid : { model: "none" },
    contact: {
      law: c.law,
      normal: {
        preload: s.grip,
        faces: c.faces,
        ripple: c.ripple === null ? null : { amplitude: c.ripple * s.grip, hz: s.omega / 5, phase: 30 },
      },
      counterface: c.drive.counterface,
    },
    incline: c.incline,
    force: c.force,
    base: c.drive.base,
    initial: { displacement: c.displacement, velocity: c.velocity },
    span: { seconds: 4 * periodOf(s), untilRest: c.untilRest, maxEvents: 500, maxWork: 200_000 },
  }));
  return linear.map(({ radius, ...scenario }) => (radius === null ? scenario : turning(scenario, radius)));
}

/** The same numbers as a body that turns, rubbed at a radius: pressed the less the further out, so that the grip is the same. */
function turning<Linear extends { force: object[]; contact: { law: object; normal: Record<string, unknown> } }>(
  { contact, ...linear }: Linear,
  radius: number,
): object {
  const { normal } = contact;
  const ripple = normal.ripple as { amplitude: number } | null;
  return {
    ...linear,
    motion: "angular",
    incline: 0,
    force: linear.force.filter((term) => (term as { kind: string }).kind !== "unbalance"),
    contact: {
      ...contact,
      radius,
      normal: {
        ...normal,
        preload: (normal.preload as number) / radius,
        ripple: ripple && { ...ripple, amplitude: ripple.amplitude / radius },
      },
    },
  };
}

/**
 * Valid scenarios that can be computed, of every law, excitation, counterface and solid model, short and small: cubic springs (softening ones run
 * away), ripples that let the contact go, inclines, bodies that turn; m from 1e-6 to 1e6, four decades of frequency, forces about the friction.
 */
export const anyScenario: fc.Arbitrary<Scenario> = scaled(sketch).filter((scenario) => unsupported(scenario) === null);
