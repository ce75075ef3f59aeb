import type { Scenario, Term } from "./scenario.ts";

/** The first harmonic or unbalance among the forces, else among the base terms, Hz; null without one. */
export function driveHz({ force, base }: Pick<Scenario, "force" | "base">): number | null {
  const isSteady = (term: Term) => term.kind === "harmonic" || term.kind === "unbalance";
  return (force.find(isSteady) ?? base.find(isSteady))?.hz ?? null;
}
