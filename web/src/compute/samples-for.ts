import type { Scenario } from "@restband/solver";

const PER_CYCLE = 60;
const FEWEST = 4001;
const MOST = 120_001;

/** How many samples a run is drawn from: enough for a smooth curve through every cycle of the fastest thing in it. */
export function samplesFor({ body, force, base, contact, span }: Scenario): number {
  const natural = Math.sqrt(body.stiffness / body.inertia) / (2 * Math.PI);
  const driven = [...force, ...base].map((term) =>
    "hz" in term ? term.hz : "toHz" in term ? Math.max(term.fromHz, term.toHz) : 0,
  );
  const fastest = Math.max(natural, contact.normal.ripple?.hz ?? 0, ...driven);
  const wanted = Math.ceil(PER_CYCLE * fastest * span.seconds);
  return Math.min(MOST, Math.max(FEWEST, Number.isFinite(wanted) ? wanted : MOST));
}
