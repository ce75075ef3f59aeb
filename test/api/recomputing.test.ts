import { checkScenario } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { createRecomputing } from "../../api/src/revisions/recompute-pool.ts";
import { smallScenario } from "../support/people.ts";
import { freezeBody } from "../support/revisions.ts";

const content = checkScenario(smallScenario).scenario!;
const order = { scenario: content, claimed: freezeBody({ content, digest: "" }).result };

describe("the server's own runs", () => {
  it("are three of one person at a time, and others' beside them", async () => {
    const recompute = createRecomputing({ workers: 1, seconds: 20 });
    const three = [1, 2, 3].map(() => recompute(order, "ada"));
    await expect(recompute(order, "ada")).rejects.toMatchObject({ status: 429, code: "too-many-runs" });
    const other = recompute(order, "bo");
    for (const run of await Promise.all([...three, other])) expect(run).toMatchObject({ result: order.claimed });
    await expect(recompute(order, "ada")).resolves.toMatchObject({ agreement: { verdict: "agrees" } });
  });

  it("that take too long or too much memory are ended, and the next is not held up by them", async () => {
    const recompute = createRecomputing({ workers: 1, seconds: 0.3 });
    const shaken = { kind: "harmonic", amplitude: 30, hz: 40 };
    const span = { seconds: 1e6, maxEvents: 1e9, maxWork: 1e12, untilRest: false };
    const endless = checkScenario({ ...smallScenario, force: [shaken], span }).scenario!;
    expect(await recompute({ ...order, scenario: endless }, "ada")).toBeNull();
    const patient = createRecomputing({ workers: 1, seconds: 20 });
    expect(await patient(order, "ada")).not.toBeNull();
  });
});
