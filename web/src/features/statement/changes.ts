import {
  lawOf,
  solidOf,
  termOf,
  type Choice,
  type ChoiceOption,
  type Field,
  type Law,
  type Limit,
  type Origin,
  type Rows,
  type Scenario,
  type Solid,
  type Term,
  type TermKind,
} from "@restband/solver";
import type { DraftAction } from "./draft/draft.ts";
import { movePath, readPath, without, writePath } from "./path.ts";

export type Place = "force" | "base";

type Change = Extract<DraftAction, { type: "change" }>;

/** A change of what the scenario consists of; origins of values that are gone go too. */
function change(apply: (scenario: Scenario) => Scenario, rename?: (path: string) => string | null): Change {
  return { type: "change", apply: (scenario) => withOwnOrigins(apply(renameOrigins(scenario, rename))), rename };
}

/** Values from elsewhere, each with where it comes from; what was typed in their place goes. One step of undo. */
export const takeValues = (taken: readonly { path: string; value: number; origin: Origin }[]): DraftAction => ({
  type: "change",
  apply: (scenario) =>
    taken.reduce<Scenario>((next, { path, value, origin }) => {
      const written = writePath(next, path, value);
      return { ...written, origins: { ...written.origins, [path]: origin } };
    }, scenario),
  rename: (path) => (taken.some((each) => each.path === path) ? null : path),
});

/** Says where the number at a path comes from, or no more; what is typed of origins in one go is one step of undo. */
export function setOrigin({ origins }: Scenario, path: string, origin: Origin | null): DraftAction {
  const value = origin ? { ...origins, [path]: origin } : without(origins, path);
  return { type: "set", path: "origins", value };
}

/** From straight to turning and back: what the other kind cannot have is taken out, the numbers stay. */
export const setMotion = (motion: Scenario["motion"]): DraftAction =>
  change((scenario) => (motion === "linear" ? toLinear(scenario) : toAngular(scenario)));

function toLinear(scenario: Scenario): Scenario {
  return { ...scenario, motion: "linear", contact: { ...scenario.contact, radius: 1 } };
}

function toAngular(scenario: Scenario): Scenario {
  const { contact, force, base } = scenario;
  const hasPlace = (term: Term): boolean => termOf(term.kind).motions?.includes("angular") ?? true;
  return {
    ...scenario,
    motion: "angular",
    incline: 0,
    contact: { ...contact, normal: { ...contact.normal, weight: false } },
    force: force.filter(hasPlace),
    base: base.filter(hasPlace),
  };
}

/** Another friction law; coefficients the two have in common stay. */
export const setLaw = (model: Law["model"]): DraftAction =>
  change((scenario) => {
    const law = fresh({ model }, lawOf(model), scenario.contact.law) as Law;
    return { ...scenario, contact: { ...scenario.contact, law } };
  });

export const setSolid = (model: Solid["model"]): DraftAction =>
  change((scenario) => ({ ...scenario, solid: fresh({ model }, solidOf(model), scenario.solid) as Solid }));

/** One of the words of a member; an option that carries a number starts from the number's initial value. */
export const setWord = (path: string, option: ChoiceOption): DraftAction =>
  change((scenario) =>
    writePath(scenario, path, option.field ? { [option.field.key]: option.field.initial } : option.value),
  );

export const setRipple = (isOn: boolean): DraftAction =>
  change((scenario) => {
    const { contact } = scenario;
    const ripple = isOn ? { amplitude: 0.1 * contact.normal.preload, hz: 10, phase: 0 } : null;
    return { ...scenario, contact: { ...contact, normal: { ...contact.normal, ripple } } };
  });

export const addTerm = (place: Place, kind: TermKind): DraftAction =>
  change((scenario) => ({ ...scenario, [place]: [...scenario[place], freshTerm(place, kind)] }));

/** Another kind in the same place; members of the same name stay. */
export const setTermKind = (place: Place, index: number, kind: TermKind): DraftAction =>
  change((scenario) => ({
    ...scenario,
    [place]: scenario[place].map((term, i) => (i === index ? freshTerm(place, kind, term) : term)),
  }));

/** A term of its own making, with where its members come from by their paths. */
export const insertTerm = (place: Place, at: number, term: Term, origins: Readonly<Record<string, Origin>>): Change =>
  change(
    (scenario) => ({
      ...scenario,
      [place]: [...scenario[place].slice(0, at), term, ...scenario[place].slice(at)],
      origins: { ...scenario.origins, ...origins },
    }),
    (path) => movePath(path, place, (i) => (i >= at ? i + 1 : i)),
  );

export const removeItem = (list: Place | "limits", index: number): Change =>
  change(
    (scenario) => ({ ...scenario, [list]: scenario[list].filter((_, i) => i !== index) }),
    (path) => movePath(path, list, (i) => (i === index ? null : i > index ? i - 1 : i)),
  );

/** Swaps an item with the one before it. */
export const raiseItem = (list: Place | "limits", index: number): Change =>
  change(
    (scenario) => ({ ...scenario, [list]: swapped<Term | Limit>(scenario[list], index) }),
    (path) => movePath(path, list, (i) => (i === index ? i - 1 : i === index - 1 ? i + 1 : i)),
  );

export const addLimit = (quantity: string, max: number): DraftAction =>
  change((scenario) => ({ ...scenario, limits: [...scenario.limits, { quantity, max }] }));

export const setLimitQuantity = (index: number, quantity: string): DraftAction =>
  change((scenario) => ({
    ...scenario,
    limits: scenario.limits.map((limit, i) => (i === index ? { ...limit, quantity } : limit)),
  }));

function swapped<T extends Term | Limit>(items: readonly T[], index: number): T[] {
  return items.map((item, i) => (i === index ? items[index - 1] : i === index - 1 ? items[index] : item));
}

interface Kind {
  readonly fields: readonly Field[];
  readonly choices?: readonly Choice[];
  readonly rows?: Rows;
}

/** A term with what its kind starts from; members of `old` with the same name stay. */
export function freshTerm(place: Place, kind: TermKind, old: object = {}): Term {
  return fresh({ kind }, termOf(kind), old, place) as Term;
}

/** The members of a kind: those of `old` where they have the name and kind of value, else what the kind starts from. */
function fresh(named: object, kind: Kind, old: object, place?: Place): object {
  const members: Record<string, unknown> = { ...named };
  for (const field of kind.fields) members[field.key] = kept(old, field.key, startOf(field, place));
  for (const { key, options } of kind.choices ?? []) members[key] = options[0].value;
  return { ...members, ...rowsOf(named, kind.rows) };
}

function startOf(field: Field, place: Place | undefined): number | "none" {
  if (field.optional) return "none";
  return place === "base" ? (field.initialOnBase ?? field.initial) : (field.default ?? field.initial);
}

function kept(old: object, key: string, otherwise: number | "none"): unknown {
  const value: unknown = Object.entries(old).find(([name]) => name === key)?.[1];
  return typeof value === typeof otherwise ? value : otherwise;
}

/** Laws hold their rows as points, terms as two columns. */
function rowsOf(named: object, rows: Rows | undefined): object {
  if (!rows) return {};
  if ("model" in named) return { points: rows.initial.map(([a, b]) => [a, b]) };
  const [first, second] = rows.columns;
  return { [first.key]: rows.initial.map(([a]) => a), [second.key]: rows.initial.map(([, b]) => b) };
}

function renameOrigins(scenario: Scenario, rename: ((path: string) => string | null) | undefined): Scenario {
  if (!rename) return scenario;
  const entries = Object.entries(scenario.origins).flatMap(([path, origin]) => {
    const name = rename(path);
    return name === null ? [] : [[name, origin] as const];
  });
  return { ...scenario, origins: Object.fromEntries(entries) };
}

/** An origin belongs to a value; without the value there is none. */
function withOwnOrigins(scenario: Scenario): Scenario {
  const own = Object.entries(scenario.origins).filter(([path]) => readPath(scenario, path) !== undefined);
  return own.length === Object.keys(scenario.origins).length
    ? scenario
    : { ...scenario, origins: Object.fromEntries(own) };
}
