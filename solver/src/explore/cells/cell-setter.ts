import type { Field } from "../../field.ts";
import { stepsOf } from "../../scenario/path.ts";
import { numericField } from "../../scenario/numeric-fields.ts";
import { isNumberOf } from "../../scenario/reading.ts";
import { numberFaults } from "../../scenario/rules.ts";
import type { Fault, Scenario } from "../../scenario/scenario.ts";
import { numberSentence } from "../../scenario/sentences.ts";
import { linkedValues, type Links } from "../links.ts";

/**
 * A scenario of its own in which a few numbers are set over and over, for sweeps and studies of very many runs: the base is
 * checked once by its schema, each setting only by the bounds of what was set and the rules across members.
 */
export class CellSetter {
  /** The scenario as set last: read it before the next setting. */
  readonly scenario: Scenario;
  private readonly places: readonly Place[];
  private readonly linked: ReadonlyMap<string, Place>;
  private readonly known = new Map<string, Place>();

  /** @param base a checked scenario, which stays as it is @param varied the paths set, in order */
  constructor(
    private readonly base: Scenario,
    varied: readonly string[],
    private readonly links: Links,
  ) {
    this.scenario = copied(base) as Scenario;
    this.places = varied.map((path) => placeOf(this.scenario, path));
    this.linked = new Map(Object.keys(links).map((path) => [path, placeOf(this.scenario, path)]));
  }

  /** Sets the varied numbers and what follows them; the first fault they have together, null where they may stand. */
  set(values: ArrayLike<number>): Fault | null {
    const { places, scenario } = this;
    for (let i = 0; i < places.length; i++) places[i].holder[places[i].key] = values[i];
    for (const [path, value] of linkedValues(this.base, this.links, this.read))
      put(this.linked.get(path) as Place, value);
    return this.boundFault() ?? numberFaults(scenario)[0] ?? null;
  }

  private readonly read = (path: string): number => {
    const place = this.known.get(path) ?? placeOf(this.scenario, path);
    this.known.set(path, place);
    return place.holder[place.key];
  };

  private boundFault(): Fault | null {
    for (const { holder, key, field, path } of [...this.places, ...this.linked.values()])
      if (!isNumberOf(field, holder[key])) return { path, message: numberSentence(field, holder[key]) };
    return null;
  }
}

/** A number's holder, found once. */
interface Place {
  readonly path: string;
  readonly holder: Record<string, number>;
  readonly key: string;
  readonly field: Field;
}

const put = ({ holder, key }: Place, value: number): void => {
  holder[key] = value;
};

function placeOf(scenario: Scenario, path: string): Place {
  const field = numericField(scenario, path);
  if (field === undefined) throw new RangeError(`this scenario has no number called ${JSON.stringify(path)}`);
  const steps = stepsOf(path);
  const holder = steps.slice(0, -1).reduce<unknown>((part, step) => (part as Record<string, unknown>)[step], scenario);
  return { path, holder: holder as Record<string, number>, key: steps[steps.length - 1], field };
}

/** Objects and the lists of them, each new; points of records and tables stay shared, they are never set. */
function copied(part: unknown): unknown {
  if (typeof part !== "object" || part === null || (Array.isArray(part) && typeof part[0] !== "object")) return part;
  if (Array.isArray(part)) return part.map(copied);
  return Object.fromEntries(Object.entries(part).map(([key, value]) => [key, copied(value)]));
}
