import type { Fault, Records, Scenario } from "./scenario.ts";

const message = "not computed by this version";

/**
 * The first thing of a checked scenario that this version cannot compute, null where it can: the spring's own set-valued
 * element held against friction that varies as the base moves, or a record whose points are not at hand.
 */
export function unsupported(scenario: Scenario, records?: Records): Fault | null {
  return elementFault(scenario) ?? recordFault(scenario, records);
}

function elementFault({ solid, contact, base }: Scenario): Fault | null {
  const { model } = contact.law;
  if (solid.model !== "displacement-proportional" || model === "none" || model === "coulomb") return null;
  const isSteady = contact.counterface === "base" || (base.length === 0 && contact.normal.ripple === null);
  return isSteady && model !== "bristle" ? null : { path: "solid.model", message };
}

function recordFault({ force, base }: Scenario, records: Records | undefined): Fault | null {
  for (const [place, terms] of Object.entries({ force, base })) {
    for (const [i, term] of terms.entries()) {
      if (!("digest" in term) || records?.get(term.digest)?.times.length === term.points) continue;
      return { path: `${place}[${i}].digest`, message: `The ${term.points} points of this record are not at hand.` };
    }
  }
  return null;
}
