import { normalForce } from "./compile-problem.ts";
import type { Fault, Records, Scenario } from "./scenario.ts";

const message = "not computed by this version";

/**
 * The first thing of a checked scenario that this version cannot compute, null where it can: laws that vary with speed, a
 * spring that is not straight, a chirp, a ripple that lets the contact go, or a record whose points are not at hand.
 */
export function unsupported(scenario: Scenario, records?: Records): Fault | null {
  const { contact, body } = scenario;
  if (contact.law.model !== "none" && contact.law.model !== "coulomb") return { path: "contact.law.model", message };
  if (body.cubic !== 0) return { path: "body.cubic", message };
  if (letsGo(scenario)) return { path: "contact.normal.ripple", message };
  return termFault(scenario, records);
}

/** True where the ripple lets N reach 0 while there is friction to lose. */
function letsGo(scenario: Scenario): boolean {
  const { ripple } = scenario.contact.normal;
  if (ripple === null || ripple.amplitude === 0 || scenario.contact.law.model === "none") return false;
  return Math.abs(ripple.amplitude) >= normalForce(scenario);
}

function termFault({ force, base }: Scenario, records: Records | undefined): Fault | null {
  for (const [place, terms] of Object.entries({ force, base })) {
    for (const [i, term] of terms.entries()) {
      const path = `${place}[${i}]`;
      if (term.kind === "chirp") return { path: `${path}.kind`, message };
      if ("digest" in term && records?.get(term.digest)?.times.length !== term.points)
        return { path: `${path}.digest`, message: `The ${term.points} points of this record are not at hand.` };
    }
  }
  return null;
}
