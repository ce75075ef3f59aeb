import { lawOf, solidOf, termOf, type Fault, type Scenario } from "@restband/solver";
import { stepsOf } from "./path.ts";
import { fieldAt } from "./scenario-fields.ts";

/** What this version cannot do with a part of a valid scenario, named as the statement names it. */
export function remarkWords(scenario: Scenario, { path, message }: Fault): string {
  if (message !== "not computed by this version") return message;
  return `${nameOf(scenario, path)} is valid, but not computed by this version. It is kept as it is.`;
}

function nameOf(scenario: Scenario, path: string): string {
  const [place, index] = stepsOf(path);
  if (path.startsWith("contact.law")) return `Friction by the ${lawOf(scenario.contact.law.model).label} law`;
  if (path.startsWith("contact.normal.ripple")) return "A pressing force that ripples down to nothing";
  if (path.startsWith("solid"))
    return `Solid damping by the ${solidOf(scenario.solid.model).label} model together with this friction`;
  if (path === "body.cubic") return "A spring that stiffens or softens";
  if (place === "force" || place === "base") {
    const term = scenario[place][Number(index)];
    return term ? `An input of the kind “${termOf(term.kind).label}”` : "An input";
  }
  return fieldAt(scenario, path)?.label ?? "A part of this";
}
