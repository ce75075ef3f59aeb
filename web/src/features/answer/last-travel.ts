import { termOf, type Scenario } from "@restband/solver";

/** Signed way, m or rad, of the move of the base that ends last; null without one, or where its points are not at hand. */
export function lastTravel({ base }: Scenario): number | null {
  if (base.some((term) => "digest" in term)) return null;
  const travels = base.flatMap((term) => termOf(term.kind).compile(term, "times" in term ? term : undefined).travels);
  const end = Math.max(...travels.map(({ to }) => to));
  return travels.find(({ to }) => to === end)?.distance ?? null;
}
