import type { Scenario, Term } from "@restband/solver";

const PER_CYCLE = 60;
const FEWEST = 4001;
const MOST = 200_001;

/** The fastest thing that swings in a scenario, put in or free to swing by itself, Hz. */
export function fastestHz({ body, force, base, contact }: Scenario): number {
  const natural = Math.sqrt(body.stiffness / body.inertia) / (2 * Math.PI);
  const driven = [...force, ...base].map((term) =>
    "hz" in term ? term.hz : "toHz" in term ? Math.max(term.fromHz, term.toHz) : 0,
  );
  return Math.max(natural, contact.normal.ripple?.hz ?? 0, ...driven);
}

/** How many samples a run is drawn from: enough for a smooth curve through every cycle of the fastest thing in it, and for every point of a record. */
export function samplesFor(scenario: Scenario): number {
  const { force, base, span } = scenario;
  const wanted = Math.ceil(PER_CYCLE * fastestHz(scenario) * span.seconds);
  const recorded = Math.max(0, ...[...force, ...base].map(pointsOf));
  return Math.min(MOST, Math.max(FEWEST, recorded, Number.isFinite(wanted) ? wanted : MOST));
}

function pointsOf(term: Term): number {
  if ("times" in term) return term.times.length;
  return "points" in term ? term.points : 0;
}
