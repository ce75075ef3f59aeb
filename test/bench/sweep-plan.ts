import { checkSweepPlan, tileCount, type Scenario, type SweepPlan } from "@restband/solver";
import { shaken } from "./problems.ts";

const turn = 2 * Math.PI;
const base = shaken(0.5, 0.4, 100);

/** Friction 0…1 by frequency 0.2…2 rad/s, 100 × 100 cells of 100 periods, and every eighth of its tiles. */
export function sweepPlan(quantities: readonly string[]): { scenario: Scenario; plan: SweepPlan; tiles: number[] } {
  const { plan, faults } = checkSweepPlan(
    {
      format: "restband-sweep/1",
      axes: [
        { path: "contact.law.static", spacing: "linear", from: 0, to: 1, count: 100 },
        { path: "force[0].hz", spacing: "linear", from: 0.2 / turn, to: 2 / turn, count: 100 },
      ],
      links: { "contact.law.kinetic": { of: "contact.law.static", factor: 1 }, "span.seconds": { keep: "periods" } },
      quantities,
    },
    base,
  );
  if (plan === null) throw new Error(faults.map(({ path, message }) => `${path}: ${message}`).join("\n"));
  const tiles = Array.from({ length: tileCount(plan) }, (_, tile) => tile).filter((tile) => tile % 8 === 1);
  return { scenario: base, plan, tiles };
}
