import { excitationTerms, frictionLaws, solidDampings, type Scenario } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { addTerm, setLaw, setSolid } from "../../../web/src/features/statement/changes.ts";
import type { DraftAction } from "../../../web/src/features/statement/draft/draft.ts";
import { draftReducer } from "../../../web/src/features/statement/draft/draft-reducer.ts";
import { openDraft } from "../../../web/src/features/statement/draft/open-draft.ts";
import { groups, groupOf, type GroupKey } from "../../../web/src/features/statement/groups.ts";
import { plainText } from "../../../web/src/features/statement/sentence/plain-text.ts";
import { creepFeed, variant } from "../support/scenarios.ts";

const group = (key: GroupKey) => groups.find((each) => each.key === key) ?? groups[0];
const say = (key: GroupKey, scenario: Scenario): string =>
  plainText(scenario, group(key).sentence(scenario)).replaceAll("\u00a0", " ");
const changed = (scenario: Scenario, action: DraftAction): Scenario =>
  draftReducer(openDraft(scenario), action).inForce;

describe("the statement of a creep feed", () => {
  it.each<[GroupKey, string]>([
    [
      "body",
      "A carriage of 120 kg on a spring of 4 N/μm, damped 350 N·s/m, with no solid damping. Its purpose is a feed.",
    ],
    [
      "contact",
      "It rubs on fixed ways with friction 0.15 before it moves and 0.12 while it slides (Coulomb), pressed by its weight and 800 N of preload on 1 face, steadily.",
    ],
    ["drive", "The far end of the spring is fed at 2 mm/s from 0 s on. No force acts on the body. The ways are level."],
    ["start", "It starts at rest with the spring relaxed and is followed for 0.5 s or until it rests for good."],
    ["limits", "It must keep the share of time stuck at most 0 %. Add a limit."],
  ])("%s", (key, sentence) => expect(say(key, creepFeed)).toBe(sentence));
});

describe("what is nothing is said in words", () => {
  it("no spring, no damper", () => {
    const free = variant({ body: { inertia: 1.6, stiffness: 0, cubic: 0, viscous: 0 }, base: [], limits: [] });
    expect(say("body", free)).toContain("on no spring, undamped, with no solid damping");
    expect(say("drive", free)).toContain("The far end of the spring stands still. No force acts on the body.");
    expect(say("limits", free)).toBe("No limit is set.");
    expect(say("start", free)).toContain("at 0 mm");
  });

  it("a spring that is tense at the start is not called relaxed", () => {
    const shaken = variant({ base: [{ kind: "harmonic", amplitude: 0.001, hz: 2, phase: 0 }] });
    expect(say("start", shaken)).toContain("at rest at 0 mm");
  });
});

describe("what is there is said", () => {
  it("a rotor in its own units and words", () => {
    const rotor = variant({
      motion: "angular",
      contact: { ...creepFeed.contact, radius: 0.12, normal: { ...creepFeed.contact.normal, weight: false } },
      initial: { displacement: 0.5, velocity: 75 },
    });
    expect(say("body", rotor)).toMatch(/^A rotor of 120 kg·m² on a spring of 4000 kN·m\/rad, damped 350 N·m·s\/rad/);
    expect(say("contact", rotor)).toContain("It rubs on a fixed pad");
    expect(say("contact", rotor)).toContain("at a radius of 120 mm");
    expect(say("start", rotor)).toContain("It starts with 75 rad/s at 0.5 rad");
  });

  it("a belt, an incline, a ripple, a settle band and a limit on both sides", () => {
    const { contact } = creepFeed;
    const full = variant({
      incline: 30,
      settleBand: 1e-5,
      contact: {
        ...contact,
        counterface: { velocity: 0.2 },
        normal: { ...contact.normal, ripple: { amplitude: 50, hz: 12, phase: 0 } },
      },
      limits: [{ quantity: "restOffset", min: -0.001, max: 0.002 }],
      base: [{ kind: "ramp", rate: 0.002, start: 0, stop: 3 }],
    });
    expect(say("contact", full)).toContain("It rubs on a belt moving at 200 mm/s with friction");
    expect(say("contact", full)).toContain("with a ripple of ±50 N at 12 Hz with phase 0°");
    expect(say("drive", full)).toContain("The ways are inclined by 30°.");
    expect(say("drive", full)).toContain("is fed at 2 mm/s from 0 s on until 3 s, then held.");
    expect(say("start", full)).toContain("it has settled once it stays within ±10 μm of the drive");
    expect(say("limits", full)).toContain("the rest offset between −1 mm and 2 mm");
  });

  it("friction measured as a table, by its number of points", () => {
    const table = variant({
      contact: {
        ...creepFeed.contact,
        law: {
          model: "table",
          points: [
            [0, 0.2],
            [0.1, 0.1],
          ],
        },
      },
    });
    expect(say("contact", table)).toContain("with measured friction, 2 points (Table)");
  });
});

describe("every kind has a sentence with all its values in it", () => {
  const pathsIn = (key: GroupKey, scenario: Scenario): string[] =>
    group(key)
      .sentence(scenario)
      .flatMap((piece) => (piece.kind === "value" ? piece.path : []));

  it.each(frictionLaws.map((law) => [law.model, law] as const))("law %s", (model, law) => {
    const scenario = changed(creepFeed, setLaw(model));
    expect(scenario.contact.law.model).toBe(model);
    for (const { key } of law.fields) expect(pathsIn("contact", scenario)).toContain(`contact.law.${key}`);
    expect(say("contact", scenario)).not.toMatch(/[{}]/);
  });

  it.each(solidDampings.map((solid) => [solid.model, solid] as const))("solid damping %s", (model, solid) => {
    const scenario = changed(creepFeed, setSolid(model));
    for (const { key } of solid.fields) expect(pathsIn("body", scenario)).toContain(`solid.${key}`);
    expect(say("body", scenario)).not.toMatch(/[{}]/);
  });

  const places = excitationTerms.flatMap((term) => term.places.map((place) => [term.kind, place, term] as const));
  it.each(places)("input %s as a %s", (kind, place, term) => {
    const counterface = kind === "acceleration-record" ? "base" : "ground";
    const empty = variant({ base: [], contact: { ...creepFeed.contact, counterface } });
    const scenario = changed(empty, addTerm(place, kind));
    expect(scenario[place].map((each) => each.kind)).toEqual([kind]);
    for (const field of term.fields)
      if (!field.optional) expect(pathsIn("drive", scenario)).toContain(`${place}[0].${field.key}`);
    expect(say("drive", scenario)).not.toMatch(/[{}]/);
  });
});

it("every member of the format belongs to a group", () => {
  const owners = Object.keys(creepFeed).map((key) => [key, groups.some(({ roots }) => roots.includes(key))]);
  expect(owners.filter(([, isOwned]) => !isOwned)).toEqual([]);
  expect(groupOf("origins.contact.law.static").key).toBe("contact");
  expect(groupOf("force[0].hz").key).toBe("drive");
});
