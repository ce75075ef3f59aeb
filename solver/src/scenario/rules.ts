import { termOf } from "../excitation/index.ts";
import { lawOf } from "../friction/index.ts";
import { solidOf } from "../solid/index.ts";
import { driveHz } from "./drive-hz.ts";
import { originPaths } from "./field-paths.ts";
import type { Fault, Scenario, Term } from "./scenario.ts";
import { quoted } from "./sentences.ts";

/**
 * Faults that take more than one member to judge. A number that is faulty in itself reads NaN: rules are written so that a
 * comparison with NaN finds nothing.
 */
export function ruleFaults(scenario: Scenario): Fault[] {
  const rules = [shakenFaults, limitFaults, originFaults];
  return [...numberFaults(scenario), ...rules.flatMap((rule) => rule(scenario))];
}

/** Those of them that another number in a checked scenario can bring about. */
export function numberFaults(scenario: Scenario): Fault[] {
  return [lawFaults, solidFaults, motionFaults, termFaults].flatMap((rule) => rule(scenario));
}

/** Faults of a kind are told relative to it. */
const below = (path: string, faults: readonly Fault[]) =>
  faults.map((fault) => ({ ...fault, path: `${path}.${fault.path}` }));

function lawFaults({ contact: { law } }: Scenario): Fault[] {
  return below("contact.law", lawOf(law.model).faults(law));
}

function solidFaults(scenario: Scenario): Fault[] {
  const surroundings = { ...scenario.body, driveHz: driveHz(scenario) };
  return below("solid", solidOf(scenario.solid.model).faults(scenario.solid, surroundings));
}

function motionFaults({ motion, contact, incline }: Scenario): Fault[] {
  const faults: Fault[] = [];
  const add = (path: string, message: string) => faults.push({ path, message });
  if (motion === "angular") {
    if (contact.normal.weight)
      add(
        "contact.normal.weight",
        "The weight of an angular body presses no faces together. Enter false, and a preload.",
      );
    if (incline < 0 || incline > 0) add("incline", `An angular body has no incline; it is ${incline}. Enter 0.`);
  }
  if (motion === "linear" && (contact.radius < 1 || contact.radius > 1))
    add("contact.radius", `A linear body has no effective radius; it is ${contact.radius}. Enter 1 or leave it out.`);
  return faults;
}

function termFaults(scenario: Scenario): Fault[] {
  return (["force", "base"] as const).flatMap((place) =>
    scenario[place].flatMap((term, i) => {
      const path = `${place}[${i}]`;
      const misplaced = placeFault(term, place, scenario.motion);
      return [
        ...(misplaced === null ? [] : [{ path: `${path}.kind`, message: misplaced }]),
        ...below(path, termOf(term.kind).faults(term)),
      ];
    }),
  );
}

function placeFault(term: Term, place: "force" | "base", motion: Scenario["motion"]): string | null {
  const { label, places, motions } = termOf(term.kind);
  const name = `${label} (${JSON.stringify(term.kind)})`;
  if (!places.includes(place)) return `${name} has no place in ${place}, only in ${places.join(" and ")}.`;
  if (motion === "angular" && motions?.includes(motion) === false) return `${name} has no place on an angular body.`;
  return null;
}

/** An acceleration record makes everything relative to the floor: no other base, and the contact on that floor. */
function shakenFaults({ base, contact: { counterface } }: Scenario): Fault[] {
  const shaken = base.findIndex((term) => term.kind === "acceleration-record");
  if (shaken < 0) return [];
  const faults: Fault[] = [];
  const other = base.findIndex((_term, i) => i !== shaken);
  if (other >= 0)
    faults.push({
      path: `base[${other}]`,
      message: "An acceleration record stands alone. Remove the other base terms, or it.",
    });
  if (counterface !== "base")
    faults.push({
      path: "contact.counterface",
      message: 'With an acceleration record all motion is relative to the floor: the counterface must be "base".',
    });
  return faults;
}

function limitFaults({ limits }: Scenario): Fault[] {
  return limits.flatMap(({ min, max }, i) => {
    if (min === undefined && max === undefined)
      return [{ path: `limits[${i}]`, message: "A limit needs a least value, a largest value, or both." }];
    if (min !== undefined && max !== undefined && min > max)
      return [{ path: `limits[${i}].min`, message: `The least value, ${min}, is above the largest, ${max}.` }];
    return [];
  });
}

function originFaults(scenario: Scenario): Fault[] {
  const paths = originPaths(scenario);
  return Object.entries(scenario.origins).flatMap(([key, { low, high }]) => {
    const path = `origins.${key}`;
    if (!paths.has(key)) return [{ path, message: `This scenario has no number called ${quoted(key)}.` }];
    if (low !== undefined && high !== undefined && low > high)
      return [{ path: `${path}.low`, message: `The low end, ${low}, is above the high end, ${high}.` }];
    return [];
  });
}
