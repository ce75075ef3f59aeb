import type { Agreement } from "@restband/solver";

/** What two runs that differ differ in, in words; null where they agree, or are sensitive to their last digits. */
export function disagreement({ verdict, differences, deviations }: Agreement): string | null {
  if (verdict !== "differs") return null;
  const [first] = deviations;
  const furthest = first ? `${first.what} of event ${first.event}: ${first.values.join(" and ")}` : "";
  return [...differences, furthest].join(" ");
}
