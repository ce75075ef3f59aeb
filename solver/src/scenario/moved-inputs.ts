import type { Scenario } from "./scenario.ts";

const share = 1e-12;
/** Counts, and what keeps its meaning only as it stands. */
const kept = new Set(["faces", "count", "points", "times", "incline"]);

/**
 * The scenario with every input moved by ±1e-12 relative, each member the other way than the one before (moved alike, a
 * scenario is only scaled, and its ties stay ties); friction's own numbers together, so that static stays at or above
 * kinetic. `sign` −1 moves everything the other way. Span, settle band and limits are no inputs of the motion. What a run
 * changes by this is what cannot be told of it: see `agreementOf`.
 */
export function movedInputs(scenario: Scenario, sign: 1 | -1): Scenario {
  let direction = sign as number;
  const move = (value: unknown, key: string, turns: boolean): unknown => {
    if (kept.has(key)) return value;
    if (typeof value === "number") {
      if (turns) direction = -direction;
      return value * (1 + direction * share);
    }
    if (Array.isArray(value)) return value.map((one) => move(one, key, turns && typeof one !== "number"));
    if (typeof value !== "object" || value === null) return value;
    const isLaw = key === "law";
    if (isLaw) direction = -direction;
    return Object.fromEntries(Object.entries(value).map(([name, one]) => [name, move(one, name, turns && !isLaw)]));
  };
  const { body, solid, contact, force, base, initial } = scenario;
  return { ...scenario, ...(move({ body, solid, contact, force, base, initial }, "", true) as Partial<Scenario>) };
}
