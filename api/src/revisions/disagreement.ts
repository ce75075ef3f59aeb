import { type Agreement, type Deviation, type Fault, quantityNames, quantityOf } from "@restband/solver";
import type { KeptResult } from "./revisions-schema.ts";

const MOST = 20;
const columns: Readonly<Record<string, string>> = { t: "time", x: "displacement", v: "velocity", f: "friction force" };
const known = new Set<string>(quantityNames);

/** What does not agree in a result that the server has computed again, each with its field. */
export function disagreements({ differences, deviations, allowed }: Agreement): Fault[] {
  const apart = deviations.filter(({ relative }) => relative > allowed);
  return [...differences.map((message) => ({ path: "result", message })), ...apart.map(faultOf)].slice(0, MOST);
}

function faultOf({ what, event, values: [own, claimed] }: Deviation): Fault {
  const path = event === undefined ? `result.quantities.${what}` : `result.events[${event}].${what}`;
  const name = event === undefined ? quantityOf(what).label : `The ${columns[what]} of event ${event}`;
  return { path, message: `${name} is ${own} here and ${claimed} on the page.` };
}

/** Quantities that no version of the solver here knows. */
export function unknownQuantities({ quantities }: KeptResult): Fault[] {
  return Object.keys(quantities)
    .filter((name) => !known.has(name))
    .map((name) => ({ path: `result.quantities.${name}`, message: "There is no such quantity." }));
}
