import { checkScenario } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { plainScenario, withContact } from "./plain-scenario.ts";

const body = (change: object) => plainScenario({ body: { inertia: 2, stiffness: 800, ...change } });
const law = (change: object) => withContact({ law: change });
const normal = (change: object) => withContact({ normal: { preload: 40, ...change } });
const force = (...terms: object[]) => plainScenario({ force: terms });
const base = (...terms: object[]) => plainScenario({ base: terms });
const solid = (change: object, rest: object = {}) => plainScenario({ solid: change, ...rest });
const span = (change: object) => plainScenario({ span: { seconds: 1, ...change } });
const angular = (change: object) => plainScenario({ motion: "angular", ...change });
const limits = (...list: object[]) => plainScenario({ limits: list });
const origins = (key: string, origin: unknown) => plainScenario({ origins: { [key]: origin } });

const stribeck = { model: "stribeck", static: 0.2, kinetic: 0.1, velocity: 0.01, exponent: 2 };
const bristle = { model: "bristle", static: 0.2, kinetic: 0.1, velocity: 0.01, stiffness: 1e5, damping: 100 };
const move = { kind: "move", distance: 1, speed: 1, acceleration: 1 };
const stairs = { kind: "staircase", increment: 0.1, count: 3, dwell: 1, speed: 1, acceleration: 1 };
const pulse = { kind: "pulse", shape: "rectangle", peak: 1, duration: 1 };
const chirp = { kind: "chirp", amplitude: 1, fromHz: 1, toHz: 2, seconds: 1, spacing: "linear" };
const shaken = { kind: "acceleration-record", times: [0, 1], values: [1, 2] };
const assumed = { kind: "assumed" };

/** Every refusal of the format: what is wrong, and the paths of all faults it must give. */
const refusals: [name: string, scenario: unknown, ...paths: string[]][] = [
  ["no object", null, ""],
  ["a list", [], ""],
  ["a text", "restband", ""],
  ["format missing", plainScenario({ format: undefined }), "format"],
  ["format of another version", plainScenario({ format: "restband-scenario/2" }), "format"],
  ["motion missing", plainScenario({ motion: undefined }), "motion"],
  ["motion unknown", plainScenario({ motion: "circular" }), "motion"],
  ["title no text", plainScenario({ title: 3 }), "title"],
  ["purpose unknown", plainScenario({ purpose: "cutting" }), "purpose"],
  ["body missing", plainScenario({ body: undefined }), "body"],
  ["contact missing", plainScenario({ contact: undefined }), "contact"],
  ["span missing", plainScenario({ span: undefined }), "span"],
  ["law missing", withContact({ law: undefined }), "contact.law"],
  ["normal missing", withContact({ normal: undefined }), "contact.normal"],
  ["preload missing", withContact({ normal: {} }), "contact.normal.preload"],
  ["unknown key at the top", plainScenario({ colour: "red" }), "colour"],
  ["unknown key in the body", body({ mass: 1 }), "body.mass"],
  ["unknown key in the law", law({ model: "none", static: 0.1 }), "contact.law.static"],
  ["unknown key in a term", force({ kind: "constant", value: 1, unit: "N" }), "force[0].unit"],
  ["unknown key in the counterface", withContact({ counterface: { velocity: 1, at: 2 } }), "contact.counterface.at"],
  ["unknown key in an origin", origins("body.inertia", { ...assumed, colour: 1 }), "origins.body.inertia.colour"],
  ["inertia 0", body({ inertia: 0 }), "body.inertia"],
  ["inertia a text", body({ inertia: "2" }), "body.inertia"],
  ["inertia not finite", body({ inertia: Infinity }), "body.inertia"],
  ["cubic no number", body({ cubic: NaN }), "body.cubic"],
  ["stiffness negative", body({ stiffness: -1 }), "body.stiffness"],
  ["viscous negative", body({ viscous: -1 }), "body.viscous"],
  ["preload negative", normal({ preload: -1 }), "contact.normal.preload"],
  ["faces no whole number", normal({ faces: 1.5 }), "contact.normal.faces"],
  ["faces 0", normal({ faces: 0 }), "contact.normal.faces"],
  ["weight no flag", normal({ weight: 1 }), "contact.normal.weight"],
  ["ripple hz 0", normal({ ripple: { amplitude: 1, hz: 0 } }), "contact.normal.ripple.hz"],
  ["ripple without amplitude", normal({ ripple: { hz: 1 } }), "contact.normal.ripple.amplitude"],
  ["law unknown", law({ model: "viscous" }), "contact.law.model"],
  ["static below kinetic", law({ model: "coulomb", static: 0.1, kinetic: 0.2 }), "contact.law.static"],
  ["static below kinetic, stribeck", law({ ...stribeck, static: 0.05 }), "contact.law.static"],
  ["static below kinetic, bristle", law({ ...bristle, static: 0.05 }), "contact.law.static"],
  ["kinetic negative", law({ model: "coulomb", static: 0.1, kinetic: -0.2 }), "contact.law.kinetic"],
  ["static negative", law({ model: "coulomb", static: -0.1, kinetic: 0.2 }), "contact.law.static"],
  ["stribeck velocity 0", law({ ...stribeck, velocity: 0 }), "contact.law.velocity"],
  ["stribeck exponent 0", law({ ...stribeck, exponent: 0 }), "contact.law.exponent"],
  ["stribeck fluid negative", law({ ...stribeck, fluid: -1 }), "contact.law.fluid"],
  ["bristle stiffness 0", law({ ...bristle, stiffness: 0 }), "contact.law.stiffness"],
  ["bristle velocity 0", law({ ...bristle, velocity: 0 }), "contact.law.velocity"],
  ["bristle damping negative", law({ ...bristle, damping: -1 }), "contact.law.damping"],
  ["table without points", law({ model: "table", points: [] }), "contact.law.points"],
  ["table not from 0", law({ model: "table", points: [[0.1, 0.2]] }), "contact.law.points[0][0]"],
  [
    "table falls",
    law({
      model: "table",
      points: [
        [0, 1],
        [1, 1],
        [1, 1],
      ],
    }),
    "contact.law.points[2][0]",
  ],
  ["table negative", law({ model: "table", points: [[0, -0.1]] }), "contact.law.points[0][1]"],
  ["table row of three", law({ model: "table", points: [[0, 0.1, 2]] }), "contact.law.points[0]"],
  ["table row no pair", law({ model: "table", points: [[0, 0.1], 7] }), "contact.law.points[1]"],
  ["counterface unknown", withContact({ counterface: "belt" }), "contact.counterface"],
  ["radius 0", angular({ contact: { ...(angular({}).contact as object), radius: 0 } }), "contact.radius"],
  ["radius of a linear body", withContact({ radius: 0.5 }), "contact.radius"],
  ["incline over 90", plainScenario({ incline: 90.001 }), "incline"],
  ["incline under -90", plainScenario({ incline: -91 }), "incline"],
  ["angular with incline", angular({ incline: 5 }), "incline"],
  ["angular with weight", { ...normal({ weight: true }), motion: "angular" }, "contact.normal.weight"],
  [
    "angular with unbalance",
    angular({ force: [{ kind: "unbalance", mass: 1, eccentricity: 1, hz: 1 }] }),
    "force[0].kind",
  ],
  ["loss factor negative", solid({ model: "displacement-proportional", lossFactor: -0.1 }), "solid.lossFactor"],
  ["ρ of 1", solid({ model: "displacement-proportional", lossFactor: 2 / Math.PI }), "solid.lossFactor"],
  ["at unknown", solid({ model: "equivalent-viscous", lossFactor: 0.1, at: "rest" }), "solid.at"],
  ["at missing", solid({ model: "equivalent-viscous", lossFactor: 0.1 }), "solid.at"],
  ["at 0 hz", solid({ model: "equivalent-viscous", lossFactor: 0.1, at: { hz: 0 } }), "solid.at.hz"],
  ["at drive without one", solid({ model: "equivalent-viscous", lossFactor: 0.1, at: "drive" }), "solid.at"],
  [
    "at natural without a spring",
    solid({ model: "equivalent-viscous", lossFactor: 0.1, at: "natural" }, { body: { inertia: 1, stiffness: 0 } }),
    "solid.at",
  ],
  ["force no list", plainScenario({ force: {} }), "force"],
  ["term no object", force(3 as unknown as object), "force[0]"],
  ["term of no kind", force({ value: 3 }), "force[0].kind"],
  ["term of unknown kind", force({ kind: "sawtooth" }), "force[0].kind"],
  ["ramp stops at its start", force({ kind: "ramp", rate: 1, start: 2, stop: 2 }), "force[0].stop"],
  ["ramp stop a word", force({ kind: "ramp", rate: 1, stop: "never" }), "force[0].stop"],
  ["harmonic hz 0", force({ kind: "harmonic", amplitude: 1, hz: 0 }), "force[0].hz"],
  ["unbalance hz negative", force({ kind: "unbalance", mass: 1, eccentricity: 1, hz: -1 }), "force[0].hz"],
  ["pulse duration 0", force({ ...pulse, duration: 0 }), "force[0].duration"],
  ["pulse shape unknown", force({ ...pulse, shape: "sine" }), "force[0].shape"],
  ["chirp from 0 hz", force({ ...chirp, fromHz: 0 }), "force[0].fromHz"],
  ["chirp to 0 hz", force({ ...chirp, toHz: 0 }), "force[0].toHz"],
  ["chirp of no time", force({ ...chirp, seconds: 0 }), "force[0].seconds"],
  ["chirp spacing unknown", force({ ...chirp, spacing: "octaves" }), "force[0].spacing"],
  ["move speed 0", base({ ...move, speed: 0 }), "base[0].speed"],
  ["move acceleration negative", base(move, { ...move, acceleration: -1 }), "base[1].acceleration"],
  ["staircase dwell too short", base({ ...stairs, dwell: 0.3 }), "base[0].dwell"],
  ["staircase of half a step", base({ ...stairs, count: 0.5 }), "base[0].count"],
  ["move among forces", force(move), "force[0].kind"],
  ["staircase among forces", force(stairs), "force[0].kind"],
  ["acceleration record among forces", force(shaken), "force[0].kind"],
  ["step on the base", base({ kind: "step", value: 1 }), "base[0].kind"],
  ["pulse on the base", base(pulse), "base[0].kind"],
  ["chirp on the base", base(chirp), "base[0].kind"],
  ["unbalance on the base", base({ kind: "unbalance", mass: 1, eccentricity: 1, hz: 1 }), "base[0].kind"],
  ["record times fall", force({ kind: "record", times: [0, 1, 0.5], values: [0, 1, 2] }), "force[0].times[2]"],
  ["record times stand", force({ kind: "record", times: [0, 1, 1], values: [0, 1, 2] }), "force[0].times[2]"],
  ["record of one point", force({ kind: "record", times: [0], values: [0] }), "force[0].times"],
  ["record lengths differ", force({ kind: "record", times: [0, 1], values: [0, 1, 2] }), "force[0].values"],
  ["record value not finite", force({ kind: "record", times: [0, 1], values: [0, NaN] }), "force[0].values[1]"],
  ["record without values", force({ kind: "record", times: [0, 1] }), "force[0].values"],
  ["record digest no digest", force({ kind: "record", digest: "ABC", points: 5 }), "force[0].digest"],
  ["record with both", force({ kind: "record", digest: "0".repeat(64), points: 5, times: [] }), "force[0].times"],
  ["stored record too long", force({ kind: "record", digest: "0".repeat(64), points: 200_001 }), "force[0].points"],
  ["shaken, contact on the ground", base(shaken), "contact.counterface"],
  [
    "shaken beside another",
    withContact({ counterface: "base" }, { base: [{ kind: "constant", value: 1 }, shaken] }),
    "base[0]",
  ],
  ["shaken twice", withContact({ counterface: "base" }, { base: [shaken, shaken] }), "base[1]"],
  ["initial not finite", plainScenario({ initial: { displacement: -Infinity } }), "initial.displacement"],
  ["seconds 0", span({ seconds: 0 }), "span.seconds"],
  ["seconds over 1e7", span({ seconds: 1.0001e7 }), "span.seconds"],
  ["maxEvents 0", span({ maxEvents: 0 }), "span.maxEvents"],
  ["maxEvents no whole number", span({ maxEvents: 10.5 }), "span.maxEvents"],
  ["maxWork 0", span({ maxWork: 0 }), "span.maxWork"],
  ["untilRest no flag", span({ untilRest: "yes" }), "span.untilRest"],
  ["settleBand 0", plainScenario({ settleBand: 0 }), "settleBand"],
  ["limit on no quantity", limits({ quantity: "speed", max: 1 }), "limits[0].quantity"],
  ["limit without bounds", limits({ quantity: "restTime" }), "limits[0]"],
  [
    "limit upside down",
    limits({ quantity: "restTime", max: 1 }, { quantity: "restTime", min: 2, max: 1 }),
    "limits[1].min",
  ],
  ["origin of no field", origins("contact.law.sttic", assumed), "origins.contact.law.sttic"],
  ["origin of another law's field", origins("contact.law.velocity", assumed), "origins.contact.law.velocity"],
  ["origin of a term there is not", origins("force[0].value", assumed), "origins.force[0].value"],
  ["origin of the title", origins("title", assumed), "origins.title"],
  ["origin of an inherited name", origins("constructor", assumed), "origins.constructor"],
  ["origin of unknown kind", origins("body.inertia", { kind: "guess" }), "origins.body.inertia.kind"],
  ["origin upside down", origins("body.inertia", { ...assumed, low: 2, high: 1 }), "origins.body.inertia.low"],
  ["origin low not finite", origins("body.inertia", { ...assumed, low: NaN }), "origins.body.inertia.low"],
];

describe("checkScenario refuses", () => {
  it.each(refusals)("%s", (_name, scenario, ...paths) => {
    const checked = checkScenario(scenario);
    expect(checked.scenario).toBeNull();
    expect(checked.faults.map((fault) => fault.path)).toEqual(paths);
    for (const { message } of checked.faults) expect(message).toMatch(/^\S.{10,}\.$/);
  });

  it("a record of more than 200,000 points", () => {
    const times = Array.from({ length: 200_001 }, (_, i) => i);
    const { faults } = checkScenario(force({ kind: "record", times, values: times }));
    expect(faults.map((fault) => fault.path)).toEqual(["force[0].times"]);
  });

  it("all faults at once, those across members too", () => {
    const { faults } = checkScenario({
      ...plainScenario({ colour: 1, incline: -91, body: { inertia: "x", stiffness: 0 } }),
      solid: { model: "equivalent-viscous", lossFactor: -1, at: "natural", x: 1 },
      contact: { law: { model: "coulomb", static: 0.1, kinetic: 0.2, foo: 1 }, normal: { faces: 2.5 } },
      force: [{ kind: "ramp", rate: "x", start: 1, stop: 0 }, move],
      limits: [{ quantity: "nope" }],
      origins: { "contact.law.static": { kind: "guess", low: 2, high: 1 } },
    });
    expect(faults.map((fault) => fault.path).sort()).toEqual(
      [
        ...["body.inertia", "colour", "contact.law.foo", "contact.law.static", "contact.normal.faces"],
        ...["contact.normal.preload", "force[0].rate", "force[0].stop", "force[1].kind", "incline", "limits[0]"],
        ...["limits[0].quantity", "origins.contact.law.static.kind", "origins.contact.law.static.low"],
        ...["solid.at", "solid.lossFactor", "solid.x"],
      ].sort(),
    );
  });

  it("no origin of a number whose kind cannot be told", () => {
    const { faults } = checkScenario({
      ...law({ model: "colomb", static: 0.2, kinetic: 0.1 }),
      origins: { "contact.law.static": assumed, "body.inertia": assumed },
    });
    expect(faults.map((fault) => fault.path)).toEqual(["contact.law.model"]);
  });
});

const accepted: [name: string, scenario: unknown][] = [
  ["only what must be given", plainScenario()],
  ["a softening spring", body({ cubic: -1e6 })],
  ["no spring", body({ stiffness: 0 })],
  ["no friction at all", law({ model: "coulomb", static: 0, kinetic: 0 })],
  ["a table of one point", law({ model: "table", points: [[0, 0.1]] })],
  ["the incline of a wall", plainScenario({ incline: -90 })],
  ["a ρ just below 1", solid({ model: "displacement-proportional", lossFactor: 0.6366 })],
  [
    "a drive among the base terms",
    {
      ...base({ kind: "harmonic", amplitude: 1, hz: 2 }),
      ...{ solid: { model: "equivalent-viscous", lossFactor: 0.1, at: "drive" } },
    },
  ],
  ["a dwell equal to its move but for rounding", base({ ...stairs, increment: 0.03, dwell: 2 * Math.sqrt(0.03) })],
  ["a step back", base({ ...move, distance: -1 }, { ...stairs, increment: -0.1 })],
  ["a negative amplitude and mass", force({ kind: "unbalance", mass: -1, eccentricity: 1, hz: 1 })],
  ["a stored record", force({ kind: "record", digest: "0a".repeat(32), points: 5000 })],
  ["a shaken floor", withContact({ counterface: "base" }, { base: [shaken] })],
  ["a belt at rest", withContact({ counterface: { velocity: 0 } })],
  ["equal bounds", limits({ quantity: "restTime", min: 1, max: 1 })],
  ["the largest span", span({ seconds: 1e7 })],
  [
    "an origin of a table",
    { ...law({ model: "table", points: [[0, 0.1]] }), origins: { "contact.law.points": assumed } },
  ],
  ["an origin of a limit", { ...limits({ quantity: "restTime", max: 1 }), origins: { "limits[0].max": assumed } }],
];

describe("checkScenario accepts", () => {
  it.each(accepted)("%s", (_name, scenario) => expect(checkScenario(scenario).faults).toEqual([]));
});
