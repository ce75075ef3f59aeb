import {
  excitationTerms,
  frictionLaws,
  quantityOf,
  solidDampings,
  type Dimension,
  type Field,
  type Rows,
  type Scenario,
  type Term,
} from "@restband/solver";

/*
 * Scenarios made from scenarios, of which the answer must follow: seen in a mirror, told in other units, later, or from a
 * later instant on. What a number measures is read from what its kind says of itself.
 */

type Numbers = Record<string, unknown>;

/** The same with x pointing the other way. */
export function mirrored(scenario: Scenario): Scenario {
  const { contact, initial } = scenario;
  const { counterface } = contact;
  return {
    ...scenario,
    incline: -scenario.incline,
    contact: {
      ...contact,
      counterface: typeof counterface === "object" ? { velocity: -counterface.velocity } : counterface,
    },
    force: scenario.force.map(opposite),
    base: scenario.base.map(opposite),
    initial: { displacement: -initial.displacement, velocity: -initial.velocity },
    limits: scenario.limits.map((limit) => {
      if (!quantityOf(limit.quantity).signed) return limit;
      const { quantity, min, max } = limit;
      return { quantity, ...(max !== undefined && { min: -max }), ...(min !== undefined && { max: -min }) };
    }),
  };
}

/** The member of each kind whose sign is that of the whole term. */
const leading: Record<Term["kind"], string> = {
  constant: "value",
  ramp: "rate",
  step: "value",
  harmonic: "amplitude",
  unbalance: "eccentricity",
  pulse: "peak",
  chirp: "amplitude",
  move: "distance",
  staircase: "increment",
  record: "values",
  "acceleration-record": "values",
};

const opposite = (term: Term): Term => scaledTerm(term, -1);

/** How many of the new units one old unit is. */
export interface Units {
  length: number;
  time: number;
  mass: number;
}

/** The unit of x: a length of a body that slides, none of one that turns. */
export const unitOfPlace = ({ motion }: Pick<Scenario, "motion">, { length }: Units): number =>
  motion === "angular" ? 1 : length;

/** The size of a dimension in new units per old one, `place` being that of x. */
function unitOf(dimension: Dimension, { length, time, mass }: Units, place: number): number {
  const pressing = (mass * length) / time ** 2;
  const force = (pressing * length) / place;
  const sizes: Record<Dimension, number> = {
    none: 1,
    angle: 1,
    inertia: mass * (length / place) ** 2,
    mass,
    stiffness: force / place,
    bristleStiffness: pressing / length,
    cubicStiffness: force / place ** 3,
    damping: (force * time) / place,
    fluidDamping: (pressing * time) / length,
    displacement: place,
    length,
    velocity: place / time,
    slidingVelocity: length / time,
    acceleration: place / time ** 2,
    force,
    pressing,
    forceRate: force / time,
    frequency: 1 / time,
    time,
    power: (force * place) / time,
    energy: force * place,
  };
  return sizes[dimension];
}

/** The same told in other units; a scenario without weight, whose g is a number of its own. */
export function inUnits(scenario: Scenario, units: Units): Scenario {
  const { body, contact, initial, span } = scenario;
  const place = unitOfPlace(scenario, units);
  const sizeOf: SizeOf = (dimension) => unitOf(dimension, units, place);
  const as = (dimension: Dimension, value: number): number => value * sizeOf(dimension);
  const { ripple } = contact.normal;
  const law = frictionLaws.find(({ model }) => model === contact.law.model)!;
  const solid = solidDampings.find(({ model }) => model === scenario.solid.model)!;
  const { counterface } = contact;
  return {
    ...scenario,
    body: {
      inertia: as("inertia", body.inertia),
      stiffness: as("stiffness", body.stiffness),
      cubic: as("cubicStiffness", body.cubic),
      viscous: as("damping", body.viscous),
    },
    solid: kindInUnits(scenario.solid, solid, sizeOf),
    contact: {
      ...contact,
      radius: scenario.motion === "angular" ? as("length", contact.radius) : 1,
      law: kindInUnits(contact.law, law, sizeOf),
      normal: {
        ...contact.normal,
        preload: as("pressing", contact.normal.preload),
        ripple: ripple && {
          ...ripple,
          amplitude: as("pressing", ripple.amplitude),
          hz: as("frequency", ripple.hz),
        },
      },
      counterface: typeof counterface === "object" ? { velocity: as("velocity", counterface.velocity) } : counterface,
    },
    force: scenario.force.map((term) => termInUnits(term, sizeOf, "force")),
    base: scenario.base.map((term) => termInUnits(term, sizeOf, "displacement")),
    initial: {
      displacement: as("displacement", initial.displacement),
      velocity: as("velocity", initial.velocity),
    },
    span: { ...span, seconds: as("time", span.seconds) },
    settleBand: scenario.settleBand && as("displacement", scenario.settleBand),
  };
}

type SizeOf = (dimension: Dimension) => number;

function termInUnits(term: Term, sizeOf: SizeOf, place: "force" | "displacement"): Term {
  const kind = excitationTerms.find((one) => one.kind === term.kind)!;
  // members of a term that is F or y alike are described as forces
  const placed: Partial<Record<Dimension, Dimension>> =
    place === "force" ? {} : { force: "displacement", forceRate: "velocity" };
  return kindInUnits(term, kind, (dimension) => sizeOf(placed[dimension] ?? dimension));
}

interface Described {
  readonly fields: readonly Field[];
  readonly rows?: Rows;
  readonly choices?: readonly { readonly key: string; readonly options: readonly { readonly field?: Field }[] }[];
}

function kindInUnits<Kind>(kind: Kind, { fields, rows, choices = [] }: Described, size: SizeOf): Kind {
  const sizeOf = ({ dimension }: Field): number => size(dimension);
  const told: Numbers = { ...(kind as Numbers) };
  for (const field of fields) {
    const value = told[field.key];
    if (typeof value === "number") told[field.key] = value * sizeOf(field);
  }
  for (const column of rows?.columns ?? []) {
    const values = told[column.key];
    if (Array.isArray(values)) told[column.key] = (values as number[]).map((one) => one * sizeOf(column));
  }
  if (rows && Array.isArray(told.points)) {
    const sizes = rows.columns.map(sizeOf);
    told.points = (told.points as number[][]).map((row) => row.map((one, i) => one * sizes[i]));
  }
  for (const { key, options } of choices) {
    const field = options.find((option) => option.field)?.field;
    const value = told[key];
    if (field && typeof value === "object")
      told[key] = { [field.key]: (value as Record<string, number>)[field.key] * sizeOf(field) };
  }
  return told as Kind;
}

/** Every input later by `delay` (earlier where negative): starts and stops move on, harmonics turn back. */
export function delayed(scenario: Scenario, delay: number): Scenario {
  const { ripple } = scenario.contact.normal;
  return {
    ...scenario,
    contact: {
      ...scenario.contact,
      normal: { ...scenario.contact.normal, ripple: ripple && turnedBack(ripple, delay) },
    },
    force: scenario.force.map((term) => later(term, delay)),
    base: scenario.base.map((term) => later(term, delay)),
  };
}

function turnedBack<Turning extends { hz: number; phase: number }>(term: Turning, delay: number): Turning {
  return { ...term, phase: term.phase - 360 * ((term.hz * delay) % 1) };
}

function later(term: Term, delay: number): Term {
  if (term.kind === "constant") return term;
  if (term.kind === "harmonic" || term.kind === "unbalance") return turnedBack(term, delay);
  if (term.kind === "ramp") {
    return { ...term, start: term.start + delay, stop: term.stop === "none" ? "none" : term.stop + delay };
  }
  if ("times" in term) return { ...term, times: term.times.map((t) => t + delay) };
  if ("start" in term) return { ...term, start: term.start + delay };
  throw new Error(`${term.kind} cannot be delayed`);
}

/** Every number of body, contact, inputs and start moved by a share of itself; times stay. */
export function moved(scenario: Scenario, share: number): Scenario {
  const { body, contact, initial } = scenario;
  const by = (value: number): number => value * (1 + share);
  const { counterface } = contact;
  return {
    ...scenario,
    body: { ...body, stiffness: by(body.stiffness), viscous: by(by(body.viscous)), cubic: by(body.cubic) },
    contact: {
      ...contact,
      normal: { ...contact.normal, preload: by(contact.normal.preload) },
      counterface: typeof counterface === "object" ? { velocity: by(counterface.velocity) } : counterface,
    },
    force: scenario.force.map((term) => scaledTerm(term, 1 - share)),
    base: scenario.base.map((term) => scaledTerm(term, 1 + share)),
    initial: { displacement: by(initial.displacement), velocity: by(initial.velocity) },
  };
}

function scaledTerm(term: Term, factor: number): Term {
  const key = leading[term.kind];
  const value = (term as unknown as Numbers)[key];
  return {
    ...term,
    [key]: Array.isArray(value) ? (value as number[]).map((one) => factor * one) : factor * (value as number),
  };
}
