import {
  canonicalText,
  checkScenario,
  compileProblem,
  fieldPaths,
  frictionLaws,
  lawOf,
  simulate,
  type Law,
  type Scenario,
} from "@restband/solver";
import { describe, expect, it, vi } from "vitest";
import type * as friction from "../../solver/src/friction/index.ts";
import { setLaw } from "../../web/src/features/statement/changes.ts";
import { draftReducer } from "../../web/src/features/statement/draft/draft-reducer.ts";
import { openDraft } from "../../web/src/features/statement/draft/open-draft.ts";
import { groups } from "../../web/src/features/statement/groups.ts";
import { plainText } from "../../web/src/features/statement/sentence/plain-text.ts";

/*
 * "One file and one line": the list of laws is replaced by a copy with one more, `fading`, which nothing else knows of. What
 * the rest of the product does with a law must follow from what this one says of itself.
 */

vi.mock("../../solver/src/friction/index.ts", async (original) => {
  const { frictionLaws } = await original<typeof friction>();
  const { fading } = await import("../support/fading-law.ts");
  const longer = [...frictionLaws, fading];
  return { frictionLaws: longer, lawOf: (model: string) => longer.find((law) => law.model === model) };
});

const law = { model: "fading", static: 0.5, kinetic: 0.3, until: 0.4 } as unknown as Law;

const input = (contactLaw: object) => ({
  format: "restband-scenario/1",
  motion: "linear",
  body: { inertia: 1, stiffness: 1 },
  contact: { law: contactLaw, normal: { preload: 1 }, counterface: { velocity: 0.2 } },
  initial: { velocity: 0.2 },
  span: { seconds: 30, untilRest: false },
});

function checked(contactLaw: object): Scenario {
  const { scenario, faults } = checkScenario(input(contactLaw));
  expect(faults).toEqual([]);
  return scenario!;
}

describe("a law that is one file and one line", () => {
  it("is in the list", () => {
    expect(frictionLaws.map(({ model }) => model)).toContain("fading");
    expect(lawOf(law.model).label).toBe("Fading");
  });

  it("is validated by its own bounds, its own rule and its own keys", () => {
    const faultsOf = (contactLaw: object) => checkScenario(input(contactLaw)).faults;
    expect(faultsOf({ ...law, until: 0 }).map(({ path }) => path)).toEqual(["contact.law.until"]);
    expect(faultsOf({ ...law, static: 0.2 })).toMatchObject([
      { path: "contact.law.static", message: expect.stringContaining("smaller than kinetic") as string },
    ]);
    expect(faultsOf({ ...law, speed: 1 }).map(({ path }) => path)).toEqual(["contact.law.speed"]);
  });

  it("is written, read back and may carry origins", () => {
    const scenario = checked(law);
    expect(checkScenario(JSON.parse(canonicalText(scenario))).scenario).toEqual(scenario);
    expect(fieldPaths(scenario)).toContain("contact.law.until");
  });

  it("runs by the adaptive method, with its corner and a ledger that closes", () => {
    const scenario = checked(law);
    expect(compileProblem(scenario).law.corners).toEqual([0.4]);
    const result = simulate(scenario, { samples: 0 });
    if ("error" in result) throw new Error(result.error.message);
    expect(result.method).toBe("adaptive");
    expect(result.outcome).toBe("stick-slip");
    // it breaks away where the spring holds μs N
    expect(result.events.find(({ kind }) => kind === "break-away")!.x).toBeCloseTo(0.5, 12);
    expect(Math.abs(result.energy!.residual)).toBeLessThan(1e-6 * result.energy!.heatContact);
  });

  it("is chosen on the page and has its sentence there", () => {
    const start = checked({ model: "coulomb", static: 0.5, kinetic: 0.3 });
    const chosen = draftReducer(openDraft(start), setLaw(law.model)).inForce;
    expect(chosen.contact.law).toMatchObject({ model: "fading", until: 0.1 });
    const group = groups.find(({ key }) => key === "contact")!;
    const sentence = plainText(chosen, group.sentence(chosen));
    expect(sentence).toContain("fading to");
    expect(sentence).toContain("(Fading)");
  });
});
